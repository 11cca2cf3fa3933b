import type { Family } from '@/generators/contract';
import { type Entries, type LinkEntries, linkEntries } from '@/generators/url-state';
import { presetTyped, type Typed } from './session';
import { tidyEntry } from './step-entry';

/** Kept work of another version is not read. */
const VERSION = 1;
const LONGEST = 8000;

const keyOf = (family: Family): string => `bendwell:design:${family.about.id}`;

function isTyped(value: unknown): value is Typed & { version: number } {
  if (typeof value !== 'object' || value === null) return false;
  const { version, entries, from } = value as Record<string, unknown>;
  return (
    version === VERSION &&
    (from === null || typeof from === 'string') &&
    typeof entries === 'object' &&
    entries !== null &&
    Object.values(entries).every((text) => typeof text === 'string')
  );
}

/** Kept work of this family; fields it no longer has are dropped, new ones take their default. */
export function keptWork(family: Family, storage: Pick<Storage, 'getItem'>): Typed | null {
  try {
    const text = storage.getItem(keyOf(family)) ?? 'null';
    const kept: unknown = text.length > LONGEST ? null : JSON.parse(text);
    if (!isTyped(kept)) return null;
    const known = Object.keys(presetTyped(family).entries);
    const entries = known.flatMap((key) => (key in kept.entries ? [[key, kept.entries[key]!]] : []));
    return { entries: { ...presetTyped(family).entries, ...Object.fromEntries(entries) }, from: kept.from };
  } catch {
    return null;
  }
}

/** False where the browser keeps nothing, as in private windows that are full. */
export function keepWork(
  family: Family,
  { entries, from }: Typed,
  storage: Pick<Storage, 'setItem'>,
): boolean {
  try {
    storage.setItem(keyOf(family), JSON.stringify({ version: VERSION, entries, from }));
    return true;
  } catch {
    return false;
  }
}

export function dropWork(family: Family, storage: Pick<Storage, 'removeItem'>): void {
  try {
    storage.removeItem(keyOf(family));
  } catch {
    return;
  }
}

export interface Start {
  readonly typed: Typed;
  /** names in the link that could not be used */
  readonly unused: Omit<LinkEntries, 'entries'>;
  /** true where the link says something about the part */
  readonly linked: boolean;
}

/** Numbers of a link written as their fields write them. */
function tidied(family: Family, entries: Entries): Entries {
  const { fields } = family.parameters;
  return Object.fromEntries(
    Object.entries(entries).map(([key, text]) => {
      const field = fields[key];
      return [key, field?.type === 'number' ? tidyEntry(field, text) : text];
    }),
  );
}

/** What the page opens with: the link where it says something, else the first preset. */
export function startOf(family: Family, query: string): Start {
  const { entries, ...unused } = linkEntries(family, query);
  const linked = Object.keys(entries).length > 0;
  return {
    typed: linked ? { entries: tidied(family, entries), from: null } : presetTyped(family),
    unused,
    linked,
  };
}
