import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/designs';
import type { Verdict } from '@/generators/report';
import { Conflict, InvalidInput, NotFound } from '@/lib/errors';
import type { Use } from '@/lib/materials/types';
import { type GivenContent, readContent } from './design-content';
import { type Picture, pictureOf } from './pictures';
import { permit, type Viewer } from './policy';
import { startedFromVersion } from './provenance';

export interface DesignSummary {
  readonly id: string;
  readonly name: string;
  readonly family: string;
  readonly material: string;
  readonly verdict: Verdict;
  readonly revision: number;
  /** ISO 8601 */
  readonly changedAt: string;
}

export interface Design extends DesignSummary {
  readonly use: Use;
  readonly parameters: Readonly<Record<string, unknown>>;
  /** version of a preset it started from */
  readonly startedFrom: string | null;
  readonly createdAt: string;
}

export interface NewDesign extends GivenContent {
  readonly name: string;
  readonly startedFrom?: string | undefined;
}

export interface DesignChange extends GivenContent {
  /** the revision the change was made on */
  readonly revision: number;
  /** a state of its own in the history, however soon after the last */
  readonly apart?: boolean | undefined;
}

export type DesignFilter = Partial<Omit<queries.DesignFilter, 'limit' | 'offset'>> & {
  /** from 1 */
  readonly page?: number;
};

export const DESIGNS_PER_PAGE = 20;
export const MOST_DESIGNS = 2000;
const MOST_STATES = 200;
/** Saves within this time of a state's first belong to it, ms. */
const STATE_SPAN = 10 * 60_000;
/** How long a deleted design can be brought back, ms. */
const DELETED_KEPT = 30 * 24 * 3_600_000;

const summaryOf = ({ id, name, family, material, verdict, revision, changedAt }: queries.DesignRow) => ({
  id,
  name,
  family,
  material,
  verdict,
  revision,
  changedAt: changedAt.toISOString(),
});

const designOf = (row: queries.DesignRow): Design => ({
  ...summaryOf(row),
  use: row.use,
  parameters: row.values,
  startedFrom: row.startedFrom,
  createdAt: row.createdAt.toISOString(),
});

const missing = () => new NotFound('The design');

function found(row: queries.DesignRow | undefined): Design {
  if (!row) throw missing();
  return designOf(row);
}

const joinsFrom = (at: Date): Date => new Date(at.getTime() - STATE_SPAN);

export function listDesigns(viewer: Viewer, filter: DesignFilter = {}) {
  const owner = permit(viewer, 'design.own');
  const { page = 1, deleted = false, sort = 'changed', descending = sort === 'changed', ...rest } = filter;
  const { rows, total } = queries.listDesigns(database(), owner.id, {
    ...rest,
    deleted,
    sort,
    descending,
    limit: DESIGNS_PER_PAGE,
    offset: (page - 1) * DESIGNS_PER_PAGE,
  });
  return {
    designs: rows.map(summaryOf),
    total,
    page,
    pages: Math.max(1, Math.ceil(total / DESIGNS_PER_PAGE)),
  };
}

export function getDesign(viewer: Viewer, id: string): Design {
  const owner = permit(viewer, 'design.own');
  return found(queries.findDesign(database(), owner.id, id));
}

function keep(ownerId: string, given: queries.NewDesign): Design {
  const at = new Date();
  return database().transaction(
    (db) => {
      if (queries.countDesigns(db, ownerId) >= MOST_DESIGNS) {
        const message = `Your account holds ${MOST_DESIGNS} designs, the most it can; delete some first`;
        throw new InvalidInput([{ field: 'name', message, bound: MOST_DESIGNS }]);
      }
      const row = queries.insertDesign(db, ownerId, given, at);
      queries.recordState(db, row, joinsFrom(at), MOST_STATES);
      return designOf(row);
    },
    { behavior: 'immediate' },
  );
}

export async function createDesign(viewer: Viewer, given: NewDesign): Promise<Design> {
  const owner = permit(viewer, 'design.own');
  const { content } = await readContent(given);
  const startedFrom = startedFromVersion(given.startedFrom, content.family);
  return keep(owner.id, { name: given.name, ...content, startedFrom });
}

