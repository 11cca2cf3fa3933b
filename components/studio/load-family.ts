import { familyEntry } from '@/generators';
import type { Family } from '@/generators/contract';

const loading = new Map<string, Promise<Family>>();

/** The family, loaded once; the same promise each time, so that a component can wait for it. */
export function loadFamily(id: string): Promise<Family> {
  const known = loading.get(id);
  if (known) return known;
  const entry = familyEntry(id);
  if (!entry) return Promise.reject(new Error(`no family ${id}`));
  const family = entry.load();
  loading.set(id, family);
  family.catch(() => loading.delete(id));
  return family;
}
