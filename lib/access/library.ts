import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/library';
import type { Verdict } from '@/generators/report';
import { permit, type Viewer } from './policy';

export type LibrarySort = queries.LibrarySort;
export type LibrarySize = (typeof queries.LIBRARY_SIZES)[number];

export interface LibraryEntry {
  readonly slug: string;
  readonly versionId: string;
  readonly title: string;
  readonly purpose: string;
  readonly author: string;
  readonly family: string;
  readonly kind: string;
  readonly material: string;
  readonly verdict: Verdict;
  /** share of the limit in use when handed in; null where not known */
  readonly strainShare: number | null;
  /** longest edge on the bed, mm */
  readonly longest: number;
  readonly enclosure: 'needed' | 'helpful' | 'not-needed' | null;
  readonly worked: number;
  readonly failed: number;
  readonly favourites: number;
  readonly publishedAt: string;
}

export interface LibraryWish {
  readonly text?: string | undefined;
  readonly kind?: string | undefined;
  readonly material?: string | undefined;
  readonly verdict?: Verdict | undefined;
  readonly fits?: LibrarySize | undefined;
  readonly open?: boolean;
  /** only the viewer's favourites */
  readonly favourites?: boolean;
  readonly sort?: LibrarySort | undefined;
  /** where the page before ended, as given with it */
  readonly after?: string | undefined;
}

export interface LibraryPage {
  readonly entries: readonly LibraryEntry[];
  readonly found: number;
  /** there are more than `found` */
  readonly more: boolean;
  readonly sort: LibrarySort;
  /** sorted among the newest so many of them; null where all are */
  readonly sortedAmong: number | null;
  /** to go on from; null on the last page */
  readonly next: string | null;
}

const PER_PAGE = 24;

function readCursor(after: string | undefined): queries.LibraryFilter['after'] {
  const match = /^(\d{1,12})~(.{0,120})$/u.exec(after ?? '');
  if (!match) return undefined;
  const [, row, value] = match;
  return { row: Number(row), value: /^\d{1,9}$/.test(value!) ? Number(value) : value! };
}

function cursorOf(entry: queries.EntryRow, sort: LibrarySort, text: string | undefined): string {
  const value = {
    best: () => (text && queries.isTitled(database(), text, entry.row) ? 1 : 0),
    newest: () => 0,
    worked: () => entry.worked,
    favourites: () => entry.favourites,
    title: () => entry.title.slice(0, 120),
  }[sort]();
  return `${entry.row}~${value}`;
}

const entryOf = ({ row: _, publishedAt, ...entry }: queries.EntryRow): LibraryEntry => ({
  ...entry,
  publishedAt: publishedAt.toISOString(),
});

/** A page of the club library: open to anyone, a member's favourites to that member. */
export function searchLibrary(viewer: Viewer, wish: LibraryWish = {}): LibraryPage {
  const { text, open = false, favourites = false, after, ...rest } = wish;
  const sort = wish.sort ?? (text ? 'best' : 'newest');
  const favouriteOf = favourites ? permit(viewer, 'preset.favourite').id : undefined;
  const filter = { ...rest, text, open, sort, favouriteOf, after: readCursor(after), limit: PER_PAGE + 1 };
  const rows = queries.searchLibrary(database(), filter);
  const shown = rows.slice(0, PER_PAGE);
  const { found, more } = queries.countLibrary(database(), filter);
  const sorted = sort !== 'best' && sort !== 'newest';
  return {
    entries: shown.map(entryOf),
    found,
    more,
    sort,
    sortedAmong: more && sorted && text ? queries.LIBRARY_REACH : null,
    next: rows.length > PER_PAGE ? cursorOf(shown.at(-1)!, sort, text) : null,
  };
}
