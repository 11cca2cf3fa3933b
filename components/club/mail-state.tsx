import { MailWarning } from 'lucide-react';
import type { OutgoingMail } from '@/lib/access/outgoing-mail';

const NAMES = { waiting: 'waiting', sending: 'being sent', sent: 'sent', 'given-up': 'given up' } as const;

function Server({ server, mailBox }: Pick<OutgoingMail, 'server' | 'mailBox'>) {
  if (server === null) {
    return (
      <p className="flex items-start gap-2 text-near">
        <MailWarning aria-hidden="true" size={20} className="mt-0.5 shrink-0" />
        No mail server is set, so mail waits here. Set SMTP_URL and start again; nothing is lost.
      </p>
    );
  }
  return (
    <p>
      Sent through <span className="font-mono text-sm">{server}</span>.{' '}
      {mailBox && (
        <a href={mailBox} className="marked font-semibold" target="_blank" rel="noreferrer">
          Read what was sent
        </a>
      )}
    </p>
  );
}

export function MailState({ outgoing }: { outgoing: OutgoingMail }) {
  return (
    <div className="mb-5 grid gap-3">
      <dl className="flex flex-wrap gap-x-8 gap-y-2">
        {(['waiting', 'sending', 'sent', 'given-up'] as const).map((state) => (
          <div key={state} className="flex flex-col-reverse">
            <dt className="text-muted text-sm">{NAMES[state]}</dt>
            <dd className="font-bold font-heading text-3xl tabular-nums">{outgoing.counts[state]}</dd>
          </div>
        ))}
      </dl>
      <Server server={outgoing.server} mailBox={outgoing.mailBox} />
    </div>
  );
}
