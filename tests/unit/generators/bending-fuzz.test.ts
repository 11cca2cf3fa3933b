import { describe, expect, it } from 'vitest';
import { bendingOf, solveRequest } from '@/generators/bend';
import { FAMILIES } from '@/generators/index';
import { meshArea, meshProfile } from '@/lib/fea/mesh/mesh';
import { RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import { smallestAngle } from '@/lib/fea/mesh/quality';
import { profileArea } from '@/lib/fea/profile/profile';
import { solveRequested } from '@/lib/fea/solve/request';
import { DEFAULT_USE } from '@/lib/materials/types';
import { toughPlastic } from '@/tests/support/materials';
import { randomValues } from '@/tests/support/random-values';

/** Parts of each family here; `npm run bench` meshes 10,000 of each. */
const MESHED = 80;
const SOLVED = 6;

const loaded = await Promise.all(FAMILIES.map(({ load }) => load()));
const bending = loaded.filter((family) => family.bending).map((family) => [family.about.id, family] as const);

describe('random parts of every family that bends as a plane shape', () => {
  it('are of at least four families', () => {
    expect(bending.length).toBeGreaterThanOrEqual(4);
  });

  it.each(bending)('are meshed without failure, missing area or thin elements: %s', (_, family) => {
    let planes = 0;
    for (const values of randomValues(family, MESHED)) {
      const plane = bendingOf(family, values, toughPlastic, DEFAULT_USE);
      if ('none' in plane) continue;
      planes++;
      const { profile } = plane.model;
      const meshed = meshProfile(profile, RECOMMENDED_MESH);
      if (!meshed.ok) throw new Error(`${meshed.reason}: ${JSON.stringify(values)}`);
      expect((smallestAngle(meshed.mesh) * 180) / Math.PI, JSON.stringify(values)).toBeGreaterThan(12);
      expect(Math.abs(meshArea(meshed.mesh) / profileArea(profile) - 1)).toBeLessThan(1e-6);
    }
    expect(planes).toBeGreaterThan(MESHED / 3);
  });

  it.each(bending)('are solved, each with a strain that is a number: %s', (_, family) => {
    for (const values of randomValues(family, SOLVED, 2)) {
      const plane = bendingOf(family, values, toughPlastic, DEFAULT_USE);
      if ('none' in plane) continue;
      const solution = solveRequested(solveRequest(plane, toughPlastic, DEFAULT_USE, 'large'));
      if (!solution.ok) throw new Error(`${solution.reason}: ${JSON.stringify(values)}`);
      expect(Number.isFinite(solution.tension.strain)).toBe(true);
      expect(solution.tension.strain).toBeGreaterThan(0);
      expect(solution.steps.at(-1)!.strain.every(Number.isFinite)).toBe(true);
    }
  });
});
