import type { Db } from '../client';
import { clubSettings } from '../schema/club';

export const findClub = (db: Db) => db.select().from(clubSettings).get();
