import { describe, expect, it } from 'vitest';
import { frameOf, viewNamed } from '@/components/viewport/drawing/views';
import { arrange, meshOf } from '@/components/viewport/mesh/arrange';
import { boxOf, diagonalOf } from '@/components/viewport/mesh/bounds';
import { peakOf, prepare } from '@/components/viewport/mesh/prepare';
import { isSeen, keptBy, markOf, type Sight } from '@/components/viewport/mesh/sight';
import { buildPart } from '@/generators/build-part';
import type { Family } from '@/generators/contract';
import torsionLatch from '@/generators/torsion-latch';
import { presetDesign } from '@/generators/url-state';
import { createKernelHost } from '@/lib/geometry/host';
import type { TriMesh } from '@/lib/geometry/kernel';
import { materialById } from '@/lib/materials/data';
import { boxMesh } from './shapes';

const latch: Family = torsionLatch;
const FRONT = frameOf(viewNamed('front')).eye;
const lookAt = (solids: readonly TriMesh[], other: Partial<Sight> = {}): Sight => ({
  solids,
  eye: FRONT,
  section: null,
  skin: 0.01,
  ...other,
});

/** A box of 10 by 6 by 4 mm from the origin, seen from the front, that is from below y = 0. */
const box = boxMesh(10, 6, 4);

describe('whether a point of the part is seen', () => {
  it('follows the side it lies on', () => {
    expect(isSeen([5, 0, 2], lookAt([box]))).toBe(true);
    expect(isSeen([5.1, 6, 2.2], lookAt([box]))).toBe(false);
  });

  it('is told by what stands before it, unless that is seen through', () => {
    const before = { ...box, positions: box.positions.map((v, k) => (k % 3 === 1 ? v - 20 : v)) };
    expect(isSeen([5.1, 0, 2.2], lookAt([box, before]))).toBe(false);
    expect(isSeen([5.1, 0, 2.2], lookAt([box]))).toBe(true);
  });

  it('is told by the face of the cut where the cut goes through solid', () => {
    const section = { axis: 'y', at: 3 } as const;
    expect(isSeen([5.1, 6, 2.2], lookAt([box], { section }))).toBe(false);
    const before = { ...box, positions: box.positions.map((v, k) => (k % 3 === 1 ? v - 20 : v)) };
    const beforeBox = { axis: 'y', at: -2 } as const;
    expect(isSeen([5.1, 0, 2.2], lookAt([box, before], { section: beforeBox }))).toBe(true);
  });
});

describe('the side of a cut that is left', () => {
  it('is the one away from the eye', () => {
    const kept = keptBy({ axis: 'y', at: 3 }, FRONT);
    expect([kept([0, 4, 0]), kept([0, 2, 0])]).toEqual([true, false]);
    const fromBehind = keptBy({ axis: 'y', at: 3 }, frameOf(viewNamed('back')).eye);
    expect([fromBehind([0, 4, 0]), fromBehind([0, 2, 0])]).toEqual([false, true]);
  });
});

describe('the mark of the largest strain', () => {
  const front = [0, 1, 4, 5];
  const size = 12;

  it('is not put into the air where its place is cut away', () => {
    const section = { axis: 'y', at: 3 } as const;
    expect(markOf(box.positions, front, size, lookAt([box], { section }))).toBeNull();
  });

  it('moves to what is left of its place', () => {
    const section = { axis: 'x', at: 5 } as const;
    const eye = frameOf({ turn: -40, rise: 0 }).eye;
    expect(eye[0]).toBeLessThan(0);
    const mark = markOf(box.positions, front, size, lookAt([box], { section, eye }));
    expect(mark?.point[0]).toBe(10);
  });

  it('says that it is behind where the part stands before all of its place', () => {
    const back = [2, 3, 6, 7];
    const inside = box.positions.map((v, k) => (k % 3 === 0 ? (v === 0 ? 1 : 9) : v));
    const points = inside.map((v, k) => (k % 3 === 2 ? (v === 0 ? 1 : 3) : v));
    expect(markOf(points, back, size, lookAt([box]))?.seen).toBe(false);
    expect(markOf(points, [...back, ...front], size, lookAt([box]))).toMatchObject({ seen: true });
  });

  it('of a torsion latch lies on a bar that is seen, not on the frame before it', async () => {
    const { values, material } = presetDesign(latch);
    const host = await createKernelHost();
    const bodies = buildPart(host, latch, { parameters: values, quality: 'preview' });
    const motion = latch.motion(values, materialById(material)!);
    const moved = arrange(
      bodies.map((body) => prepare(body, motion)),
      motion,
      0.7,
    );
    const peak = peakOf(moved)!;
    const { eye } = frameOf(viewNamed('corner'));
    const solids = moved.map(meshOf);
    const span = diagonalOf(boxOf(solids.map(({ positions }) => ({ points: positions }))));
    const mark = markOf(
      solids[peak.body]!.positions,
      peak.vertices,
      span,
      lookAt(solids, { eye, skin: 0.004 * span }),
    );
    expect(mark?.seen).toBe(true);
    const { positions: p } = solids[peak.body]!;
    const depth = (v: number) => p[3 * v]! * eye[0] + p[3 * v + 1]! * eye[1] + p[3 * v + 2]! * eye[2];
    const nearest = peak.vertices.reduce((best, one) => (depth(one) > depth(best) ? one : best));
    const front = [p[3 * nearest]!, p[3 * nearest + 1]!, p[3 * nearest + 2]!] as const;
    expect(isSeen(front, lookAt(solids, { eye, skin: 0.004 * span }))).toBe(false);
  });
});
