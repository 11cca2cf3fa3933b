import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { PACKAGE_ROOMS, ROOMS, type Room } from './rooms';

interface Import {
  readonly from: string;
  readonly typeOnly: boolean;
}

const files = execFileSync('git', ['ls-files', '-co', '--exclude-standard', '*.ts', '*.tsx', '*.mjs'], {
  encoding: 'utf8',
})
  .split('\n')
  .filter((file) => file !== '' && existsSync(file));
const inRooms = files.filter((file) => /^(app|components|lib|generators|db)\//.test(file));

const roomOf = (file: string): Room | undefined =>
  ROOMS.filter((room) => file === room.path || file.startsWith(`${room.path}/`)).sort(
    (a, b) => b.path.length - a.path.length,
  )[0];

const STATEMENT =
  /(?:import|export)\s+(type\s+)?(?:[\w*{}\s,$]+?\s+from\s+)?['"]([^'"]+)['"]|import\(\s*['"]([^'"]+)['"]\s*\)|new URL\(\s*['"]([^'"]+)['"]\s*,\s*import\.meta\.url/g;

function importsOf(file: string): Import[] {
  const text = readFileSync(file, 'utf8');
  return [...text.matchAll(STATEMENT)].map((match) => ({
    from: (match[2] ?? match[3] ?? match[4])!,
    typeOnly: Boolean(match[1]),
  }));
}

/** Project path of an import, or null for a package. */
function target(file: string, from: string): string | null {
  if (from.startsWith('@/')) return from.slice(2);
  if (from.startsWith('.')) return path.posix.normalize(path.posix.join(path.posix.dirname(file), from));
  return null;
}

const asRoom = (project: string): Room | undefined => roomOf(project) ?? roomOf(`${project}.ts`);

function faultOf(file: string, room: Room, { from, typeOnly }: Import): string | null {
  const project = target(file, from);
  if (project === null) {
    const name = from.startsWith('@') ? from.split('/').slice(0, 2).join('/') : from.split('/')[0]!;
    const allowed = PACKAGE_ROOMS[name];
    if (!allowed || typeOnly || allowed.some((one) => file.startsWith(`${one}/`))) return null;
    return `${file} imports the package ${name}`;
  }
  const other = asRoom(project);
  if (!other)
    return project.startsWith('node_modules/') ? null : `${file} imports ${from}, which is in no room`;
  if (other.path === room.path || room.may.includes(other.path)) return null;
  if (typeOnly && room.types?.includes(other.path)) return null;
  return `${file} (${room.path}) imports ${from} (${other.path})`;
}

describe('rooms and directions', () => {
  it('finds the source files', () => {
    expect(inRooms.length).toBeGreaterThan(10);
  });

  it('has every source file in a room', () => {
    expect(inRooms.filter((file) => !roomOf(file))).toEqual([]);
  });

  it('imports only in the allowed directions', () => {
    const faults = inRooms.flatMap((file) => {
      const room = roomOf(file)!;
      return importsOf(file).flatMap((one) => faultOf(file, room, one) ?? []);
    });
    expect(faults).toEqual([]);
  });

  it('keeps part families closed to each other', () => {
    const faults = inRooms.flatMap((file) => {
      const own = /^generators\/([^/]+)\//.exec(file)?.[1];
      if (!own) return [];
      return importsOf(file).flatMap(({ from }) => {
        const other = /^generators\/([^/]+)\//.exec(target(file, from) ?? '')?.[1];
        return other && other !== own ? [`${file} imports ${from}`] : [];
      });
    });
    expect(faults).toEqual([]);
  });

  it('keeps the shape and the mechanics of a family apart', () => {
    const faults = inRooms.filter((file) => {
      const pair = /^generators\/[^/]+\/(geometry|mechanics)\.ts$/.exec(file)?.[1];
      if (!pair) return false;
      const other = pair === 'geometry' ? './mechanics' : './geometry';
      return importsOf(file).some(({ from }) => from === other);
    });
    expect(faults).toEqual([]);
  });

  it('reads the environment through one door', () => {
    const faults = inRooms.filter(
      (file) =>
        file !== 'lib/env.ts' &&
        !file.startsWith('lib/scripts/') &&
        readFileSync(file, 'utf8').includes('process.env'),
    );
    expect(faults).toEqual([]);
  });

  it('marks the server rooms as server only', () => {
    const heads = inRooms.filter(
      (file) => /^lib\/(access|auth|mail|jobs|storage)\/[^/]+\.ts$/.test(file) || file === 'db/client.ts',
    );
    const faults = heads.filter(
      (file) =>
        !readFileSync(file, 'utf8').includes("import 'server-only'") && !/\.(worker|types)\.ts$/.test(file),
    );
    expect(faults).toEqual([]);
  });

  it('keeps clock, randomness and the outside out of the pure rooms', () => {
    const pure = inRooms.filter((file) =>
      /^(generators|lib\/(units|materials|mechanics|fea|geometry|export|printing))\//.test(file),
    );
    const faults = pure.filter((file) =>
      /\b(Date\.now|new Date\(|Math\.random|performance\.now|process\.|fetch\()/.test(
        readFileSync(file, 'utf8'),
      ),
    );
    expect(faults).toEqual([]);
  });
});
