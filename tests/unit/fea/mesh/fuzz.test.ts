import { describe, expect, it } from 'vitest';
import { meshArea, meshProfile } from '@/lib/fea/mesh/mesh';
import { RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import { smallestAngle } from '@/lib/fea/mesh/quality';
import { profileArea } from '@/lib/fea/profile/profile';
import { RANDOM_SHAPES, randomModels } from '@/tests/support/random-shapes';

/** Profiles of each shape here; `npm run bench` repeats this with 10,000. */
const COUNT = 150;

describe('mesh of random profiles', () => {
  it.each(Object.keys(RANDOM_SHAPES))('never fails, misses area or has thin elements: %s', (shape) => {
    let seen = 0;
    let thinnest = 180;
    let areaError = 0;
    for (const { profile } of randomModels(shape, COUNT)) {
      const meshed = meshProfile(profile, RECOMMENDED_MESH);
      if (!meshed.ok) throw new Error(`${shape} ${seen}: ${meshed.reason}`);
      thinnest = Math.min(thinnest, (smallestAngle(meshed.mesh) * 180) / Math.PI);
      areaError = Math.max(areaError, Math.abs(meshArea(meshed.mesh) / profileArea(profile) - 1));
      seen++;
    }
    expect(seen).toBe(COUNT);
    expect(thinnest).toBeGreaterThan(12);
    expect(areaError).toBeLessThan(1e-6);
  });
});
