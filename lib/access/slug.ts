import 'server-only';
import { database } from '@/db/client';
import { slugTaken } from '@/db/queries/presets';

const LONGEST = 60;

const plain = (title: string): string =>
  title
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, LONGEST)
    .replace(/^-+|-+$/g, '') || 'preset';

/** A name for the address after the title, with a number where the title was used before. */
export function freeSlug(title: string): string {
  const base = plain(title);
  for (let number = 1; ; number += 1) {
    const slug = number === 1 ? base : `${base}-${number}`;
    if (!slugTaken(database(), slug)) return slug;
  }
}
