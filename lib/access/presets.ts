import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/presets';
import type { Licence } from '@/db/schema/library';
import type { Verdict } from '@/generators/report';
import { InvalidInput, NotFound } from '@/lib/errors';
import type { Use } from '@/lib/materials/types';
import { createDesign, type Design } from './designs';
import { type Photo, photoOf } from './photos';
import { type Picture, pictureOf } from './pictures';
import { permit, type Viewer } from './policy';

export interface PresetVersion {
  readonly id: string;
  readonly number: number;
  readonly state: 'published' | 'retired' | 'waiting' | 'sent-back';
  readonly title: string;
  readonly purpose: string;
  readonly printingNotes: string;
  readonly tags: readonly string[];
  readonly licence: Licence;
  readonly family: string;
  readonly kind: string;
  readonly material: string;
  readonly use: Use;
  readonly parameters: Readonly<Record<string, unknown>>;
  readonly verdict: Verdict;
  readonly strainShare: number | null;
  /** edges of the bounding box on the bed, mm */
  readonly size: readonly [number, number, number];
  /** g, printed solid; null where the density is not known */
  readonly mass: number | null;
  readonly enclosure: 'needed' | 'helpful' | 'not-needed' | null;
  readonly handedInAt: string;
  readonly decidedAt: string | null;
  /** preset it started from, where that is in the library */
  readonly startedFrom: { readonly slug: string; readonly title: string } | null;
  readonly photos: readonly Photo[];
}

export interface PresetReport {
  readonly id: string;
  readonly by: string;
  readonly mine: boolean;
  readonly worked: boolean;
  readonly printer: string;
  readonly material: string;
  readonly note: string;
  readonly version: number;
  readonly createdAt: string;
}

export interface Preset {
  readonly slug: string;
  readonly author: string;
  /** false once retired */
  readonly listed: boolean;
  readonly version: PresetVersion;
  readonly versions: readonly {
    readonly number: number;
    readonly title: string;
    readonly decidedAt: string | null;
  }[];
  readonly reports: readonly PresetReport[];
  readonly favourite: boolean;
}

const MOST_REPORTS_SHOWN = 100;
const missing = () => new NotFound('The preset');

function originOf(id: string | null): PresetVersion['startedFrom'] {
  const origin = id === null ? undefined : queries.findPublicVersion(database(), id);
  return origin ? { slug: origin.slug, title: origin.title } : null;
}

export function versionOf(row: queries.VersionRow): PresetVersion {
  const {
    id,
    number,
    state,
    title,
    purpose,
    printingNotes,
    tags,
    licence,
    family,
    kind,
    material,
    use,
    verdict,
  } = row;
  return {
    id,
    number,
    state,
    title,
    purpose,
    printingNotes,
    tags,
    licence,
    family,
    kind,
    material,
    use,
    verdict,
    parameters: row.values,
    strainShare: row.strainShare,
    size: [row.sizeX, row.sizeY, row.sizeZ],
    mass: row.mass,
    enclosure: row.enclosure,
    handedInAt: row.handedInAt.toISOString(),
    decidedAt: row.decidedAt?.toISOString() ?? null,
    startedFrom: originOf(row.startedFrom),
    photos: queries.photosOf(database(), id).map(photoOf),
  };
}

/** The published preset at an address, and all of its versions; the newest where none is named. */
function publicPreset(slug: string, number?: number) {
  const preset = queries.findPreset(database(), slug);
  const versions = preset ? queries.publicVersions(database(), preset.id) : [];
  const current = versions.find(({ id }) => id === preset?.publishedVersionId) ?? versions[0];
  const version = number === undefined ? current : versions.find((one) => one.number === number);
  if (!preset || !version) throw missing();
  return { preset, versions, version };
}

function reportsOf(viewer: Viewer, presetId: string): PresetReport[] {
  return queries
    .listReports(database(), presetId, MOST_REPORTS_SHOWN)
    .map(({ userId, userName, createdAt, ...report }) => ({
      ...report,
      by: userName,
      mine: viewer !== null && userId === viewer.id,
      createdAt: createdAt.toISOString(),
    }));
}

/** A published preset, open to anyone; retired ones stay readable at their address. */
export function getPreset(viewer: Viewer, slug: string, number?: number): Preset {
  const { preset, versions, version } = publicPreset(slug, number);
  return {
    slug,
    author: preset.authorName,
    listed: preset.publishedVersionId !== null,
    version: versionOf(version),
    versions: versions.map((one) => ({
      number: one.number,
      title: one.title,
      decidedAt: one.decidedAt?.toISOString() ?? null,
    })),
    reports: reportsOf(viewer, preset.id),
    favourite: viewer !== null && queries.isFavourite(database(), viewer.id, preset.id),
  };
}

export function presetPicture(slug: string, number?: number): Promise<Picture> {
  const { version } = publicPreset(slug, number);
  return pictureOf({ family: version.family, values: version.values });
}

export function setFavourite(viewer: Viewer, slug: string, wanted: boolean): void {
  const member = permit(viewer, 'preset.favourite');
  const { preset } = publicPreset(slug);
  if (wanted) queries.addFavourite(database(), member.id, preset.id, new Date());
  else queries.removeFavourite(database(), member.id, preset.id);
}

export interface NewReport {
  readonly version: number;
  readonly worked: boolean;
  readonly printer: string;
  readonly material: string;
  readonly note: string;
}

/** "Worked for me" or not, once a member and version; a second takes the place of the first. */
export function reportOn(viewer: Viewer, slug: string, { version: number, ...given }: NewReport): void {
  const member = permit(viewer, 'preset.report');
  const { preset, version } = publicPreset(slug, number);
  if (preset.authorId === member.id && given.worked) {
    const message = 'Your own preset is not yours to praise; tell of what did not work';
    throw new InvalidInput([{ field: 'worked', message }]);
  }
  const by = { userId: member.id, userName: member.name };
  queries.putReport(database(), { versionId: version.id, ...by, ...given, createdAt: new Date() });
}

export function removeReport(viewer: Viewer, slug: string, number: number): void {
  const member = permit(viewer, 'preset.report');
  const { version } = publicPreset(slug, number);
  if (!queries.removeReport(database(), member.id, version.id)) throw new NotFound('Your report');
}

/** A design of the member's own that starts where the preset stands. */
export async function startFrom(viewer: Viewer, slug: string, number?: number): Promise<Design> {
  const member = permit(viewer, 'design.own');
  const { version } = publicPreset(slug, number);
  const { family, material, use, values, title } = version;
  const content = { family, material, use, parameters: values };
  return createDesign(member, { name: title.slice(0, 80), ...content, startedFrom: version.id });
}
