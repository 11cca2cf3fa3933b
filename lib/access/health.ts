import 'server-only';
import { database } from '@/db/client';
import { countMaterials } from '@/db/queries/materials';

/** The process answers and its database can be read. */
export function health(): { status: 'ok'; materials: number } {
  return { status: 'ok', materials: countMaterials(database()) };
}
