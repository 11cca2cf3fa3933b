import type { Metadata } from 'next';
import { AdminHead } from '@/components/club/admin-head';
import { MemberTable } from '@/components/club/member-table';
import { Pager } from '@/components/club/pager';
import { SearchBox } from '@/components/club/search-box';
import { listMembers, MEMBERS_PER_PAGE } from '@/lib/access/members';
import { type Asked, askedFor, pageAsked, readPage } from '@/lib/http/page';

export const metadata: Metadata = { title: 'Members' };

export default async function MembersPage({ searchParams }: { searchParams: Asked }) {
  const search = (await askedFor(searchParams, 'q', 100)) ?? '';
  const page = await pageAsked(searchParams);
  const { members, found } = await readPage('/admin', (viewer) => listMembers(viewer, search, page));
  return (
    <main>
      <AdminHead title="Members" lead={`${found} ${search ? 'found' : 'in the club'}`}>
        <SearchBox label="Name or address" value={search} />
      </AdminHead>
      <MemberTable members={members} />
      <Pager page={page} pages={Math.ceil(found / MEMBERS_PER_PAGE)} query={{ q: search }} />
    </main>
  );
}
