import { and, asc, count, desc, eq, inArray, isNull, lt, max, sql } from 'drizzle-orm';
import type { Db } from '../client';
import {
  favourites,
  presetPhotos,
  presetReports,
  presets,
  presetVersions,
  type VersionState,
} from '../schema/library';

export type NewVersion = Omit<
  typeof presetVersions.$inferInsert,
  'id' | 'number' | 'state' | 'decidedAt' | 'decidedBy' | 'decisionNote'
>;

const PUBLIC: readonly VersionState[] = ['published', 'retired'];
const isPublic = inArray(presetVersions.state, [...PUBLIC]);

const presetColumns = {
  id: presets.id,
  slug: presets.slug,
  authorId: presets.authorId,
  authorName: presets.authorName,
  designId: presets.designId,
  publishedVersionId: presets.publishedVersionId,
};

export type PresetRow = NonNullable<ReturnType<typeof findPreset>>;
export type VersionRow = NonNullable<ReturnType<typeof findVersion>>;

export const findPreset = (db: Db, slug: string) =>
  db.select(presetColumns).from(presets).where(eq(presets.slug, slug)).get();

export const findPresetById = (db: Db, id: string) =>
  db.select(presetColumns).from(presets).where(eq(presets.id, id)).get();

export const findPresetOfDesign = (db: Db, authorId: string, designId: string) =>
  db
    .select(presetColumns)
    .from(presets)
    .where(and(eq(presets.authorId, authorId), eq(presets.designId, designId)))
    .get();

export const findVersion = (db: Db, id: string) =>
  db.select().from(presetVersions).where(eq(presetVersions.id, id)).get();

export const findPublicVersion = (db: Db, id: string) =>
  db
    .select({
      id: presetVersions.id,
      family: presetVersions.family,
      title: presetVersions.title,
      slug: presets.slug,
    })
    .from(presetVersions)
    .innerJoin(presets, eq(presets.id, presetVersions.presetId))
    .where(and(eq(presetVersions.id, id), isPublic))
    .get();

/** Published and retired versions, newest first. */
export const publicVersions = (db: Db, presetId: string): VersionRow[] =>
  db
    .select()
    .from(presetVersions)
    .where(and(eq(presetVersions.presetId, presetId), isPublic))
    .orderBy(desc(presetVersions.number))
    .all();

/** Every version of one of the author's own presets, newest first. */
export const ownVersions = (db: Db, authorId: string, presetId: string): VersionRow[] =>
  db
    .select({ version: presetVersions })
    .from(presetVersions)
    .innerJoin(presets, eq(presets.id, presetVersions.presetId))
    .where(and(eq(presetVersions.presetId, presetId), eq(presets.authorId, authorId)))
    .orderBy(desc(presetVersions.number))
    .all()
    .map(({ version }) => version);

/** The version published before this one. */
export const versionBefore = (db: Db, presetId: string, number: number): VersionRow | undefined =>
  db
    .select()
    .from(presetVersions)
    .where(and(eq(presetVersions.presetId, presetId), isPublic, lt(presetVersions.number, number)))
    .orderBy(desc(presetVersions.number))
    .get();

export const slugTaken = (db: Db, slug: string): boolean =>
  db.select({ one: sql`1` }).from(presets).where(eq(presets.slug, slug)).get() !== undefined;

export const insertPreset = (db: Db, given: typeof presets.$inferInsert): PresetRow =>
  db.insert(presets).values(given).returning(presetColumns).get();

export function insertVersion(db: Db, given: NewVersion & { id?: string }): VersionRow {
  const last = db
    .select({ number: max(presetVersions.number) })
    .from(presetVersions)
    .where(eq(presetVersions.presetId, given.presetId))
    .get();
  return db
    .insert(presetVersions)
    .values({ ...given, number: (last?.number ?? 0) + 1, state: 'waiting' })
    .returning()
    .get();
}

export const countWaiting = (db: Db, authorId: string): number =>
  db
    .select({ found: count() })
    .from(presetVersions)
    .innerJoin(presets, eq(presets.id, presetVersions.presetId))
    .where(and(eq(presets.authorId, authorId), eq(presetVersions.state, 'waiting')))
    .get()?.found ?? 0;

export interface Decision {
  readonly state: VersionState;
  readonly by: string | null;
  readonly note: string | null;
  readonly at: Date;
}

/** Decides on a version that is waiting; undefined where it is not, or no longer. */
export const decideVersion = (
  db: Db,
  id: string,
  { state, by, note, at }: Decision,
): VersionRow | undefined =>
  db
    .update(presetVersions)
    .set({ state, decidedBy: by, decisionNote: note, decidedAt: at })
    .where(and(eq(presetVersions.id, id), eq(presetVersions.state, 'waiting')))
    .returning()
    .get();

/** Shows a version in the library, or none. */
export const showVersion = (db: Db, presetId: string, versionId: string | null, at: Date): void => {
  db.update(presets)
    .set({ publishedVersionId: versionId, changedAt: at })
    .where(eq(presets.id, presetId))
    .run();
};

export const retireVersions = (db: Db, presetId: string): void => {
  db.update(presetVersions)
    .set({ state: 'retired' })
    .where(and(eq(presetVersions.presetId, presetId), eq(presetVersions.state, 'published')))
    .run();
};

