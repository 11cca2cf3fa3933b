import 'server-only';
import { database } from '@/db/client';
import { type ClubSettings, findClub, setClub } from '@/db/queries/club';
import { permit, type Viewer } from './policy';
import { audited } from './transact';

export type { ClubSettings };

const settingsOf = (club: ClubSettings | undefined): ClubSettings | null =>
  club ? { name: club.name, contactEmail: club.contactEmail } : null;

/** Anyone may know whose Bendwell this is and whom to ask. */
export const clubFacts = (): ClubSettings | null => settingsOf(findClub(database()));

export const clubName = (): string | null => clubFacts()?.name ?? null;

export function readClub(viewer: Viewer): ClubSettings | null {
  permit(viewer, 'club.manage');
  return clubFacts();
}

export function changeClub(viewer: Viewer, settings: ClubSettings): void {
  const actor = permit(viewer, 'club.manage');
  audited(actor, { action: 'club.settings', subject: settings.name, detail: { ...settings } }, (tx, now) =>
    setClub(tx, settings, now),
  );
}
