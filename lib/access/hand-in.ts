import 'server-only';
import { type Db, database } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import * as queries from '@/db/queries/presets';
import type { Licence } from '@/db/schema/library';
import { Conflict, InvalidInput } from '@/lib/errors';
import { limitShare, readContent } from './design-content';
import { type Design, getDesign } from './designs';
import { MOST_PHOTOS_EACH } from './photos';
import { measureShape } from './pictures';
import { type Member, permit, type Viewer } from './policy';
import { freeSlug } from './slug';

export interface HandIn {
  readonly designId: string;
  readonly title: string;
  readonly purpose: string;
  readonly printingNotes: string;
  readonly tags: readonly string[];
  readonly licence: Licence;
  readonly photos: readonly { readonly id: string; readonly alt: string }[];
}

export interface HandedIn {
  readonly slug: string;
  readonly versionId: string;
  readonly number: number;
}

const MOST_WAITING = 30;
const MM3_PER_CM3 = 1000;

/** Everything of a version that follows from the design: checked and built afresh, so that it is what it says. */
async function figuresOf(design: Design) {
  const { content, family, material, report } = await readContent(design);
  const { size, volume } = await measureShape({ family: content.family, values: content.values });
  const [sizeX, sizeY, sizeZ] = size;
  return {
    ...content,
    kind: family.about.kind,
    strainShare: limitShare(report),
    sizeX,
    sizeY,
    sizeZ,
    mass: material.density ? (material.density.value * volume) / MM3_PER_CM3 : null,
    enclosure: material.print?.enclosure ?? null,
    startedFrom: design.startedFrom,
  };
}

function checkOpen(db: Db, author: Member, presetId: string | undefined): void {
  const versions = presetId === undefined ? [] : queries.ownVersions(db, author.id, presetId);
  if (versions.some(({ state }) => state === 'waiting')) {
    throw new Conflict('A version of this design is waiting for a librarian already');
  }
  if (queries.countWaiting(db, author.id) >= MOST_WAITING) {
    throw new Conflict(`You have ${MOST_WAITING} presets waiting for a librarian, the most there may be`);
  }
}

function presetFor(db: Db, author: Member, given: HandIn, at: Date): queries.PresetRow {
  const own = queries.findPresetOfDesign(db, author.id, given.designId);
  if (own) return own;
  const { designId, title } = given;
  const row = { slug: freeSlug(title), authorId: author.id, authorName: author.name, designId };
  return queries.insertPreset(db, { ...row, createdAt: at, changedAt: at });
}

function attachPhotos(db: Db, author: Member, versionId: string, photos: HandIn['photos']): void {
  photos.forEach(({ id, alt }, position) => {
    if (queries.attachPhoto(db, author.id, id, { versionId, alt, position })) return;
    const message = 'The photo is not there any more; choose it again';
    throw new InvalidInput([{ field: 'photos', message }]);
  });
}

/** Hands a design in for the library, as the first or the next version of a preset. A librarian decides. */
export async function handIn(viewer: Viewer, given: HandIn): Promise<HandedIn> {
  const author = permit(viewer, 'preset.hand-in');
  const design = getDesign(author, given.designId);
  if (given.photos.length > MOST_PHOTOS_EACH) {
    const message = `At most ${MOST_PHOTOS_EACH} photos`;
    throw new InvalidInput([{ field: 'photos', message, bound: MOST_PHOTOS_EACH }]);
  }
  checkOpen(database(), author, queries.findPresetOfDesign(database(), author.id, design.id)?.id);
  const figures = await figuresOf(design);
  const at = new Date();
  return database().transaction(
    (db) => {
      const preset = presetFor(db, author, given, at);
      checkOpen(db, author, preset.id);
      const { title, purpose, printingNotes, tags, licence } = given;
      const words = { title, purpose, printingNotes, tags: [...tags], licence };
      const version = queries.insertVersion(db, {
        presetId: preset.id,
        ...words,
        ...figures,
        handedInAt: at,
      });
      attachPhotos(db, author, version.id, given.photos);
      const detail = { version: version.number };
      recordEvent(db, { at, actor: author, action: 'preset.hand-in', subject: preset.slug, detail });
      return { slug: preset.slug, versionId: version.id, number: version.number };
    },
    { behavior: 'immediate' },
  );
}

export interface OwnVersion extends Omit<HandIn, 'designId' | 'photos'> {
  readonly id: string;
  readonly number: number;
  readonly state: 'waiting' | 'sent-back' | 'published' | 'retired';
  readonly handedInAt: string;
  readonly decisionNote: string | null;
}

/** What became of a design's versions, for their author. */
export function handedInOf(
  viewer: Viewer,
  designId: string,
): { slug: string | null; versions: OwnVersion[] } {
  const author = permit(viewer, 'preset.hand-in');
  const preset = queries.findPresetOfDesign(database(), author.id, getDesign(author, designId).id);
  if (!preset) return { slug: null, versions: [] };
  const versions = queries.ownVersions(database(), author.id, preset.id).map((version) => {
    const { id, number, state, title, purpose, printingNotes, tags, licence, handedInAt, decisionNote } =
      version;
    const words = { title, purpose, printingNotes, tags, licence };
    return { id, number, state, ...words, handedInAt: handedInAt.toISOString(), decisionNote };
  });
  return { slug: preset.slug, versions };
}
