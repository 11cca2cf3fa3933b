import 'server-only';
import { type Design as Part, writeLink } from '@/generators/url-state';
import type { Use } from '@/lib/materials/types';
import { loadFamily } from './families';

export interface Linked {
  readonly family: string;
  readonly material: string;
  readonly use: Use;
  readonly parameters: Readonly<Record<string, unknown>>;
}

/** A design as the query of a link, without "?". */
export async function designLink({ family, material, use, parameters }: Linked): Promise<string> {
  const values = parameters as Part['values'];
  return writeLink(await loadFamily(family), { values, material, use });
}
