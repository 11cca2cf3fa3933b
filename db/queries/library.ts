import { and, asc, desc, eq, inArray, lt, lte, type SQL, sql } from 'drizzle-orm';
import type { Verdict } from '@/generators/report';
import type { Db } from '../client';
import { libraryEntries as entries, favourites } from '../schema/library';

export const LIBRARY_SORTS = ['best', 'newest', 'worked', 'favourites', 'title'] as const;
export type LibrarySort = (typeof LIBRARY_SORTS)[number];
/** Longest edges that can be asked for, mm; the index has a word for each. */
export const LIBRARY_SIZES = [50, 100, 180, 250] as const;

export interface LibraryFilter {
  readonly text?: string | undefined;
  readonly kind?: string | undefined;
  readonly material?: string | undefined;
  readonly verdict?: Verdict | undefined;
  readonly fits?: (typeof LIBRARY_SIZES)[number] | undefined;
  /** printable without an enclosure */
  readonly open: boolean;
  /** favourites of this member only */
  readonly favouriteOf?: string | undefined;
  readonly sort: LibrarySort;
  /** continue after this entry */
  readonly after?: { readonly row: number; readonly value: number | string } | undefined;
  readonly limit: number;
}

const columns = {
  row: entries.row,
  slug: entries.slug,
  versionId: entries.versionId,
  title: entries.title,
  purpose: entries.purpose,
  author: entries.author,
  family: entries.family,
  kind: entries.kind,
  material: entries.material,
  verdict: entries.verdict,
  strainShare: entries.strainShare,
  longest: entries.longest,
  enclosure: entries.enclosure,
  worked: entries.worked,
  failed: entries.failed,
  favourites: entries.favourites,
  publishedAt: entries.publishedAt,
};

const EVERYWHERE = 'title purpose tags author family notes';
const MOST_WORDS = 8;
/** Matches that are counted, and of a text those that are sorted by something else than their order: the newest. */
export const LIBRARY_REACH = 3000;

/**
 * What is typed, as an expression of the full-text index: each word in quotes, the last as a beginning. Nothing typed
 * has a meaning of its own there, so that no input is a syntax error.
 */
export function matchText(text: string, columns = EVERYWHERE): string | null {
  const words =
    text
      .normalize('NFC')
      .match(/[\p{L}\p{N}]+/gu)
      ?.slice(0, MOST_WORDS) ?? [];
  if (words.length === 0) return null;
  const quoted = words.map((word, at) => `"${word.slice(0, 40)}"${at === words.length - 1 ? '*' : ''}`);
  return `{${columns}} : (${quoted.join(' AND ')})`;
}

const word = (given: string): string => given.replaceAll(/[^\p{L}\p{N}]/gu, '');

/** What is asked besides the text, as words of the index. */
function facetsOf({ kind, material, verdict, fits, open }: LibraryFilter): string | null {
  const facets = [
    kind && `kind${word(kind)}`,
    material && `material${word(material)}`,
    verdict && `verdict${word(verdict)}`,
    fits && `fits${fits}`,
    open && 'enclosurefree',
  ].filter((one): one is string => Boolean(one));
  return facets.length > 0 ? `facets : (${facets.map((one) => `"${one}"`).join(' AND ')})` : null;
}

/** The whole filter as one expression of the index, or null where nothing is asked. */
function matchOf(filter: LibraryFilter): string | null {
  const parts = [filter.text ? matchText(filter.text) : null, facetsOf(filter)].filter((one) => one !== null);
  return parts.length > 0 ? parts.join(' AND ') : null;
}

/** The same in two parts: what has the words in its title, then the rest. */
function bestFirst(filter: LibraryFilter): readonly [string, string] | null {
  const match = matchOf(filter);
  const title = filter.text ? matchText(filter.text, 'title') : null;
  if (match === null || title === null) return null;
  const facets = facetsOf(filter);
  return [facets === null ? title : `${title} AND ${facets}`, `(${match}) NOT ${title}`];
}

/** Entries that match, the newest of them where there are very many. */
const matching = (match: string): SQL =>
  sql`${entries.row} in (select rowid from library_search where library_search match ${match}
      order by rowid desc limit ${LIBRARY_REACH})`;

/** The filters as conditions on the entries, for walking these in their order. */
function conditions({ kind, material, verdict, fits, open }: LibraryFilter): SQL | undefined {
  return and(
    kind ? eq(entries.kind, kind) : undefined,
    material ? eq(entries.material, material) : undefined,
    verdict ? eq(entries.verdict, verdict) : undefined,
    fits ? lte(entries.longest, fits) : undefined,
    open ? inArray(entries.enclosure, ['not-needed', 'helpful']) : undefined,
  );
}

function countUpTo(db: Db, match: string, most: number): number {
  const [found] = db.all<{ found: number }>(
    sql`select count(*) as found from (select 1 from library_search where library_search match ${match} limit ${most})`,
  );
  return found?.found ?? 0;
}

