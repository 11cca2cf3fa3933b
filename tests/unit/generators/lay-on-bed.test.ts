import { describe, expect, it } from 'vitest';
import type { Stance } from '@/generators/contract';
import { BED_GAP, bedPlacement, bedPlacements, laySolidsOnBed } from '@/generators/lay-on-bed';
import { createKernelHost } from '@/lib/geometry/host';
import { type Kernel, QUALITY } from '@/lib/geometry/kernel';
import { boundsOf } from '@/lib/geometry/mesh-check';
import { movePositions, rotation } from '@/lib/geometry/placement';

const host = await createKernelHost();
const stance: Stance = {
  id: 'side',
  label: 'On its side',
  because: 'layers run along the arm',
  layers: 'along',
  orient: { arm: rotation('x', Math.PI / 2) },
};
const make = (kernel: Kernel) => [
  { name: 'arm', solid: kernel.box([20, 4, 9], [3, 7, -8]) },
  { name: 'plate', solid: kernel.box([10, 30, 2], [0, 0, 50]) },
];
const near = (bounds: readonly number[]) => bounds.map((value) => expect.closeTo(value, 4));

describe('a part on the bed', () => {
  it('lies on z = 0, turned by the stance, bodies 5 mm apart in a row about the origin', () => {
    const bodies = host.build((kernel) => laySolidsOnBed(kernel, make(kernel), stance), QUALITY.preview);
    expect(bodies[0]!.bounds).toEqual(near([-17.5, -4.5, 0, 2.5, 4.5, 4]));
    expect(bodies[1]!.bounds).toEqual(near([2.5 + BED_GAP, -15, 0, 17.5, 15, 2]));
  });

  it('lies the same in the view as in the file', () => {
    const laid = host.build((kernel) => laySolidsOnBed(kernel, make(kernel), stance), QUALITY.preview);
    const built = host.build(make, QUALITY.preview);
    const placements = bedPlacements(built, stance);
    for (const [at, { name, mesh }] of built.entries()) {
      const moved = boundsOf(movePositions(placements[name]!, mesh.positions));
      expect(moved).toEqual(near(laid[at]!.bounds));
    }
  });

  it('keeps bodies printed in one another in their places, dropped and centred as one', () => {
    const whole: Stance = { ...stance, together: rotation('x', Math.PI / 2) };
    const bodies = host.build((kernel) => laySolidsOnBed(kernel, make(kernel), whole), QUALITY.preview);
    expect(bodies[0]!.bounds).toEqual(near([-10, 22.75, 20, 10, 31.75, 24]));
    expect(bodies[1]!.bounds).toEqual(near([-8, -31.75, 0, 2, -29.75, 30]));
    const gap = (of: typeof bodies) => of[1]!.bounds[0] - of[0]!.bounds[0];
    expect(gap(bodies)).toBeCloseTo(gap(host.build(make, QUALITY.preview)), 4);
  });

  it('is centred when a body lies alone', () => {
    const [arm] = host.build(make, QUALITY.preview);
    const moved = boundsOf(movePositions(bedPlacement(arm!, stance), arm!.mesh.positions));
    expect(moved).toEqual(near([-10, -4.5, 0, 10, 4.5, 4]));
  });
});
