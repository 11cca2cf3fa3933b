import type { Band } from '@/lib/materials/types';
import { wedgeFactor } from '@/lib/mechanics/friction';
import type { Curve } from '../report';
import { leadInLength, returnRun } from './dimensions';
import { peakOf, strainOf } from './mechanics';
import { forceOf, type Subject } from './subject';

const STEPS = 8;

interface Step {
  /** 0 to 1 of the undercut */
  readonly share: number;
  /** transverse force, N; null where no modulus is known */
  readonly force: number | null;
  readonly peak: number;
}

function stepsOf({ values, material, flexible, strain }: Subject): readonly Step[] {
  return Array.from({ length: STEPS + 1 }, (_, i) => {
    const share = i / STEPS;
    if (i === 0) return { share, force: 0, peak: 0 };
    const at = i === STEPS ? strain : strainOf(values, flexible, share * values.undercut);
    return { share, force: forceOf(material, at), peak: peakOf(at) };
  });
}

interface Face {
  readonly id: string;
  readonly label: string;
  /** of the sloping face, degrees */
  readonly angle: number;
  /** travel over the sloping face and over the land, mm */
  readonly run: number;
  readonly land: number;
}

/** Force over travel: up the sloping face, over the land by friction alone, then free. None where it may lock. */
function forceCurve(face: Face, steps: readonly Step[], friction: Band): Curve[] {
  const top = steps[STEPS]!.force;
  if (top === null || !Number.isFinite(wedgeFactor(friction.high, face.angle))) return [];
  const end = face.run + face.land;
  const path = [
    ...steps.map(({ share, force }) => ({ travel: share * face.run, push: force ?? 0, angle: face.angle })),
    { travel: face.run, push: top, angle: 0 },
    { travel: end, push: top, angle: 0 },
    { travel: end, push: 0, angle: 0 },
  ];
  const band = path.map(
    ({ push, angle }) =>
      [push * wedgeFactor(friction.low, angle), push * wedgeFactor(friction.high, angle)] as const,
  );
  return [
    {
      id: face.id,
      label: face.label,
      x: { label: 'Travel', unit: 'mm' },
      y: { label: 'Force', unit: 'N' },
      points: path.map(({ travel, push, angle }) => [travel, push * wedgeFactor(friction.value, angle)]),
      band,
    },
  ];
}

function strainCurve(undercut: number, steps: readonly Step[]): Curve {
  return {
    id: 'strain',
    label: 'Strain as the arm bends',
    x: { label: 'Tip deflection', unit: 'mm' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: steps.map(({ share, peak }) => [share * undercut, peak]),
  };
}

export function curvesOf(subject: Subject): readonly Curve[] {
  const { values: v, material, trouble, strainTrouble } = subject;
  if (trouble) return [];
  const steps = stepsOf(subject);
  const push: Face = {
    id: 'insertion',
    label: 'Push to close',
    angle: v.leadInAngle,
    run: leadInLength(v),
    land: v.landLength,
  };
  const pull: Face = {
    id: 'separation',
    label: 'Pull to open',
    angle: v.returnAngle,
    run: returnRun(v),
    land: v.landLength,
  };
  return [
    ...forceCurve(push, steps, material.friction),
    ...forceCurve(pull, steps, material.friction),
    ...(strainTrouble ? [] : [strainCurve(v.undercut, steps)]),
  ];
}
