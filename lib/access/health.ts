import 'server-only';
import { listMaterials } from './materials';

/** The process answers and its database can be read. */
export function health(): { status: 'ok'; materials: number } {
  return { status: 'ok', materials: listMaterials().length };
}