export function copyDesign(viewer: Viewer, id: string): Design {
  const owner = permit(viewer, 'design.own');
  const row = queries.findDesign(database(), owner.id, id);
  if (!row) throw missing();
  const { family, material, use, values, verdict, startedFrom } = row;
  const name = `Copy of ${row.name}`.slice(0, 80).trim();
  return keep(owner.id, { name, family, material, use, values, verdict, startedFrom });
}

interface Write {
  readonly ownerId: string;
  readonly id: string;
  readonly revision: number;
  readonly content: queries.Content;
  readonly apart: boolean;
}

function write({ ownerId, id, revision, content, apart }: Write): Design {
  const at = new Date();
  return database().transaction(
    (db) => {
      const before = queries.findDesign(db, ownerId, id);
      if (!before) throw missing();
      if (before.family !== content.family) {
        const message = `A kept ${before.family} cannot become a ${content.family}`;
        throw new InvalidInput([{ field: 'family', message }]);
      }
      const row = queries.updateDesign(db, ownerId, id, revision, content, at);
      if (!row) throw new Conflict('The design was changed elsewhere since you opened it');
      queries.recordState(db, row, apart ? at : joinsFrom(at), MOST_STATES);
      return designOf(row);
    },
    { behavior: 'immediate' },
  );
}

/** Saves a design on top of the revision it was made on; Conflict where that is no longer the newest. */
export async function saveDesign(viewer: Viewer, id: string, change: DesignChange): Promise<Design> {
  const owner = permit(viewer, 'design.own');
  const { content } = await readContent(change);
  const { revision, apart = false } = change;
  return write({ ownerId: owner.id, id, revision, content, apart });
}

export function renameDesign(viewer: Viewer, id: string, name: string): Design {
  const owner = permit(viewer, 'design.own');
  return found(queries.renameDesign(database(), owner.id, id, name, new Date()));
}

/** Puts a design aside; it can be brought back for 30 days. */
export function deleteDesign(viewer: Viewer, id: string): void {
  const owner = permit(viewer, 'design.own');
  const at = new Date();
  database().transaction(
    (db) => {
      if (!queries.setDeleted(db, owner.id, id, at)) throw missing();
      queries.forgetDeleted(db, owner.id, new Date(at.getTime() - DELETED_KEPT));
    },
    { behavior: 'immediate' },
  );
}

export function undeleteDesign(viewer: Viewer, id: string): Design {
  const owner = permit(viewer, 'design.own');
  if (!queries.setDeleted(database(), owner.id, id, null)) throw missing();
  return getDesign(viewer, id);
}

export interface DesignState
  extends Pick<Design, 'name' | 'family' | 'material' | 'use' | 'parameters' | 'verdict'> {
  readonly revision: number;
  readonly savedAt: string;
}

const stateOf = ({ values, savedAt, ...state }: queries.StateRow): DesignState => ({
  ...state,
  parameters: values,
  savedAt: savedAt.toISOString(),
});

/** Saved states, newest first. */
export function listStates(viewer: Viewer, id: string): DesignState[] {
  const owner = permit(viewer, 'design.own');
  getDesign(viewer, id);
  return queries.listStates(database(), owner.id, id).map(stateOf);
}

/** Makes an earlier state the newest one; what stood before stays in the history. */
export async function restoreState(
  viewer: Viewer,
  id: string,
  given: { readonly state: number; readonly revision: number },
): Promise<Design> {
  const owner = permit(viewer, 'design.own');
  const state = queries.findState(database(), owner.id, id, given.state);
  if (!state) throw new NotFound('The saved state');
  const { family, material, use, values } = state;
  const { content } = await readContent({ family, material, use, parameters: values });
  return write({ ownerId: owner.id, id, revision: given.revision, content, apart: true });
}

export async function designPicture(viewer: Viewer, id: string): Promise<Picture> {
  const { family, parameters } = getDesign(viewer, id);
  return pictureOf({ family, values: parameters });
}
