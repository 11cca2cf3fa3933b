import { describe, expect, it } from 'vitest';
import panel from '@/generators/lattice-hinge';
import { rowsOf } from '@/generators/lattice-hinge/geometry';
import { latticeStrain } from '@/generators/lattice-hinge/mechanics';
import {
  flexLength,
  overlapOf,
  parameters,
  totalLength,
  type Values,
} from '@/generators/lattice-hinge/schema';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE, type Use } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const material = (id: string) => materialById(id)!;
const checked = (id: string, changed: Partial<Values> = {}, use: Use = DEFAULT_USE): Report =>
  panel.check(values(changed), material(id), use);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('lattice hinge: verdicts', () => {
  it('strains less with more rows, fewer slits in a row and a thinner panel', () => {
    const peak = (changed: Partial<Values>) => figure(checked('petg', changed), 'peak-strain').value!;
    expect(peak({ rows: 41 })).toBeCloseTo(peak({ rows: 21 }) / 2, 9);
    expect(peak({ columns: 1 })).toBeLessThan(peak({ columns: 2 }));
    expect(peak({ thickness: 1.6 })).toBeLessThan(peak({ thickness: 2.4 }));
  });

  it('halves the moment when the rows are doubled, and doubles it with the width', () => {
    const rubber = (changed: Partial<Values>) => figure(checked('tpu-95a', changed), 'bend-moment');
    const moment = figure(checked('pp', {}), 'bend-moment').value!;
    const wide = figure(checked('pp', { panelWidth: 120, columns: 4 }), 'bend-moment').value!;
    expect(wide).toBeCloseTo(2 * moment, 6);
    expect(rubber({ rows: 41 }).value!).toBeLessThan(rubber({ rows: 21 }).value!);
  });

  it('meets the limit at the least radius and with the rows it asks for', () => {
    const report = checked('pla');
    const rows = figure(report, 'rows-needed').value!;
    const strain = (n: number) => figure(checked('pla', { rows: n }), 'peak-strain');
    expect(strain(rows).verdict).not.toBe('over-limit');
    expect(strain(rows - 1).verdict).toBe('over-limit');
    const least = figure(report, 'least-radius').value!;
    const ratio = figure(report, 'bend-radius').value! / least;
    expect(strain(21).value! * ratio).toBeCloseTo(report.allowable.value!, 9);
  });

  it('finds over limit a bend at which the slits close', () => {
    const closing = figure(checked('tpu-95a', { rows: 8, bendAngle: 180 }), 'closing-angle');
    expect(closing.value).toBeCloseTo(((7 * 0.6) / 2.4) * (180 / Math.PI), 9);
    expect(closing.verdict).toBe('over-limit');
  });

  it('does not know strain and moment outside the fitted range, and says why', () => {
    const report = checked('petg', { linkWidth: 6, bridge: 8 });
    expect(figure(report, 'peak-strain')).toMatchObject({ value: null, verdict: 'not-known' });
    expect(figure(report, 'peak-strain').because).toMatch(/0.25 to 2 times as wide/);
    expect(figure(report, 'bend-moment').value).toBeNull();
    const few = checked('petg', { rows: 3, bendAngle: 90 });
    expect(figure(few, 'peak-strain').because).toMatch(/more than 20°/);
  });

  it('names the bridges where they bend more than the links twist', () => {
    const report = checked('petg', { linkWidth: 2.4, thickness: 1.2, bridge: 2.9, columns: 1 });
    expect(figure(report, 'bridge-strain').value!).toBeGreaterThan(0);
    const { link, bridge, peak } = latticeStrain(values({ bridge: 2 }), 0.35);
    expect(peak).toBe(Math.max(link, bridge));
  });
});

