import 'server-only';
import { database } from '@/db/client';
import { findPublicVersion } from '@/db/queries/presets';
import { InvalidInput } from '@/lib/errors';

/** The version of a preset a design says it started from: one that is in the library, of the same family. */
export function startedFromVersion(id: string | undefined, family: string): string | null {
  if (id === undefined) return null;
  const version = findPublicVersion(database(), id);
  if (version?.family !== family) {
    const message = 'startedFrom must be a published version of a preset of the same family';
    throw new InvalidInput([{ field: 'startedFrom', message }]);
  }
  return id;
}