const SORTED_BY = { worked: entries.worked, favourites: entries.favourites, title: entries.title } as const;
const byRow = (sort: LibrarySort): sort is 'best' | 'newest' => sort === 'best' || sort === 'newest';

function orderOf(sort: LibrarySort): SQL[] {
  if (byRow(sort)) return [desc(entries.row)];
  return sort === 'title'
    ? [asc(entries.title), asc(entries.row)]
    : [desc(SORTED_BY[sort]), desc(entries.row)];
}

function afterOf({ sort, after }: LibraryFilter): SQL | undefined {
  if (!after) return undefined;
  if (byRow(sort)) return lt(entries.row, after.row);
  const order = sql.raw(sort === 'title' ? '>' : '<');
  return sql`(${SORTED_BY[sort]}, ${entries.row}) ${order} (${after.value}, ${after.row})`;
}

const favouritesOf = (userId: string | undefined): SQL | undefined =>
  userId === undefined
    ? undefined
    : sql`${entries.presetId} in (select ${favourites.presetId} from ${favourites} where ${favourites.userId} = ${userId})`;

/** Newest first: the index gives the rows in that very order and stops when the page is full. */
function newestMatches(db: Db, match: string, before: number, limit: number): number[] {
  return db
    .all<{ row: number }>(
      sql`select rowid as "row" from library_search where library_search match ${match} and rowid < ${before}
          order by rowid desc limit ${limit}`,
    )
    .map(({ row }) => row);
}

/** Rows of a page in order: those with the words in their title first, where `value` of the last entry seen is 1. */
function rowsByRow(db: Db, match: string, filter: LibraryFilter): number[] {
  const { after, limit } = filter;
  const before = after?.row ?? Number.MAX_SAFE_INTEGER;
  const stages = filter.sort === 'best' ? bestFirst(filter) : null;
  if (!stages) return newestMatches(db, match, before, limit);
  const [titled, rest] = stages;
  if (after?.value === 0) return newestMatches(db, rest, before, limit);
  const first = newestMatches(db, titled, before, limit);
  if (first.length === limit) return first;
  return [...first, ...newestMatches(db, rest, Number.MAX_SAFE_INTEGER, limit - first.length)];
}

const select = (db: Db, where: SQL | undefined) => db.select(columns).from(entries).where(where).$dynamic();

/** The page of a search in the index's own order. */
function pageByRow(db: Db, match: string, filter: LibraryFilter) {
  const rows = rowsByRow(db, match, filter);
  if (rows.length === 0) return [];
  const found = new Map(
    select(db, sql`${entries.row} in ${rows}`)
      .all()
      .map((entry) => [entry.row, entry]),
  );
  return rows.flatMap((row) => found.get(row) ?? []);
}

/** Few matches are sorted; filters that many entries pass are met while walking the entries in order. */
function matched(db: Db, match: string, filter: LibraryFilter): SQL | undefined {
  const walks = !filter.text && countUpTo(db, match, LIBRARY_REACH) === LIBRARY_REACH;
  return walks ? conditions(filter) : matching(match);
}

export type EntryRow = ReturnType<typeof searchLibrary>[number];

export function searchLibrary(db: Db, filter: LibraryFilter) {
  const { sort, favouriteOf, limit } = filter;
  const match = matchOf(filter);
  if (match !== null && byRow(sort) && favouriteOf === undefined) return pageByRow(db, match, filter);
  const where = and(
    match === null ? undefined : matched(db, match, filter),
    afterOf(filter),
    favouritesOf(favouriteOf),
  );
  return select(db, where)
    .orderBy(...orderOf(sort))
    .limit(limit)
    .all();
}

/** Whether an entry has the words of a search in its title: where a search for the best goes on from. */
export function isTitled(db: Db, text: string, row: number): boolean {
  const title = matchText(text, 'title');
  if (title === null) return false;
  return (
    db.all(sql`select 1 from library_search where library_search match ${title} and rowid = ${row}`).length >
    0
  );
}

/** How many entries fit, counted up to the reach of a search. */
export function countLibrary(
  db: Db,
  filter: LibraryFilter,
): { readonly found: number; readonly more: boolean } {
  const match = matchOf(filter);
  const where = and(match === null ? undefined : matching(match), favouritesOf(filter.favouriteOf));
  const found =
    match !== null && filter.favouriteOf === undefined
      ? countUpTo(db, match, LIBRARY_REACH + 1)
      : (db.get<{ found: number }>(
          sql`select count(*) as found from (select 1 from ${entries} where ${where ?? sql`1`} limit ${LIBRARY_REACH + 1})`,
        )?.found ?? 0);
  return { found: Math.min(found, LIBRARY_REACH), more: found > LIBRARY_REACH };
}
