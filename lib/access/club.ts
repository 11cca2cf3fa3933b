import 'server-only';
import { database } from '@/db/client';
import { findClub } from '@/db/queries/club';

/** Anyone may know whose Bendwell this is. */
export const clubName = (): string | null => findClub(database())?.name ?? null;