/** What waits for a librarian or was decided, with its preset. Waiting: oldest first; decided: newest first. */
export const listForReview = (db: Db, state: VersionState, limit: number, offset: number) =>
  db
    .select({
      id: presetVersions.id,
      number: presetVersions.number,
      state: presetVersions.state,
      title: presetVersions.title,
      purpose: presetVersions.purpose,
      family: presetVersions.family,
      material: presetVersions.material,
      verdict: presetVersions.verdict,
      handedInAt: presetVersions.handedInAt,
      decidedAt: presetVersions.decidedAt,
      decisionNote: presetVersions.decisionNote,
      slug: presets.slug,
      authorName: presets.authorName,
    })
    .from(presetVersions)
    .innerJoin(presets, eq(presets.id, presetVersions.presetId))
    .where(eq(presetVersions.state, state))
    .orderBy(state === 'waiting' ? asc(presetVersions.handedInAt) : desc(presetVersions.decidedAt))
    .limit(limit)
    .offset(offset)
    .all();

export const countByState = (db: Db): Readonly<Partial<Record<VersionState, number>>> =>
  Object.fromEntries(
    db
      .select({ state: presetVersions.state, found: count() })
      .from(presetVersions)
      .groupBy(presetVersions.state)
      .all()
      .map(({ state, found }) => [state, found]),
  );

const reportColumns = {
  id: presetReports.id,
  userId: presetReports.userId,
  userName: presetReports.userName,
  worked: presetReports.worked,
  printer: presetReports.printer,
  material: presetReports.material,
  note: presetReports.note,
  createdAt: presetReports.createdAt,
  version: presetVersions.number,
};

/** Reports on any version of a preset, newest first. */
export const listReports = (db: Db, presetId: string, limit: number) =>
  db
    .select(reportColumns)
    .from(presetReports)
    .innerJoin(presetVersions, eq(presetVersions.id, presetReports.versionId))
    .where(eq(presetVersions.presetId, presetId))
    .orderBy(desc(presetReports.createdAt))
    .limit(limit)
    .all();

/** One report a member and version: a second takes the place of the first. */
export const putReport = (db: Db, given: typeof presetReports.$inferInsert): void => {
  const { worked, printer, material, note, createdAt, userName } = given;
  db.insert(presetReports)
    .values(given)
    .onConflictDoUpdate({
      target: [presetReports.versionId, presetReports.userId],
      set: { worked, printer, material, note, createdAt, userName },
    })
    .run();
};

export const removeReport = (db: Db, userId: string, versionId: string): boolean =>
  db
    .delete(presetReports)
    .where(and(eq(presetReports.userId, userId), eq(presetReports.versionId, versionId)))
    .run().changes > 0;

export const isFavourite = (db: Db, userId: string, presetId: string): boolean =>
  db
    .select({ one: sql`1` })
    .from(favourites)
    .where(and(eq(favourites.userId, userId), eq(favourites.presetId, presetId)))
    .get() !== undefined;

export const addFavourite = (db: Db, userId: string, presetId: string, at: Date): void => {
  db.insert(favourites).values({ userId, presetId, createdAt: at }).onConflictDoNothing().run();
};

export const removeFavourite = (db: Db, userId: string, presetId: string): void => {
  db.delete(favourites)
    .where(and(eq(favourites.userId, userId), eq(favourites.presetId, presetId)))
    .run();
};

export type PhotoRow = typeof presetPhotos.$inferSelect;

export const photosOf = (db: Db, versionId: string): PhotoRow[] =>
  db
    .select()
    .from(presetPhotos)
    .where(eq(presetPhotos.versionId, versionId))
    .orderBy(asc(presetPhotos.position))
    .all();

/** A photo with the state of the version it belongs to; null before it is handed in. */
export const findPhoto = (db: Db, id: string) =>
  db
    .select({ photo: presetPhotos, state: presetVersions.state })
    .from(presetPhotos)
    .leftJoin(presetVersions, eq(presetVersions.id, presetPhotos.versionId))
    .where(eq(presetPhotos.id, id))
    .get();

export const insertPhoto = (db: Db, given: typeof presetPhotos.$inferInsert): PhotoRow =>
  db.insert(presetPhotos).values(given).returning().get();

/** Bytes and number of a member's photos. */
export const photoUse = (db: Db, ownerId: string): { photos: number; bytes: number } =>
  db
    .select({ photos: count(), bytes: sql<number>`coalesce(sum(${presetPhotos.bytes}), 0)` })
    .from(presetPhotos)
    .where(eq(presetPhotos.ownerId, ownerId))
    .get() ?? { photos: 0, bytes: 0 };

/** Joins an uploaded photo of the member to a version; false where it is not theirs or joined already. */
export const attachPhoto = (
  db: Db,
  ownerId: string,
  id: string,
  given: { versionId: string; alt: string; position: number },
): boolean =>
  db
    .update(presetPhotos)
    .set(given)
    .where(and(eq(presetPhotos.id, id), eq(presetPhotos.ownerId, ownerId), isNull(presetPhotos.versionId)))
    .run().changes > 0;

/** Forgets photos of the member that were uploaded before a moment and never handed in; tells their files. */
export const forgetLoosePhotos = (db: Db, ownerId: string, before: Date): string[] =>
  db
    .delete(presetPhotos)
    .where(
      and(
        eq(presetPhotos.ownerId, ownerId),
        isNull(presetPhotos.versionId),
        lt(presetPhotos.createdAt, before),
      ),
    )
    .returning({ file: presetPhotos.file })
    .all()
    .map(({ file }) => file);

/** Removes an uploaded photo of the member that was not handed in; tells its file. */
export const removeLoosePhoto = (db: Db, ownerId: string, id: string): string | undefined =>
  db
    .delete(presetPhotos)
    .where(and(eq(presetPhotos.id, id), eq(presetPhotos.ownerId, ownerId), isNull(presetPhotos.versionId)))
    .returning({ file: presetPhotos.file })
    .get()?.file;
