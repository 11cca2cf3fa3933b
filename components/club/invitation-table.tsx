import { RoleList } from '@/components/account/role-list';
import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { Moment } from '@/components/ui/moment';
import type { InvitationSummary } from '@/lib/access/invitations';
import type { FormAction } from '@/lib/forms/state';
import { Cell, EmptyRow, Row, Table } from './table';

const HEADS = ['Address', 'Roles', 'Sent', 'State'];

function State({ invitation, withdraw }: { invitation: InvitationSummary; withdraw: FormAction }) {
  if (invitation.state !== 'open') return <span className="text-muted">{invitation.state}</span>;
  return (
    <ActionForm
      action={withdraw}
      label={`Withdraw the invitation to ${invitation.email}`}
      className="justify-items-start gap-2"
    >
      <span>
        open until <Moment at={invitation.expires} />
      </span>
      <input type="hidden" name="id" value={invitation.id} />
      <SubmitButton look="line" small>
        Withdraw
      </SubmitButton>
    </ActionForm>
  );
}

export function InvitationTable({
  invitations,
  withdraw,
}: {
  invitations: readonly InvitationSummary[];
  withdraw: FormAction;
}) {
  return (
    <Table label="Invitations" heads={HEADS}>
      {invitations.length === 0 && <EmptyRow columns={HEADS.length}>Nobody was invited yet.</EmptyRow>}
      {invitations.map((invitation) => (
        <Row key={invitation.id}>
          <Cell className="break-all font-semibold">{invitation.email}</Cell>
          <Cell>
            <RoleList roles={invitation.roles} />
          </Cell>
          <Cell head="Sent" className="text-muted text-sm">
            <span>
              <Moment at={invitation.created} />
              {invitation.invitedBy && ` by ${invitation.invitedBy}`}
            </span>
          </Cell>
          <Cell>
            <State invitation={invitation} withdraw={withdraw} />
          </Cell>
        </Row>
      ))}
    </Table>
  );
}
