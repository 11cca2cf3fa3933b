import { and, asc, count, desc, eq, isNotNull, isNull, like, lt, type SQL, sql } from 'drizzle-orm';
import type { Verdict } from '@/generators/report';
import type { Use } from '@/lib/materials/types';
import type { Db } from '../client';
import { designStates, designs } from '../schema/designs';

export interface Content {
  readonly family: string;
  readonly material: string;
  readonly use: Use;
  readonly values: Record<string, unknown>;
  readonly verdict: Verdict;
}

const content = {
  family: designs.family,
  material: designs.material,
  use: designs.use,
  values: designs.values,
  verdict: designs.verdict,
};

const columns = {
  id: designs.id,
  name: designs.name,
  ...content,
  startedFrom: designs.startedFrom,
  revision: designs.revision,
  createdAt: designs.createdAt,
  changedAt: designs.changedAt,
};

const mine = (ownerId: string, id: string) => and(eq(designs.id, id), eq(designs.ownerId, ownerId));
const kept = (ownerId: string, id: string) => and(mine(ownerId, id), isNull(designs.deletedAt));

export type DesignRow = NonNullable<ReturnType<typeof findDesign>>;

export const findDesign = (db: Db, ownerId: string, id: string) =>
  db.select(columns).from(designs).where(kept(ownerId, id)).get();

export const countDesigns = (db: Db, ownerId: string): number =>
  db.select({ found: count() }).from(designs).where(eq(designs.ownerId, ownerId)).get()?.found ?? 0;

export const DESIGN_SORTS = ['changed', 'name', 'family', 'material', 'verdict'] as const;
export type DesignSort = (typeof DESIGN_SORTS)[number];

export interface DesignFilter {
  readonly search?: string | undefined;
  readonly family?: string | undefined;
  readonly material?: string | undefined;
  readonly verdict?: Verdict | undefined;
  readonly deleted: boolean;
  readonly sort: DesignSort;
  readonly descending: boolean;
  readonly limit: number;
  readonly offset: number;
}

/** Worst last. */
const verdictRank = sql`case ${designs.verdict} when 'within-limit' then 0 when 'close-to-limit' then 1 when 'not-known' then 2 else 3 end`;

const SORTED_BY: Readonly<Record<DesignSort, SQL>> = {
  changed: sql`${designs.changedAt}`,
  name: sql`${designs.name} collate nocase`,
  family: sql`${designs.family}`,
  material: sql`${designs.material}`,
  verdict: verdictRank,
};

const holding = (text: string): string => `%${text.replace(/[\\%_]/g, '\\$&')}%`;

function whereOf(ownerId: string, filter: DesignFilter) {
  const { search, family, material, verdict, deleted } = filter;
  return and(
    eq(designs.ownerId, ownerId),
    deleted ? isNotNull(designs.deletedAt) : isNull(designs.deletedAt),
    search ? sql`${like(designs.name, holding(search))} escape '\\'` : undefined,
    family ? eq(designs.family, family) : undefined,
    material ? eq(designs.material, material) : undefined,
    verdict ? eq(designs.verdict, verdict) : undefined,
  );
}

export function listDesigns(db: Db, ownerId: string, filter: DesignFilter) {
  const where = whereOf(ownerId, filter);
  const order = filter.descending ? desc : asc;
  const rows = db
    .select(columns)
    .from(designs)
    .where(where)
    .orderBy(order(SORTED_BY[filter.sort]), desc(designs.changedAt), asc(designs.id))
    .limit(filter.limit)
    .offset(filter.offset)
    .all();
  const total = db.select({ found: count() }).from(designs).where(where).get()?.found ?? 0;
  return { rows, total };
}

export interface NewDesign extends Content {
  readonly id?: string;
  readonly name: string;
  readonly startedFrom: string | null;
}

export const insertDesign = (db: Db, ownerId: string, given: NewDesign, at: Date): DesignRow =>
  db
    .insert(designs)
    .values({ ...given, ownerId, createdAt: at, changedAt: at })
    .returning(columns)
    .get();

/** Changes the design if it still stands at `revision`; undefined when it does not, or is not the owner's. */
export const updateDesign = (
  db: Db,
  ownerId: string,
  id: string,
  revision: number,
  given: Content,
  at: Date,
): DesignRow | undefined =>
  db
    .update(designs)
    .set({ ...given, revision: revision + 1, changedAt: at })
    .where(and(kept(ownerId, id), eq(designs.revision, revision)))
    .returning(columns)
    .get();

export const renameDesign = (
  db: Db,
  ownerId: string,
  id: string,
  name: string,
  at: Date,
): DesignRow | undefined =>
  db.update(designs).set({ name, changedAt: at }).where(kept(ownerId, id)).returning(columns).get();

export const setDeleted = (db: Db, ownerId: string, id: string, at: Date | null): boolean =>
  db
    .update(designs)
    .set({ deletedAt: at })
    .where(and(mine(ownerId, id), at ? isNull(designs.deletedAt) : isNotNull(designs.deletedAt)))
    .run().changes > 0;

/** Forgets what the owner deleted before a moment. */
export const forgetDeleted = (db: Db, ownerId: string, before: Date): void => {
  db.delete(designs)
    .where(and(eq(designs.ownerId, ownerId), lt(designs.deletedAt, before)))
    .run();
};

const stateColumns = {
  revision: designStates.revision,
  name: designStates.name,
  family: designStates.family,
  material: designStates.material,
  use: designStates.use,
  values: designStates.values,
  verdict: designStates.verdict,
  savedAt: designStates.savedAt,
};

const statesOf = (db: Db, ownerId: string, designId: string) =>
  db
    .select(stateColumns)
    .from(designStates)
    .innerJoin(designs, eq(designs.id, designStates.designId))
    .where(kept(ownerId, designId))
    .$dynamic();

export type StateRow = ReturnType<typeof listStates>[number];

/** Newest first. */
export const listStates = (db: Db, ownerId: string, designId: string) =>
  statesOf(db, ownerId, designId).orderBy(desc(designStates.revision)).all();

export const findState = (db: Db, ownerId: string, designId: string, revision: number) =>
  statesOf(db, ownerId, designId)
    .where(and(kept(ownerId, designId), eq(designStates.revision, revision)))
    .get();

const lastState = (db: Db, designId: string) =>
  db
    .select({ id: designStates.id, revision: designStates.revision, begunAt: designStates.begunAt })
    .from(designStates)
    .where(eq(designStates.designId, designId))
    .orderBy(desc(designStates.revision))
    .get();

/** Keeps the newest `most` states of a design. */
const trimStates = (db: Db, designId: string, most: number): void => {
  db.run(sql`delete from ${designStates} where ${designStates.designId} = ${designId} and ${designStates.revision} not in
    (select ${designStates.revision} from ${designStates} where ${designStates.designId} = ${designId}
     order by ${designStates.revision} desc limit ${most})`);
};

/**
 * Adds the design as it stands to its history. Takes the place of a last state begun after `joins`, so that a run of
 * saves is one state; the first state stays.
 */
export function recordState(db: Db, design: DesignRow, joins: Date, most: number): void {
  const { id: designId, revision, name, family, material, use, values, verdict, changedAt } = design;
  const state = { revision, name, family, material, use, values, verdict, savedAt: changedAt };
  const last = lastState(db, designId);
  if (last && last.revision > 1 && last.begunAt > joins) {
    db.update(designStates).set(state).where(eq(designStates.id, last.id)).run();
    return;
  }
  db.insert(designStates)
    .values({ ...state, designId, begunAt: changedAt })
    .run();
  trimStates(db, designId, most);
}
