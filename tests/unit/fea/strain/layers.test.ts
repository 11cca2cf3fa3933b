import { describe, expect, it } from 'vitest';
import type { BendingModel } from '@/lib/fea/model';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import { LINEAR } from '@/lib/fea/solve/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { allowableAtAngle } from '@/lib/fea/strain/layers';
import { REFERENCE, solved } from '@/tests/support/plane-models';

describe('allowable at an angle to the layers', () => {
  it('is that across the layers at 0 and along them at 90 degrees', () => {
    expect(allowableAtAngle(0.02, 0.008, 0)).toBeCloseTo(0.008, 12);
    expect(allowableAtAngle(0.02, 0.008, Math.PI / 2)).toBeCloseTo(0.02, 12);
  });

  // Wood Handbook, Hankinson's formula with the usual exponent 2: N = PQ / (P sin^2 + Q cos^2)
  it('is the harmonic mean at 45 degrees', () => {
    expect(allowableAtAngle(0.02, 0.008, Math.PI / 4)).toBeCloseTo((2 * 0.02 * 0.008) / 0.028, 12);
  });

  it('rises with the angle and never exceeds the figure along the layers', () => {
    const at = Array.from({ length: 10 }, (_, i) => allowableAtAngle(0.02, 0.008, (i * Math.PI) / 18));
    expect([...at].sort((a, b) => a - b)).toEqual(at);
    expect(Math.max(...at)).toBeLessThanOrEqual(0.02);
  });
});

describe('verdict on layers', () => {
  const model: BendingModel = cantileverModel({
    length: 12,
    thickness: 2,
    tipThickness: 2,
    catch: null,
    root: { kind: 'base', thickness: 4, span: 16, bottom: true },
    fillets: { front: 0.6, back: 0.6 },
    width: { kind: 'even', width: 6 },
    deflection: 0.5,
  });
  const verdict = (normal: number, across: number | null) =>
    solved(solveBending(model, REFERENCE, LINEAR, { along: 0.02, across, normal })).layers;

  it('judges an arm printed standing by the strength between layers', () => {
    const standing = verdict(Math.PI / 2, 0.008)!;
    const peak = solved(solveBending(model, REFERENCE)).tension.strain;
    expect(standing.allowable).toBeLessThan(0.0085);
    expect(standing.share).toBeGreaterThan((0.95 * peak) / 0.0085);
  });

  it('judges an arm whose layers run along it where the fillet turns the strain towards the next layer', () => {
    // across the layers is x here: the arm's face pulls along its layers, the fillet's end at the base across them
    const lying = verdict(0, 0.008)!;
    const standing = verdict(Math.PI / 2, 0.008)!;
    expect(lying.share).toBeLessThan(0.8 * standing.share);
    expect(lying.allowable).toBeGreaterThan(0.012);
    expect(lying.place[0]).toBeGreaterThan(1);
    expect(lying.angle).toBeLessThan(Math.PI / 2);
  });

  it('is not known where the strength between layers is not', () => {
    expect(verdict(Math.PI / 2, null)).toBeNull();
  });

  it('bends more softly where the layers lie across the strain and the print is soft across them', () => {
    const force = (normal: number) =>
      solved(
        solveBending(model, {
          modulus: 1500,
          poisson: 0.35,
          layers: { normal, across: 900, shearBetween: null },
        }),
      ).steps.at(-1)!.force;
    const standing = force(Math.PI / 2);
    const isotropic = solved(solveBending(model, REFERENCE)).steps.at(-1)!.force;
    // bending strain runs along the arm, so the modulus across the layers governs: 900 / 1500
    expect(standing / isotropic).toBeGreaterThan(0.58);
    expect(standing / isotropic).toBeLessThan(0.68);
    expect(force(0) / isotropic).toBeGreaterThan(0.9);
  });
});
