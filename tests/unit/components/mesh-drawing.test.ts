import { describe, expect, it } from 'vitest';
import { drawMesh } from '@/components/studio/computed/mesh-drawing';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import { NON_LINEAR } from '@/lib/fea/solve/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE, solved } from '@/tests/support/plane-models';

const MODEL = cantileverModel({
  length: 12,
  thickness: 2,
  tipThickness: 1.5,
  catch: { height: 1, land: 1, lead: 0.5, back: 0.8 },
  root: { kind: 'base', thickness: 3, span: 10, bottom: true },
  fillets: { front: 1, back: 1 },
  width: { kind: 'even', width: 5 },
  deflection: 1,
});
const SOLUTION = solved(solveBending(MODEL, REFERENCE, NON_LINEAR));
const PEAK = SOLUTION.tension.node;
const at = (t: number) => drawMesh(SOLUTION, MODEL, { t, end: 0.05, peak: PEAK });
const count = (path: string) => path.split('M').length - 1;

describe('the picture of the mesh', () => {
  it('draws every triangle once, painted on both sides of no strain when bent and in one shade at rest', () => {
    const bent = at(1).fills;
    expect(bent.reduce((sum, { path }) => sum + count(path), 0)).toBe(SOLUTION.elements);
    expect(bent.length).toBeGreaterThan(6);
    expect(at(0).fills).toHaveLength(1);
  });

  it('is at true scale: the pushed edge moves by the deflection, the held one not at all', () => {
    const [rest, bent] = [at(0), at(1)];
    expect(bent.held).toBe(rest.held);
    const xs = (path: string) => [...path.matchAll(/[ML](-?[\d.]+) /g)].map(([, x]) => Number(x));
    const mean = (path: string) => xs(path).reduce((sum, x) => sum + x, 0) / xs(path).length;
    expect(Math.abs(mean(bent.pushed) - mean(rest.pushed))).toBeCloseTo(1, 1);
  });

  it('marks the peak on the bent shape and keeps both shapes in the frame', () => {
    const { box, peak, rest } = at(1);
    expect(peak.x).not.toBeCloseTo(SOLUTION.tension.place[0], 6);
    expect(peak.x).toBeCloseTo(SOLUTION.tension.place[0], 0);
    for (const [, x, y] of rest.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)) {
      expect(Number(x)).toBeGreaterThanOrEqual(box.x);
      expect(Number(x)).toBeLessThanOrEqual(box.x + box.width);
      expect(Number(y)).toBeGreaterThanOrEqual(box.y);
      expect(Number(y)).toBeLessThanOrEqual(box.y + box.height);
    }
    expect(at(0).box).toEqual(box);
  });
});
