import { count } from 'drizzle-orm';
import { measurePart, type PartInFigures } from '@/generators/picture';
import { createKernelHost, type KernelHost } from '@/lib/geometry/host';
import { materialById } from '@/lib/materials/data';
import type { Db } from '../../client';
import { recordEvent } from '../../queries/audit';
import { insertDesign, recordState } from '../../queries/designs';
import * as queries from '../../queries/presets';
import { presets } from '../../schema/library';
import { DEMO_MEMBERS } from '../demo-members';
import { type DemoPart, demoParts } from './parts';
import { attachDemoPhoto, type DrawnPhoto, drawPhoto } from './photos';
import { FAILED, PRINTERS, PRINTING_NOTES, PUBLISHED, SENT_BACK, WORKED } from './texts';

const DAY = 24 * 3_600_000;
const OPENED = Date.parse('2026-03-08T10:00:00Z');
const LICENCES = ['CC-BY-4.0', 'CC-BY-SA-4.0', 'CC0-1.0', 'CC-BY-NC-4.0'] as const;
const AUTHORS = DEMO_MEMBERS.filter(({ suspended }) => !suspended);
const LIBRARIAN = DEMO_MEMBERS.find(({ roles }) => roles.includes('librarian'))!;

const dealt = <T>(from: readonly T[], at: number): T => from[at % from.length]!;
const slugOf = (title: string): string =>
  title
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');

interface Measured {
  readonly part: DemoPart;
  readonly figures: PartInFigures;
  readonly photo: DrawnPhoto | null;
}

async function measured(host: KernelHost, part: DemoPart, at: number): Promise<Measured> {
  const photo = at % 5 === 0 ? await drawPhoto(host, part) : null;
  return { part, figures: measurePart(host, part.family, part.values), photo };
}

function contentOf({ family, material, use, values }: DemoPart) {
  const report = family.check(values, materialById(material)!, use);
  const figure = report.figures.find(({ id }) => id === report.governing);
  const known = figure?.value && figure.limit;
  const share = known
    ? figure.limitKind === 'max'
      ? figure.value / figure.limit
      : figure.limit / figure.value
    : null;
  const content = { family: family.about.id, material, use, values, verdict: report.verdict };
  return { content, strainShare: share !== null && Number.isFinite(share) ? share : null };
}

type State = 'waiting' | 'sent-back' | 'published' | 'retired';

/** Most are published; a few stand in every other state. */
function stateOf(at: number): State {
  if (at % 13 === 5) return 'waiting';
  if (at % 17 === 9) return 'sent-back';
  return at % 23 === 11 ? 'retired' : 'published';
}

interface Entry {
  readonly at: number;
  readonly one: Measured;
  readonly slug: string;
  readonly origin: string | null;
}

function insertDemoVersion(db: Db, { at, one, slug, origin }: Entry, handedInAt: Date) {
  const { part, figures } = one;
  const { content, strainShare } = contentOf(part);
  const material = materialById(part.material)!;
  const [sizeX, sizeY, sizeZ] = figures.size;
  return queries.insertVersion(db, {
    id: `demo-${slug}-${handedInAt.getTime() === dayOf(at).getTime() ? 1 : 2}`,
    presetId: `demo-${slug}`,
    title: part.title,
    purpose: part.purpose,
    printingNotes: dealt(PRINTING_NOTES, at),
    tags: [part.family.about.kind, material.shortName.toLowerCase(), dealt(['boat', 'glider', 'bench'], at)],
    licence: dealt(LICENCES, at),
    ...content,
    kind: part.family.about.kind,
    strainShare,
    sizeX,
    sizeY,
    sizeZ,
    mass: material.density ? (material.density.value * figures.volume) / 1000 : null,
    enclosure: material.print?.enclosure ?? null,
    startedFrom: origin,
    handedInAt,
  });
}

const dayOf = (at: number, later = 0): Date => new Date(OPENED + (3 * at + later) * DAY);

