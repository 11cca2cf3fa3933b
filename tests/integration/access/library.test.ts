import { sql } from 'drizzle-orm';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { matchText } from '@/db/queries/library';
import { createDesign, getDesign, saveDesign } from '@/lib/access/designs';
import { type HandIn, handedInOf, handIn } from '@/lib/access/hand-in';
import { searchLibrary } from '@/lib/access/library';
import { photoFile, removePhoto, uploadPhoto } from '@/lib/access/photos';
import { getPreset, removeReport, reportOn, setFavourite, startFrom } from '@/lib/access/presets';
import { checkAgain, decide, getReview, listReview, retire } from '@/lib/access/review';
import { Conflict, InvalidInput, NotAllowed, NotFound, SignInNeeded } from '@/lib/errors';
import { closePicturePool } from '@/lib/jobs/picture-pool';
import { seededDatabase } from '../../support/database';
import { memberOf } from '../../support/viewers';

const db = seededDatabase();
const ines = memberOf(db, 'Ines Moor');
const tom = memberOf(db, 'Tom Reed');
const ada = memberOf(db, 'Ada Lind', 'librarian');
const admin = memberOf(db, 'Ruth Vane', 'admin');
afterAll(() => closePicturePool());

const WORDS: Omit<HandIn, 'designId'> = {
  title: 'Receiver box lid',
  purpose: 'Keeps spray out of the receiver box.',
  printingNotes: 'Laid flat.',
  tags: ['boat', 'hinge'],
  licence: 'CC-BY-4.0',
  photos: [],
};

const designOf = (viewer = ines, parameters: Record<string, unknown> = {}) =>
  createDesign(viewer, { family: 'living-hinge', material: 'pp', name: 'Lid', parameters });

async function handedIn(change: Partial<HandIn> = {}) {
  const design = await designOf();
  return { design, ...(await handIn(ines, { ...WORDS, designId: design.id, ...change })) };
}

async function published(change: Partial<HandIn> = {}) {
  const one = await handedIn(change);
  decide(ada, one.versionId, 'publish', '');
  return one;
}

const photo = () =>
  sharp({ create: { width: 60, height: 40, channels: 3, background: '#5a7' } })
    .png()
    .toBuffer();

