import Link from 'next/link';
import { DeadEnd } from '@/components/layout/dead-end';
import { buttonClass } from '@/components/ui/button';

const NEXT = {
  invitation: { text: 'Ask whoever invited you to send a new one.', href: '/', label: 'To the first page' },
  reset: {
    text: 'Ask for a new link; it works for half an hour.',
    href: '/forgot-password',
    label: 'Ask for a new link',
  },
  confirmation: {
    text: 'Ask for a new link on your account page.',
    href: '/account',
    label: 'To your account',
  },
} as const;

/** Where a link of a mail leads that was used, is too old, or was never one of ours. */
export function SpentLink({ kind }: { kind: keyof typeof NEXT }) {
  const { text, href, label } = NEXT[kind];
  return (
    <DeadEnd mark="✕" title="This link is no longer good">
      <p>It was used already, is too old, or a newer one was sent. {text}</p>
      <Link href={href} className={buttonClass('ink')}>
        {label}
      </Link>
    </DeadEnd>
  );
}