function publish(db: Db, versionId: string, slug: string, at: Date): void {
  const decided = queries.decideVersion(db, versionId, {
    state: 'published',
    by: LIBRARIAN.id,
    note: PUBLISHED,
    at,
  });
  queries.showVersion(db, `demo-${slug}`, versionId, at);
  const detail = { version: decided?.number ?? 1 };
  recordEvent(db, { at, actor: LIBRARIAN, action: 'preset.publish', subject: slug, detail });
}

function decide(db: Db, versionId: string, { at, slug }: Entry): void {
  const state = stateOf(at);
  if (state === 'waiting') return;
  if (state === 'sent-back') {
    const decision = { state, by: LIBRARIAN.id, note: SENT_BACK, at: dayOf(at, 2) };
    queries.decideVersion(db, versionId, decision);
    return;
  }
  publish(db, versionId, slug, dayOf(at, 2));
  if (state === 'published') return;
  queries.retireVersions(db, `demo-${slug}`);
  queries.showVersion(db, `demo-${slug}`, null, dayOf(at, 40));
}

function reportOn(db: Db, versionId: string, { at, one, slug }: Entry, authorId: string): void {
  const others = AUTHORS.filter(({ id }) => id !== authorId);
  const number = (at * 7) % (others.length + 1);
  others.slice(0, number).forEach(({ id, name }, index) => {
    const worked = (at + index) % 5 !== 3;
    queries.putReport(db, {
      id: `${versionId}-${id}`,
      versionId,
      userId: id,
      userName: name,
      worked,
      printer: dealt(PRINTERS, at + index),
      material: materialById(one.part.material)!.shortName,
      note: worked ? dealt(WORKED, at + 2 * index) : dealt(FAILED, at + index),
      createdAt: dayOf(at, 10 + 3 * index),
    });
    if ((at + index) % 2 === 0) queries.addFavourite(db, id, `demo-${slug}`, dayOf(at, 11));
  });
}

/** A design of its author, handed in, decided on, reported on. */
function insertEntry(db: Db, entry: Entry): void {
  const { at, one, slug, origin } = entry;
  const author = dealt(AUTHORS, at);
  const { content } = contentOf(one.part);
  const day = dayOf(at);
  const named = { id: `demo-${slug}`, name: one.part.title, startedFrom: origin };
  const design = insertDesign(db, author.id, { ...named, ...content }, day);
  recordState(db, design, day, 200);
  const row = { id: `demo-${slug}`, slug, authorId: author.id, authorName: author.name, designId: design.id };
  queries.insertPreset(db, { ...row, createdAt: day, changedAt: day });
  const version = insertDemoVersion(db, entry, day);
  if (one.photo) {
    const given = {
      id: `${version.id}-photo`,
      versionId: version.id,
      ownerId: author.id,
      title: one.part.title,
      at: day,
    };
    attachDemoPhoto(db, one.photo, given);
  }
  decide(db, version.id, entry);
  const state = stateOf(at);
  if (state === 'published' || state === 'retired') reportOn(db, version.id, entry, author.id);
  if (state === 'published' && at % 6 === 2) {
    const second = insertDemoVersion(db, entry, dayOf(at, 30));
    if (at % 12 === 2) publish(db, second.id, slug, dayOf(at, 32));
  }
}

/** Fills the library of the demo club: every family, every state. Leaves a library that holds anything as it is. */
export async function seedDemoLibrary(db: Db): Promise<boolean> {
  if ((db.select({ found: count() }).from(presets).get()?.found ?? 0) > 0) return false;
  const host = await createKernelHost();
  const parts = await demoParts();
  const all: Measured[] = [];
  for (const [at, part] of parts.entries()) all.push(await measured(host, part, at));
  db.transaction((tx) => {
    const used = new Set<string>();
    const slugs = all.map((one) => {
      const base = slugOf(one.part.title);
      const slug = used.has(base) ? `${base}-${one.part.family.about.id}` : base;
      used.add(slug);
      return slug;
    });
    all.forEach((one, at) => {
      const { from } = one.part;
      const origin =
        from !== null && ['published', 'retired'].includes(stateOf(from)) ? `demo-${slugs[from]}-1` : null;
      insertEntry(tx, { at, one, slug: slugs[at]!, origin });
    });
  });
  return true;
}
