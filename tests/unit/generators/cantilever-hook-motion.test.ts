import { describe, expect, it } from 'vitest';
import hook from '@/generators/cantilever-hook';
import { type HookValues, parameters } from '@/generators/cantilever-hook/schema';
import type { Posed } from '@/generators/contract';
import { createKernelHost } from '@/lib/geometry/host';
import { type BuiltBody, QUALITY } from '@/lib/geometry/kernel';
import { DEFAULT_USE } from '@/lib/materials/types';
import { toughPlastic } from '@/tests/support/materials';

const PANEL = { wallSpan: 30, wallWidth: 12 } as const;
const ROOTS: readonly Partial<HookValues>[] = [
  {},
  { root: 'wall', wallThickness: 2 },
  { root: 'panel-slot', ...PANEL },
  { root: 'panel-edge', ...PANEL },
];

const values = (changed: Partial<HookValues> = {}): HookValues => ({ ...parameters.defaults, ...changed });

function posed(v: HookValues, body: string, rest: Float32Array, t: number): Posed {
  const out = { positions: new Float32Array(rest.length), strain: new Float32Array(rest.length / 3) };
  hook.motion(v, toughPlastic).pose(body, rest, t, out);
  return out;
}

async function built(v: HookValues): Promise<readonly BuiltBody[]> {
  const host = await createKernelHost();
  return host.build((kernel) => hook.build(v, kernel), QUALITY.preview);
}

describe('cantilever hook: motion', () => {
  it('leaves every body where it is at the start', async () => {
    for (const changed of ROOTS) {
      const v = values(changed);
      for (const { name, mesh } of await built(v)) {
        const { positions, strain } = posed(v, name, mesh.positions, 0);
        const moved = positions.map((value, i) => Math.abs(value - mesh.positions[i]!));
        expect(Math.max(...moved), `${v.root} ${name}`).toBeLessThan(1e-5);
        expect(Math.max(...strain)).toBe(0);
      }
    }
  });

  it('moves the middle of the arm at the catch edge by the undercut', () => {
    for (const changed of ROOTS) {
      const v = values(changed);
      const rest = Float32Array.of(-v.tipThickness / 2, 0, v.armLength);
      const { positions } = posed(v, 'hook', rest, 1);
      expect(positions[0]! - rest[0]!, v.root).toBeCloseTo(-v.undercut, 4);
    }
  });

  it('holds the edges that are held', () => {
    const corner = (v: HookValues, point: readonly [number, number, number]) =>
      [...posed(v, 'hook', Float32Array.of(...point), 1).positions].map((value, i) => value - point[i]!);
    const still = (moved: readonly number[]) => expect(Math.hypot(...moved)).toBeLessThan(1e-6);
    const wall = values(ROOTS[1]!);
    still(corner(wall, [-wall.rootThickness / 2 + wall.wallSpan / 2, 0, 0]));
    for (const panel of [values(ROOTS[2]!), values(ROOTS[3]!)]) {
      still(corner(panel, [0, panel.wallSpan / 2, -3]));
      still(corner(panel, [0, 0, -panel.wallWidth]));
    }
    const block = values();
    still(corner(block, [-block.rootThickness / 2, 0, -block.baseThickness]));
  });

  it('shows the strain of the check at the fillet, tension on the straight face', () => {
    const v = values();
    const { strain } = posed(v, 'hook', Float32Array.of(0, 0, v.rootFillet, -2, 0, v.rootFillet), 1);
    const peak = hook.check(v, toughPlastic, DEFAULT_USE).figures.find(({ id }) => id === 'peak-strain')!;
    expect(strain[0]).toBeCloseTo(peak.value!, 4);
    expect(strain[1]).toBeLessThan(0);
    expect(hook.motion(v, toughPlastic).peakStrain).toBeCloseTo(peak.value!, 9);
  });

  it('never strains a point past the peak of the check', async () => {
    for (const changed of ROOTS) {
      const v = values(changed);
      const [body] = await built(v);
      const { strain } = posed(v, 'hook', body!.mesh.positions, 1);
      const peak = hook.motion(v, toughPlastic).peakStrain;
      expect(Math.max(...strain.map(Math.abs)), v.root).toBeLessThanOrEqual(peak * 1.001);
    }
  });

  it('lets the window plate ride up a sloping return face, and not a square one', () => {
    const at = (v: HookValues) => posed(v, 'receiver', Float32Array.of(0, 0, 0), 1).positions[2];
    expect(at(values({ returnAngle: 45 }))).toBeCloseTo(0.7, 6);
    expect(at(values({ returnAngle: 90 }))).toBe(0);
  });
});

describe('cantilever hook: printing', () => {
  it('lays the arm along the layers first, and says what needs support', () => {
    const [flush] = hook.stances(values({ baseWidth: 8 }));
    expect(flush!.layers).toBe('along');
    expect(flush!.because).toMatch(/need no support/);
    expect(hook.stances(values({ baseWidth: 14 }))[0]!.because).toMatch(/3 mm over the bed/);
    expect(hook.stances(values({ root: 'panel-slot' }))[0]!.id).toBe('flat');
    expect(hook.stances(values()).at(-1)!.layers).toBe('across');
  });

  it('draws a dimension for each main length of the arm', () => {
    const drawn = hook.callouts(values());
    const fields = drawn.map(({ field }) => field);
    expect(fields).toEqual(expect.arrayContaining(['armLength', 'undercut', 'rootThickness', 'rootFillet']));
    for (const { from, to, value, kind } of drawn) {
      const span = Math.hypot(to[0] - from[0], to[1] - from[1], to[2] - from[2]);
      expect(span, kind).toBeCloseTo(value, 6);
    }
  });
});