describe('handing in and review', () => {
  it('lists nothing before a librarian publishes it, and then tells the measured size and mass', async () => {
    const { slug, versionId } = await handedIn({ title: 'Unseen before' });
    expect(() => getPreset(null, slug)).toThrow(NotFound);
    expect(searchLibrary(null, { text: 'unseen before' }).entries).toEqual([]);
    decide(ada, versionId, 'publish', 'Good');
    const { version, author } = getPreset(null, slug);
    expect(author).toBe('Ines Moor');
    expect(version.size.every((edge) => edge > 0)).toBe(true);
    expect(version.mass).toBeGreaterThan(0);
    expect(searchLibrary(null, { text: 'unseen before' }).entries.map((one) => one.slug)).toEqual([slug]);
  });

  it.each([
    ['a visitor', null, SignInNeeded],
    ['another member', tom, NotAllowed],
    ['the author', ines, NotAllowed],
    ['the admin', admin, NotAllowed],
  ])('is not for %s', async (_, viewer, refusal) => {
    const { versionId, slug } = await handedIn();
    expect(() => listReview(viewer, 'waiting')).toThrow(refusal);
    await expect(getReview(viewer, versionId)).rejects.toThrow(refusal);
    await expect(checkAgain(viewer, versionId)).rejects.toThrow(refusal);
    expect(() => decide(viewer, versionId, 'publish', '')).toThrow(refusal);
    expect(() => retire(viewer, slug, '')).toThrow(refusal);
  });

  it('takes only a design of one’s own, and one version at a time', async () => {
    const { design } = await handedIn();
    await expect(handIn(null, { ...WORDS, designId: design.id })).rejects.toThrow(SignInNeeded);
    await expect(handIn(tom, { ...WORDS, designId: design.id })).rejects.toThrow(NotFound);
    await expect(handIn(ada, { ...WORDS, designId: design.id })).rejects.toThrow(NotFound);
    await expect(handIn(ines, { ...WORDS, designId: design.id })).rejects.toThrow(Conflict);
  });

  it('decides once: a second librarian finds it decided', async () => {
    const { versionId } = await handedIn();
    decide(ada, versionId, 'send-back', 'Which way up?');
    expect(() => decide(ada, versionId, 'publish', '')).toThrow(Conflict);
  });

  it('lets a version that was sent back be followed by another, and compares it with the one before', async () => {
    const { design, slug } = await published({ title: 'Flap' });
    await saveDesign(ines, design.id, {
      family: 'living-hinge',
      material: 'pp',
      revision: 1,
      parameters: { leafWidth: 44 },
    });
    const second = await handIn(ines, { ...WORDS, designId: design.id, title: 'Wider flap' });
    expect(second).toMatchObject({ slug, number: 2 });
    decide(ada, second.versionId, 'send-back', 'Say what for');
    expect(handedInOf(ines, design.id).versions[0]).toMatchObject({
      state: 'sent-back',
      decisionNote: 'Say what for',
    });
    expect(getPreset(null, slug).version.title).toBe('Flap');
    const third = await handIn(ines, { ...WORDS, designId: design.id, title: 'Wide flap' });
    const review = await getReview(ada, third.versionId);
    expect(review.before).toMatchObject({ number: 1, title: 'Flap' });
    expect(review.version.parameters).toMatchObject({ leafWidth: 44 });
    decide(ada, third.versionId, 'publish', '');
    expect(getPreset(null, slug).versions.map(({ number }) => number)).toEqual([3, 1]);
    expect(getPreset(null, slug, 1).version.title).toBe('Flap');
    expect(() => getPreset(null, slug, 2)).toThrow(NotFound);
  });

  it('runs the check again and finds what was handed in', async () => {
    const { versionId } = await handedIn();
    expect(await checkAgain(ada, versionId)).toMatchObject({ sameVerdict: true, sameSize: true });
  });

  it('keeps a retired preset readable and out of the list', async () => {
    const { slug } = await published({ title: 'Soon outdated' });
    retire(ada, slug, 'Breaks');
    expect(getPreset(null, slug)).toMatchObject({ listed: false, version: { state: 'retired' } });
    expect(searchLibrary(null, { text: 'outdated' }).entries).toEqual([]);
    expect(() => retire(ada, slug, '')).toThrow(NotFound);
  });
});

describe('a published version', () => {
  it('cannot be changed or deleted, not even past the application', async () => {
    const { versionId } = await published();
    const set = (column: string, value: string) =>
      db.$client.exec(`update preset_versions set "${column}" = ${value} where id = '${versionId}'`);
    for (const [column, value] of [
      ['title', "'Other'"],
      ['values', "'{}'"],
      ['verdict', "'within-limit-'"],
      ['mass', 'null'],
      ['licence', "'CC0-1.0'"],
      ['state', "'waiting'"],
    ] as const) {
      expect(() => set(column, value), column).toThrow(/a published version is not changed/);
    }
    expect(() => db.$client.exec('delete from preset_versions')).toThrow(/is not deleted/);
  });

  it('outlives its design and its author', async () => {
    const { slug, design } = await published({ title: 'Legacy' });
    db.run(sql`delete from designs where id = ${design.id}`);
    expect(getPreset(null, slug).version.title).toBe('Legacy');
  });

  it('is where a member’s design can start, and is remembered there', async () => {
    const { slug, versionId } = await published();
    const design = await startFrom(tom, slug);
    expect(getDesign(tom, design.id).startedFrom).toBe(versionId);
    await expect(startFrom(null, slug)).rejects.toThrow(SignInNeeded);
    const child = await handIn(tom, { ...WORDS, designId: design.id, title: 'Child' });
    decide(ada, child.versionId, 'publish', '');
    expect(getPreset(null, child.slug).version.startedFrom?.slug).toBe(slug);
  });

  it('cannot be claimed as origin before it is published, or by another family', async () => {
    const { versionId } = await handedIn();
    const claim = { family: 'living-hinge', material: 'pp', name: 'Claim', startedFrom: versionId };
    await expect(createDesign(tom, claim)).rejects.toThrow(InvalidInput);
    const other = await published();
    const wrong = { family: 'rod-clip', material: 'pp', name: 'Claim', startedFrom: other.versionId };
    await expect(createDesign(tom, wrong)).rejects.toThrow(InvalidInput);
  });
});

