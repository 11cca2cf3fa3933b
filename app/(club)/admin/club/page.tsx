import type { Metadata } from 'next';
import { AdminHead } from '@/components/club/admin-head';
import { BackupSheet } from '@/components/club/backup-sheet';
import { ClubForm } from '@/components/club/club-form';
import { readClub } from '@/lib/access/club';
import { readPage } from '@/lib/http/page';
import { changeClubAction } from './actions';

export const metadata: Metadata = { title: 'Club and backup' };

export default async function ClubPage() {
  const club = await readPage('/admin/club', readClub);
  return (
    <main>
      <AdminHead title="Club and backup" />
      <div className="grid items-start gap-6 lg:grid-cols-2">
        <ClubForm club={club} action={changeClubAction} />
        <BackupSheet />
      </div>
    </main>
  );
}
