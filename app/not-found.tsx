import type { Metadata } from 'next';
import Link from 'next/link';
import { DeadEnd } from '@/components/layout/dead-end';
import { buttonClass } from '@/components/ui/button';

export const metadata: Metadata = { title: 'Not found' };

export default function NotFoundPage() {
  return (
    <DeadEnd mark="404" title="No such page">
      <p>The address may be mistyped, or what stood here has been taken away.</p>
      <Link href="/design" className={buttonClass('ink')}>
        Choose a part to design
      </Link>
    </DeadEnd>
  );
}