describe('lattice hinge: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ bridge: 15 })).toEqual([
      'bridge: Bridge must be at most 13.9 mm with slits 30.0 mm apart, or the rows do not overlap',
    ]);
    expect(refused({ rows: 60, columns: 12, panelWidth: 200 })[0]).toMatch(/^rows: .*at most 20 with 12/);
    expect(refused({ rows: 2 })).toEqual(['rows: Rows of slits must be at least 3']);
  });

  it('opens every preset within its limit', () => {
    for (const preset of panel.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = checked(preset.material, preset.values, preset.use);
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${report.verdict}`).toContain(report.verdict);
    }
  });
});

describe('lattice hinge: shape', () => {
  it('builds closed solids of the expected volume and size at 100 random valid designs', async () => {
    await checkFamilySolids(panel, {
      runs: 100,
      seed: 21,
      volumeError: 1e-4,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [minX, minY, minZ, maxX, maxY, maxZ] = bodies[0]!.bounds;
        expect([maxX - minX, maxY - minY, maxZ - minZ]).toEqual(
          [totalLength(p), p.panelWidth, p.thickness].map((size) => expect.closeTo(size, 3)),
        );
      },
    });
  });

  it('takes away a slit less its rounded corners for every slit of every row', () => {
    const p = values({ columns: 3, rows: 5 });
    const plain = totalLength(p) * p.panelWidth;
    const slit = (length: number, ends: number) =>
      length * p.slitWidth - ends * (1 - Math.PI / 4) * (p.slitWidth ** 2 / 2);
    const whole = slit(20 - p.bridge, 2);
    const open = slit((20 - p.bridge) / 2, 1);
    const expected = plain - (3 * 3 + 2 * 2) * whole - 4 * open;
    expect(panel.volumes(p, 2000)!.panel! / p.thickness).toBeCloseTo(expected, 2);
  });

  it('leaves bridge, link and slit as they were asked for', () => {
    const p = values({ columns: 4, panelWidth: 100 });
    const [odd, even] = rowsOf(p);
    expect(even!.x - odd!.x).toBeCloseTo(p.linkWidth + p.slitWidth, 9);
    const [a, b] = odd!.slits;
    expect(b!.y - a!.y - a!.length).toBeCloseTo(p.bridge, 9);
    const overlap = a!.y + a!.length / 2 - (even!.slits[0]!.y - even!.slits[0]!.length / 2);
    expect(overlap).toBeCloseTo(overlapOf(p), 9);
    expect(even!.notch).toBeCloseTo(a!.length / 2, 9);
  });
});

describe('lattice hinge: motion', () => {
  const p = values();
  const motion = panel.motion(p, material('petg'));
  const pose = (points: number[][], t: number) => {
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('panel', rest, t, out);
    return out;
  };
  const end = totalLength(p) / 2;
  const near = flexLength(p) / 2 + 1;

  it('leaves the flat panel as it is', () => {
    const { positions, strain } = pose(
      [
        [end, 3, 0],
        [0.3, -7, 2],
      ],
      0,
    );
    for (const [i, value] of [end, 3, 0, 0.3, -7, 2].entries()) expect(positions[i]).toBeCloseTo(value, 4);
    expect([...strain].map(Math.abs)).toEqual([0, 0]);
  });

  it('turns the far panel by the bend angle without changing its size and keeps the near one', () => {
    const { positions } = pose(
      [
        [near, 0, 1.2],
        [end, 0, 1.2],
        [-end, 5, 0],
      ],
      1,
    );
    expect(positions[3]! - positions[0]!).toBeCloseTo(0, 3);
    expect(positions[5]! - positions[2]!).toBeCloseTo(end - near, 3);
    expect([...positions.slice(6)]).toEqual([-end, 5, 0].map((value) => expect.closeTo(value, 4)));
  });

  it('keeps every bridge whole: its two ends stay together', () => {
    const [odd, even] = rowsOf(p);
    const bridges: [number, number][] = [
      [odd!.x, -p.panelWidth / 2 + 0.5],
      [odd!.x, 0],
      [even!.x, -p.panelWidth / 4],
    ];
    for (const [x, y] of bridges) {
      for (const z of [0, p.thickness]) {
        const { positions } = pose(
          [
            [x - 1e-4, y, z],
            [x + 1e-4, y, z],
          ],
          1,
        );
        const apart = Math.hypot(...[0, 1, 2].map((k) => positions[3 + k]! - positions[k]!));
        expect(apart).toBeLessThan(1e-3);
      }
    }
  });

  it('paints the links with the peak of the check and leaves the plain panels bare', () => {
    const link = -flexLength(p) / 2 + p.slitWidth + p.linkWidth / 2;
    const { strain } = pose(
      [
        [link, -p.panelWidth / 8 - 15, 1],
        [end, 0, 0],
      ],
      1,
    );
    expect(strain[0]).toBeCloseTo(motion.peakStrain, 6);
    expect(strain[1]).toBe(0);
  });
});
