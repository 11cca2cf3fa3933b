import type { Material } from '@/lib/materials/types';
import { foldWeb } from '@/lib/mechanics/web-fold';
import type { Motion, Posed } from '../contract';
import { foldPose } from '../web-motion';
import {
  armFace,
  axisHeight,
  backOuter,
  frontOuter,
  keeperEdge,
  LAND,
  leadRun,
  noseEnd,
  webBottom,
} from './layout';
import { catchOf, foldOf } from './mechanics';
import type { Values } from './schema';

/** Share of the slider that brings the nose to its keeper; the rest is for the catch. */
const APPROACH = 0.7;

/** Bend of the arm over undercut, the catch a height in mm above its home. */
function deflectionShare(p: Values, above: number): number {
  const home = p.clearance;
  const held = LAND + LAND;
  const ramp = leadRun(p) + p.undercut;
  if (above <= 0) return 0;
  if (above < home) return above / home;
  if (above <= held) return 1;
  return Math.max(0, 1 - (above - held) / ramp);
}

/**
 * Turns the lid over the box. The web bends as the hinge's does and is drawn to where the closed walls hold it; over the
 * last turn the arm bends out over the keeper and snaps back.
 */
export function motion(p: Values, material: Material): Motion {
  const fold = foldOf(p);
  const folded = foldWeb(fold);
  const snap = catchOf(p, material.poisson.value);
  const peak = folded.strain?.peak ?? folded.nominal;
  const middle = webBottom(p) + p.webThickness / 2;
  const turn = foldPose({ web: fold.web, middle, peak, sign: 1 });
  const [half, root] = [backOuter(p), p.floor];
  const radius = Math.hypot(armFace(p), axisHeight(p) - keeperEdge(p));
  const contact = (LAND + LAND + leadRun(p) + p.undercut) / radius;

  const angleAt = (t: number): number =>
    t <= APPROACH
      ? ((Math.PI - contact) * t) / APPROACH
      : Math.PI - contact * (1 - (t - APPROACH) / (1 - APPROACH));

  /** Where the end of the web goes, turned by an angle, against where the closed lid wants it. */
  function closing(): { x: number; z: number } {
    const out = { positions: new Float32Array(3), strain: new Float32Array(1) };
    turn(Float32Array.of(half, 0, middle), Math.PI, 1, out);
    return { x: -half - out.positions[0]!, z: 2 * axisHeight(p) - middle - out.positions[2]! };
  }
  const { x: dx, z: dz } = closing();

  const onArm = (x: number, z: number): boolean => x > frontOuter(p) + 1e-3 && z > root;

  /** Points of the arm bent away from the box by a share of the undercut. */
  function bend(rest: Float32Array, share: number): { moved: Float32Array; strain: Float32Array } {
    const moved = Float32Array.from(rest);
    const strain = new Float32Array(rest.length / 3);
    for (let i = 0; i < rest.length; i += 3) {
      const [x, z] = [rest[i]!, rest[i + 2]!];
      if (!onArm(x, z) || share === 0) continue;
      const along = Math.min(noseEnd(p), z - root) / p.armLength;
      const bent = along <= 1 ? (along ** 2 * (3 - along)) / 2 : 1 + 1.5 * (along - 1);
      moved[i] = x + share * p.undercut * bent;
      const lever = Math.max(-1, Math.min(1, (2 * (armFace(p) - x)) / p.armThickness + 1));
      strain[i / 3] = share * snap.pushed.peak * lever * Math.max(0, 1 - along);
    }
    return { moved, strain };
  }

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    const angle = angleAt(t);
    const share = deflectionShare(p, (Math.PI - angle) * radius);
    const { moved, strain } = bend(rest, share);
    const done = angle / Math.PI;
    turn(moved, angle, done, out);
    for (let i = 0; i < rest.length; i += 3) {
      const along = Math.max(0, Math.min(1, (rest[i]! + half) / (2 * half)));
      out.positions[i]! += dx * along * done ** 2;
      out.positions[i + 2]! += dz * along * done ** 2;
      out.strain[i / 3]! += strain[i / 3]!;
    }
  }

  const strains = [peak, snap.fault ? 0 : snap.pushed.peak];
  return { label: 'Close', from: 'open, as printed', to: 'closed', peakStrain: Math.max(...strains), pose };
}
