import { ArrowLeft } from 'lucide-react';
import Link from 'next/link';
import type { ReactNode } from 'react';

/** The way back, over a page's title. */
export const BackLink = ({ href, children }: { href: string; children: ReactNode }) => (
  <Link
    href={href}
    className="inline-flex min-h-9 items-center gap-1.5 text-muted text-sm underline underline-offset-4 hover:text-ink"
  >
    <ArrowLeft aria-hidden="true" size={15} />
    {children}
  </Link>
);
