import type { Db } from '../client';
import { clubSettings } from '../schema/club';

export interface ClubSettings {
  readonly name: string;
  readonly contactEmail: string | null;
}

export const findClub = (db: Db) => db.select().from(clubSettings).get();

export function setClub(db: Db, settings: ClubSettings, changedAt: Date): void {
  const row = { id: 1, ...settings, changedAt };
  db.insert(clubSettings).values(row).onConflictDoUpdate({ target: clubSettings.id, set: row }).run();
}
