// Times of the library's searches over 100,000 presets: npx tsx --conditions=react-server tests/bench/library.ts [count]
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { sql } from 'drizzle-orm';
import { type Connection, connect } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { countLibrary, type LibraryFilter, searchLibrary } from '@/db/queries/library';
import { presets, presetVersions } from '@/db/schema/library';
import { FAMILIES } from '@/generators';
import { ms, printTable, ratio } from './measure';

const WORDS =
  'hatch battery boat glider rod clip strap antenna rudder mast lid box tray receiver servo wing keel deck bench stand cover fuse motor pump hose valve screw pot cap ballast rigging sail winch hinge flap door panel spring mount'.split(
    ' ',
  );
const RARE = 'peregrine,quartz,umbrella,xylophone,yonder,zephyr'.split(',');
const MATERIALS = ['pla', 'petg', 'pp', 'asa', 'abs', 'tpu-95a', 'pa-dry'];
const VERDICTS = ['within-limit', 'within-limit', 'within-limit', 'close-to-limit', 'over-limit'] as const;

/** The same numbers each time: a linear congruence. */
function dice(seed: number) {
  let state = seed;
  return (sides: number): number => {
    state = (state * 1664525 + 1013904223) % 4294967296;
    return Math.floor((state / 4294967296) * sides);
  };
}

function fill(db: Connection, count: number): void {
  const roll = dice(7);
  const some = (most: number) => Array.from({ length: most }, () => WORDS[roll(WORDS.length)]!).join(' ');
  const at = new Date('2026-01-01T00:00:00Z');
  db.transaction((tx) => {
    for (let n = 0; n < count; n += 1) {
      const { id: family, kind } = FAMILIES[roll(FAMILIES.length)]!.about;
      const rare = roll(2000) === 0 ? ` ${RARE[roll(RARE.length)]}` : '';
      tx.insert(presets)
        .values({ id: `p${n}`, slug: `p${n}`, authorName: 'Somebody', createdAt: at, changedAt: at })
        .run();
      tx.insert(presetVersions)
        .values({
          id: `v${n}`,
          presetId: `p${n}`,
          number: 1,
          state: 'published',
          title: `${some(3)}${rare}`,
          purpose: some(14),
          printingNotes: some(16),
          tags: [some(1), some(1)],
          licence: 'CC-BY-4.0',
          family,
          kind,
          material: MATERIALS[roll(MATERIALS.length)]!,
          use: { opening: 'often', layers: 'along', temperature: 23 },
          values: {},
          verdict: VERDICTS[roll(VERDICTS.length)]!,
          strainShare: 0.5,
          sizeX: 10 + roll(250),
          sizeY: 10 + roll(100),
          sizeZ: 5,
          enclosure: roll(5) === 0 ? 'needed' : 'not-needed',
          handedInAt: at,
        })
        .run();
      tx.update(presets)
        .set({ publishedVersionId: `v${n}` })
        .where(sql`${presets.id} = ${`p${n}`}`)
        .run();
    }
  });
  db.run(sql`update library_entries set worked = (row * 7919) % 40, favourites = (row * 104729) % 90`);
}

/** One search as a page makes it: the entries, and how many there are. */
function page(db: Connection, given: Partial<LibraryFilter>): number {
  const filter: LibraryFilter = { open: false, sort: 'newest', limit: 25, ...given };
  const start = performance.now();
  searchLibrary(db, filter);
  countLibrary(db, filter);
  return performance.now() - start;
}

const SORTS = ['best', 'newest', 'worked', 'favourites', 'title'] as const;

function searches(): readonly [string, (n: number) => Partial<LibraryFilter>][] {
  const roll = dice(11);
  const word = () => WORDS[roll(WORDS.length)]!;
  return [
    ['no filter', (n) => ({ sort: SORTS[n % 5]! })],
    ['one word in thousands of presets', (n) => ({ text: word(), sort: SORTS[n % 5]! })],
    ['two words', (n) => ({ text: `${word()} ${word()}`, sort: SORTS[n % 5]! })],
    ['the beginning of a word', (n) => ({ text: word().slice(0, 3), sort: SORTS[n % 5]! })],
    ['a rare word', (n) => ({ text: RARE[n % RARE.length]!, sort: SORTS[n % 5]! })],
    ['a word nobody used', () => ({ text: 'nowhere' })],
    [
      'filters alone',
      (n) => ({ kind: 'clips', material: MATERIALS[n % 7]!, open: true, sort: SORTS[n % 5]! }),
    ],
    [
      'a word, filters and a size',
      (n) => ({ text: word(), verdict: 'close-to-limit', fits: 100, open: true, sort: SORTS[n % 5]! }),
    ],
    ['page after page', (n) => ({ text: word(), after: { row: 90_000 - 900 * (n % 90), value: 1 } })],
  ];
}

export function run(count = 100_000): void {
  const folder = mkdtempSync(path.join(tmpdir(), 'bendwell-bench-'));
  const db = connect(path.join(folder, 'library.sqlite'));
  migrateDatabase(db);
  const start = performance.now();
  fill(db, count);
  console.log(`\n${count} presets published in ${((performance.now() - start) / 1000).toFixed(1)} s`);
  const all: number[] = [];
  const at = (times: number[], share: number) =>
    times[Math.min(times.length - 1, Math.floor(share * times.length))]!;
  const rows = searches().map(([name, make]) => {
    const times = Array.from({ length: 60 }, (_, n) => page(db, make(n)));
    all.push(...times);
    times.sort((a, b) => a - b);
    return [name, ms(at(times, 0.5)), ms(at(times, 0.95)), ms(times.at(-1)!)];
  });
  all.sort((a, b) => a - b);
  const scan = Array.from({ length: 5 }, () => {
    const from = performance.now();
    db.all(
      sql`select row from library_entries where title like '%hatch%' order by row desc limit 25 offset 5000`,
    );
    return performance.now() - from;
  }).sort((a, b) => a - b)[2]!;
  printTable('A page of the library, entries and count', [
    ['search', 'median', 'p95', 'longest'],
    ...rows,
    ['all of them', ms(at(all, 0.5)), ms(at(all, 0.95)), ms(all.at(-1)!)],
  ]);
  console.log(`  a scan with LIKE takes ${ms(scan)}, ${ratio(scan / at(all, 0.5))} the median`);
  db.$client.close();
  rmSync(folder, { recursive: true });
}

if (process.argv[1]?.endsWith('library.ts')) run(Number(process.argv[2] ?? 100_000));
