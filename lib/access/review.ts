import 'server-only';
import { database } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import * as queries from '@/db/queries/presets';
import type { VersionState } from '@/db/schema/library';
import type { Figure, Report } from '@/generators/report';
import { Conflict, NotFound } from '@/lib/errors';
import { limitShare, readContent } from './design-content';
import { measureShape, type Picture, pictureOf } from './pictures';
import { permit, type Viewer } from './policy';
import { type PresetVersion, versionOf } from './presets';

export type ReviewItem = ReturnType<typeof listReview>['items'][number];

export const REVIEWS_PER_PAGE = 30;

/** Versions in a state, for librarians. */
export function listReview(viewer: Viewer, state: VersionState, page = 1) {
  permit(viewer, 'preset.review');
  const offset = (page - 1) * REVIEWS_PER_PAGE;
  const rows = queries.listForReview(database(), state, REVIEWS_PER_PAGE, offset);
  const counts = queries.countByState(database());
  const items = rows.map(({ handedInAt, decidedAt, ...row }) => ({
    ...row,
    handedInAt: handedInAt.toISOString(),
    decidedAt: decidedAt?.toISOString() ?? null,
  }));
  return { items, counts, pages: Math.max(1, Math.ceil((counts[state] ?? 0) / REVIEWS_PER_PAGE)) };
}

function versionRow(id: string) {
  const row = queries.findVersion(database(), id);
  const preset = row && queries.findPresetById(database(), row.presetId);
  if (!row || !preset) throw new NotFound('The version');
  return { row, preset };
}

export interface Review {
  readonly slug: string;
  readonly author: string;
  readonly version: PresetVersion;
  readonly before: PresetVersion | null;
  /** figures worked out now, and those of the version before; what is written in the version is of when it was handed in */
  readonly report: Report;
  readonly reportBefore: Report | null;
  readonly decision: { readonly by: string | null; readonly note: string | null } | null;
}

const reportOf = async ({ family, material, use, values }: queries.VersionRow): Promise<Report> =>
  (await readContent({ family, material, use, parameters: values })).report;

/** A version with all a librarian decides by: the one before it, and both checked again. */
export async function getReview(viewer: Viewer, id: string): Promise<Review> {
  permit(viewer, 'preset.review');
  const { row, preset } = versionRow(id);
  const before = queries.versionBefore(database(), row.presetId, row.number);
  return {
    slug: preset.slug,
    author: preset.authorName,
    version: versionOf(row),
    before: before ? versionOf(before) : null,
    report: await reportOf(row),
    reportBefore: before ? await reportOf(before) : null,
    decision: row.decidedAt ? { by: row.decidedBy, note: row.decisionNote } : null,
  };
}

export async function reviewPicture(viewer: Viewer, id: string): Promise<Picture> {
  permit(viewer, 'preset.review');
  const { row } = versionRow(id);
  return pictureOf({ family: row.family, values: row.values });
}

/** The version as it would be judged today: the check and the shape done again. */
export async function checkAgain(viewer: Viewer, id: string) {
  permit(viewer, 'preset.review');
  const { row } = versionRow(id);
  const report = await reportOf(row);
  const { size } = await measureShape({ family: row.family, values: row.values });
  const sizes: readonly [number, number][] = [
    [size[0], row.sizeX],
    [size[1], row.sizeY],
    [size[2], row.sizeZ],
  ];
  return {
    verdict: report.verdict,
    strainShare: limitShare(report),
    sameVerdict: report.verdict === row.verdict,
    sameSize: sizes.every(([now, then]) => Math.abs(now - then) < 0.01),
    figures: report.figures.filter((figure): figure is Figure => figure.verdict !== null),
  };
}

export type Decision = 'publish' | 'send-back';

/** Publishes a waiting version or sends it back with a note; another librarian may have been first. */
export function decide(viewer: Viewer, id: string, decision: Decision, note: string): void {
  const librarian = permit(viewer, 'preset.review');
  const at = new Date();
  const state = decision === 'publish' ? 'published' : 'sent-back';
  database().transaction(
    (db) => {
      const { preset } = versionRow(id);
      const decided = queries.decideVersion(db, id, { state, by: librarian.id, note: note || null, at });
      if (!decided) throw new Conflict('This version is not waiting any more');
      if (decision === 'publish') queries.showVersion(db, decided.presetId, id, at);
      const detail = { version: decided.number };
      recordEvent(db, { at, actor: librarian, action: `preset.${decision}`, subject: preset.slug, detail });
    },
    { behavior: 'immediate' },
  );
}

/** Takes a preset off the list; its address stays readable, marked as retired. */
export function retire(viewer: Viewer, slug: string, note: string): void {
  const librarian = permit(viewer, 'preset.review');
  const at = new Date();
  database().transaction(
    (db) => {
      const preset = queries.findPreset(db, slug);
      if (!preset?.publishedVersionId) throw new NotFound('The published preset');
      queries.retireVersions(db, preset.id);
      queries.showVersion(db, preset.id, null, at);
      recordEvent(db, { at, actor: librarian, action: 'preset.retire', subject: slug, detail: { note } });
    },
    { behavior: 'immediate' },
  );
}
