import { afterAll, describe, expect, it } from 'vitest';
import { FAMILIES } from '@/generators/index';
import { InvalidInput, NotFound } from '@/lib/errors';
import { meshFaults, meshVolume } from '@/lib/geometry/mesh-check';
import { BuildPool, closeBuildPool, type ExportRequest, exportPart } from '@/lib/jobs/build-pool';
import { admesh } from '@/tests/support/admesh';
import { readZip } from '@/tests/support/zip';

const family = FAMILIES[0]!.about.id;
const request = (change: Partial<ExportRequest> = {}): ExportRequest => ({
  family,
  parameters: {},
  format: 'stl',
  quality: 'preview',
  title: 'Test part',
  materialName: 'PP',
  ...change,
});

afterAll(closeBuildPool);

describe('the export of every family', () => {
  for (const { about } of FAMILIES) {
    it(`${about.id} gives an STL file in which admesh finds nothing to mend, lying on the bed`, async () => {
      const { bytes, bodies } = await exportPart(request({ family: about.id, quality: 'export' }));
      const report = admesh(bytes);
      expect(report.mended).toEqual({});
      expect(report.parts).toBeGreaterThanOrEqual(bodies.length);
      expect(report.facets).toBe(bodies.reduce((sum, body) => sum + body.triangles, 0));
      expect(report.least[2]).toBe(0);
      const volume = bodies.reduce((sum, body) => sum + body.volume, 0);
      expect(report.volume / volume).toBeCloseTo(1, 4);
    });

    it(`${about.id} gives a 3MF file with its closed bodies by name`, async () => {
      const { bytes, bodies } = await exportPart(request({ family: about.id, format: '3mf' }));
      const model = readZip(bytes).at(-1)!.text;
      const objects = model.split('<object ').slice(1);
      expect(objects.map((text) => /name="([^"]*)"/.exec(text)![1])).toEqual(bodies.map((body) => body.name));
      for (const [at, text] of objects.entries()) {
        const numbers = (pattern: RegExp) =>
          [...text.matchAll(pattern)].flatMap((m) => m.slice(1, 4).map(Number));
        const mesh = {
          positions: Float32Array.from(numbers(/<vertex x="(.*?)" y="(.*?)" z="(.*?)"/g)),
          indices: Uint32Array.from(numbers(/<triangle v1="(\d+)" v2="(\d+)" v3="(\d+)"/g)),
        };
        expect(meshFaults(mesh)).toEqual([]);
        expect(meshVolume(mesh)).toBeCloseTo(bodies[at]!.volume, 3);
      }
    });
  }
});

describe('the export pool', () => {
  it('gives the same bytes for the same request', async () => {
    const [a, b] = await Promise.all([exportPart(request()), exportPart(request())]);
    expect(Buffer.compare(a.bytes, b.bytes)).toBe(0);
  });

  it('keeps the event loop free while it builds', async () => {
    let turns = 0;
    let building = true;
    const turn = () => {
      turns += 1;
      if (building) setImmediate(turn);
    };
    setImmediate(turn);
    await exportPart(request({ family: 'screw-cap', quality: 'export' }));
    building = false;
    expect(turns).toBeGreaterThan(0);
  });

  it('passes on every field at fault', async () => {
    const failed = exportPart(request({ parameters: { nothingOfTheKind: 1 } }));
    await expect(failed).rejects.toBeInstanceOf(InvalidInput);
    await expect(failed).rejects.toMatchObject({ issues: [{ field: 'nothingOfTheKind' }] });
  });

  it('refuses an unknown family, stance or body', async () => {
    await expect(exportPart(request({ family: 'trapdoor' }))).rejects.toBeInstanceOf(NotFound);
    await expect(exportPart(request({ stance: 'on its head' }))).rejects.toBeInstanceOf(NotFound);
    await expect(exportPart(request({ bodies: ['trapdoor'] }))).rejects.toBeInstanceOf(InvalidInput);
  });

  it('refuses the jobs under way when it closes, and starts again when asked', async () => {
    const pool = new BuildPool({ threads: 1, waiting: 2, time: 60_000 });
    const jobs = [pool.exportPart(request()), pool.exportPart(request())];
    const settled = Promise.allSettled(jobs);
    await pool.close();
    expect((await settled).map((one) => one.status)).toEqual(['rejected', 'rejected']);
    expect((await pool.exportPart(request())).bodies.length).toBeGreaterThan(0);
    await pool.close();
  });
});
