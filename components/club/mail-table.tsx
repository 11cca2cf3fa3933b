import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { Moment } from '@/components/ui/moment';
import type { MailSummary } from '@/lib/access/outgoing-mail';
import type { FormAction } from '@/lib/forms/state';
import { Cell, EmptyRow, Row, Table } from './table';

const HEADS = ['Written', 'To', 'Subject', 'State'];

function State({ mail, sendAgain }: { mail: MailSummary; sendAgain: FormAction }) {
  if (mail.sent) {
    return (
      <span>
        sent <Moment at={mail.sent} />
      </span>
    );
  }
  const tries = `${mail.attempts} ${mail.attempts === 1 ? 'try' : 'tries'}`;
  return (
    <div className="grid justify-items-start gap-1.5">
      {mail.state === 'given-up' ? (
        <span className="font-semibold text-over">given up after {tries}</span>
      ) : (
        <span>
          {tries}, next <Moment at={mail.due} />
        </span>
      )}
      {mail.lastError && <span className="break-words text-muted text-sm">{mail.lastError}</span>}
      {mail.state === 'given-up' && (
        <ActionForm action={sendAgain}>
          <input type="hidden" name="id" value={mail.id} />
          <SubmitButton look="line" small>
            Send again
            <span className="sr-only"> to {mail.recipient}</span>
          </SubmitButton>
        </ActionForm>
      )}
    </div>
  );
}

export function MailTable({ mails, sendAgain }: { mails: readonly MailSummary[]; sendAgain: FormAction }) {
  return (
    <Table label="Outgoing mail" heads={HEADS}>
      {mails.length === 0 && <EmptyRow columns={HEADS.length}>No mail was written yet.</EmptyRow>}
      {mails.map((mail) => (
        <Row key={mail.id}>
          <Cell className="text-muted text-sm">
            <Moment at={mail.created} />
          </Cell>
          <Cell className="break-all">{mail.recipient}</Cell>
          <Cell className="font-semibold">{mail.subject}</Cell>
          <Cell className="text-sm">
            <State mail={mail} sendAgain={sendAgain} />
          </Cell>
        </Row>
      ))}
    </Table>
  );
}
