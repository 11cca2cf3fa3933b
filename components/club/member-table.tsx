import Link from 'next/link';
import { RoleList } from '@/components/account/role-list';
import { Moment } from '@/components/ui/moment';
import type { MemberSummary } from '@/lib/access/members';
import { Standing } from './standing';
import { Cell, EmptyRow, Row, Table } from './table';

const HEADS = ['Name', 'Address', 'Roles', 'Standing', 'Last seen'];

export function MemberTable({ members }: { members: readonly MemberSummary[] }) {
  return (
    <Table label="Members" heads={HEADS}>
      {members.length === 0 && <EmptyRow columns={HEADS.length}>Nobody goes by that.</EmptyRow>}
      {members.map((member) => (
        <Row key={member.id}>
          <Cell>
            <Link
              href={`/admin/members/${member.id}`}
              className="inline-block min-h-6 font-semibold underline decoration-hair underline-offset-4 hover:decoration-petrol"
            >
              {member.name}
            </Link>
          </Cell>
          <Cell className="break-all">{member.email}</Cell>
          <Cell>
            <RoleList roles={member.roles} />
          </Cell>
          <Cell>
            <Standing member={member} />
          </Cell>
          <Cell head="Last seen" className="text-muted text-sm">
            {member.seen ? <Moment at={member.seen} /> : 'not signed in'}
          </Cell>
        </Row>
      ))}
    </Table>
  );
}
