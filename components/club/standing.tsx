import { Ban, CircleCheck, MailQuestion } from 'lucide-react';
import type { MemberSummary } from '@/lib/access/members';

const STANDINGS = {
  suspended: { Icon: Ban, text: 'suspended', class: 'text-over' },
  unconfirmed: { Icon: MailQuestion, text: 'address not confirmed', class: 'text-near' },
  good: { Icon: CircleCheck, text: 'in good standing', class: 'text-ok' },
} as const;

function standingOf({ suspended, emailConfirmed }: MemberSummary): keyof typeof STANDINGS {
  if (suspended) return 'suspended';
  return emailConfirmed ? 'good' : 'unconfirmed';
}

export function Standing({ member }: { member: MemberSummary }) {
  const { Icon, text, class: colour } = STANDINGS[standingOf(member)];
  return (
    <span className={`inline-flex items-center gap-1.5 whitespace-nowrap font-medium text-sm ${colour}`}>
      <Icon aria-hidden="true" size={16} />
      {text}
    </span>
  );
}