describe('reports and favourites', () => {
  const report = { version: 1, worked: true, printer: 'bench printer', material: 'PP', note: 'Fits.' };

  it('count once a member, and follow a change of mind', async () => {
    const { slug } = await published({ title: 'Counted thing' });
    const counts = () => {
      const { worked, failed, favourites } = searchLibrary(null, { text: 'counted thing' }).entries[0]!;
      return { worked, failed, favourites };
    };
    reportOn(tom, slug, report);
    reportOn(ada, slug, report);
    setFavourite(tom, slug, true);
    setFavourite(tom, slug, true);
    expect(counts()).toEqual({ worked: 2, failed: 0, favourites: 1 });
    reportOn(tom, slug, { ...report, worked: false });
    expect(counts()).toEqual({ worked: 1, failed: 1, favourites: 1 });
    removeReport(tom, slug, 1);
    setFavourite(tom, slug, false);
    expect(counts()).toEqual({ worked: 1, failed: 0, favourites: 0 });
    expect(() => removeReport(tom, slug, 1)).toThrow(NotFound);
  });

  it('are not for visitors, and no author praises the own preset', async () => {
    const { slug } = await published();
    expect(() => reportOn(null, slug, report)).toThrow(SignInNeeded);
    expect(() => setFavourite(null, slug, true)).toThrow(SignInNeeded);
    expect(() => reportOn(ines, slug, report)).toThrow(InvalidInput);
    expect(() => reportOn(tom, 'nowhere', report)).toThrow(NotFound);
  });

  it('show a member the own favourites only', async () => {
    const { slug } = await published({ title: 'Liked by Tom' });
    setFavourite(tom, slug, true);
    const mine = (viewer: typeof tom) =>
      searchLibrary(viewer, { favourites: true }).entries.map((one) => one.slug);
    expect(mine(tom)).toContain(slug);
    expect(mine(ines)).not.toContain(slug);
    expect(() => searchLibrary(null, { favourites: true })).toThrow(SignInNeeded);
  });
});

describe('photos', () => {
  it('are seen by their owner until they are handed in, by librarians until published, then by anyone', async () => {
    const { id } = await uploadPhoto(ines, await photo());
    expect((await photoFile(ines, id)).open).toBe(false);
    for (const viewer of [null, tom, ada]) await expect(photoFile(viewer, id)).rejects.toThrow(NotFound);
    const { versionId, slug } = await handedIn({ photos: [{ id, alt: 'The lid, open' }] });
    expect((await photoFile(ada, id)).bytes.byteLength).toBeGreaterThan(0);
    for (const viewer of [null, tom, admin]) await expect(photoFile(viewer, id)).rejects.toThrow(NotFound);
    decide(ada, versionId, 'publish', '');
    expect((await photoFile(null, id)).open).toBe(true);
    expect(getPreset(null, slug).version.photos[0]).toMatchObject({ id, alt: 'The lid, open' });
    await expect(removePhoto(ines, id)).rejects.toThrow(NotFound);
  });

  it('of another member cannot be handed in, nor taken away', async () => {
    const { id } = await uploadPhoto(tom, await photo());
    await expect(handedIn({ photos: [{ id, alt: '' }] })).rejects.toThrow(InvalidInput);
    await expect(removePhoto(ines, id)).rejects.toThrow(NotFound);
    await removePhoto(tom, id);
    await expect(photoFile(tom, id)).rejects.toThrow(NotFound);
  });

  it('are not taken from a visitor, and no more than six for a version', async () => {
    await expect(uploadPhoto(null, await photo())).rejects.toThrow(SignInNeeded);
    const seven = Array.from({ length: 7 }, () => ({ id: 'x', alt: '' }));
    await expect(handedIn({ photos: seven })).rejects.toThrow(/At most 6 photos/);
  });
});

describe('searching the library', () => {
  beforeAll(async () => {
    await published({ title: 'Café bolt “O’Neill”', purpose: 'For the galley.', tags: ['galley'] });
  });

  it.each([
    '"',
    "'",
    '*',
    'AND',
    'NOT',
    'a OR',
    '(',
    'title:',
    'NEAR(a b)',
    '^',
    '-',
    '{',
    '\\',
    '\0',
    '""""',
    'x" OR "y',
    '%',
    '_',
    '🧷',
    '; drop table presets',
    'facets : kindclips',
  ])('takes %j as words and nothing else', (text) => {
    expect(() => searchLibrary(null, { text })).not.toThrow();
    expect(() => searchLibrary(null, { text, kind: 'hinges', sort: 'worked' })).not.toThrow();
  });

  it('makes every word a quoted one', () => {
    expect(matchText('hook OR "lid*" NOT')).toBe(
      '{title purpose tags author family notes} : ("hook" AND "OR" AND "lid" AND "NOT"*)',
    );
    expect(matchText('"" *')).toBeNull();
  });

  it('finds without accents, by beginnings and by word stems', () => {
    for (const text of ['cafe', 'CAFÉ', 'bol', 'bolts galley', 'neill']) {
      const found = searchLibrary(null, { text }).entries.map((one) => one.title);
      expect(found, text).toContain('Café bolt “O’Neill”');
    }
  });

  it('does not let words reach what is only filtered by', () => {
    expect(searchLibrary(null, { text: 'kindhinges' }).entries).toEqual([]);
  });

  it('shows titles that have the words first', async () => {
    await published({ title: 'Zinnia', purpose: 'Nothing else.' });
    await published({ title: 'Newer', purpose: 'For a zinnia pot.' });
    expect(searchLibrary(null, { text: 'zinnia' }).entries.map((one) => one.title)).toEqual([
      'Zinnia',
      'Newer',
    ]);
    expect(searchLibrary(null, { text: 'zinnia', sort: 'newest' }).entries[0]?.title).toBe('Newer');
  });

  it('filters by kind, plastic, verdict, size and printer', () => {
    const found = (wish: Parameters<typeof searchLibrary>[1]) => searchLibrary(null, wish).found;
    expect(found({ kind: 'hinges' })).toBe(found({}));
    expect(found({ kind: 'clips' })).toBe(0);
    expect(found({ material: 'pp' })).toBe(found({}));
    expect(found({ material: 'p' })).toBe(0);
    expect(found({ fits: 250 })).toBe(found({}));
    expect(found({ verdict: 'over-limit' })).toBe(0);
    const longest = searchLibrary(null, { fits: 50 }).entries.map((one) => one.longest);
    expect(longest.every((edge) => edge <= 50)).toBe(true);
  });

  it('pages without leaving out or repeating, in every order', async () => {
    const base = await published({ title: 'Paged 0' });
    const copy = (n: number) =>
      db.transaction((tx) => {
        tx.run(sql`insert into presets (id, slug, author_name, created_at, changed_at)
          values (${`p${n}`}, ${`paged-${n}`}, 'Somebody', 0, 0)`);
        tx.run(sql`insert into preset_versions select ${`v${n}`}, ${`p${n}`}, 1, 'published', ${`Paged ${n}`}, purpose,
          printing_notes, tags, licence, family, material, "use", "values", verdict, kind, strain_share, size_x, size_y,
          size_z, mass, enclosure, started_from, handed_in_at, decided_at, decided_by, decision_note
          from preset_versions where id = ${base.versionId}`);
        tx.run(sql`update presets set published_version_id = ${`v${n}`} where id = ${`p${n}`}`);
      });
    for (let n = 1; n <= 60; n += 1) copy(n);
    db.run(sql`update library_entries set worked = row % 3, favourites = row % 5`);
    for (const sort of ['best', 'newest', 'worked', 'favourites', 'title'] as const) {
      const seen: string[] = [];
      let after: string | undefined;
      do {
        const page = searchLibrary(null, { text: 'paged', sort, after });
        seen.push(...page.entries.map((one) => one.slug));
        after = page.next ?? undefined;
      } while (after !== undefined && seen.length < 200);
      expect(seen.length, sort).toBe(61);
      expect(new Set(seen).size, sort).toBe(61);
    }
  });

  it.each(['', 'x', '1~', '-1~2', '9~9~9', '1e9~1', 'NaN~NaN', '5~'.padEnd(400, 'x')])(
    'goes on from a made-up place %j without failing',
    (after) => {
      for (const sort of ['best', 'worked', 'title'] as const) {
        expect(() => searchLibrary(null, { text: 'lid', sort, after })).not.toThrow();
      }
    },
  );
});
