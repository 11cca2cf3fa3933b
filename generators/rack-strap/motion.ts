import type { Material } from '@/lib/materials/types';
import type { BentFlushArm } from '@/lib/mechanics/flush-arm';
import { stationValue, strainAt } from '@/lib/mechanics/large-deflection';
import type { Motion, Posed } from '../contract';
import { asStraight, engagement, layoutOf, onBand, pawlFlat, rampRun, turnOf, valleyOf } from './layout';
import { along, closedLoop, type LoopPath, pathOf } from './loop';
import { pawlLifted, type Wrap, wrapOn } from './mechanics';
import type { Values } from './schema';

/** Share of the slider on which the band is laid round the bundle; then it is drawn tight. */
const CURL = 0.5;

/** Length of band between head and entry when it is closed on a bundle, a tooth home against the pawl. */
export function closedLength(p: Values, bundle: number): number {
  const { head, tip, toothedFrom, teeth } = layoutOf(p);
  // a steep face of the band rests against the pawl's end face where a valley begins there
  const seat = toothedFrom + tip - head;
  const wanted = turnOf(p, bundle) - head;
  const clicks = Math.max(p.pawlTeeth, Math.min(teeth, Math.round((wanted - seat) / p.pitch)));
  return seat + clicks * p.pitch;
}

/** How far the pawl is lifted when the band has been drawn by a share of a click past a seat, 0 to 1 of the overlap. */
export function liftAt(p: Values, share: number): number {
  const free = valleyOf(p) - pawlFlat(p) + (p.clearance * rampRun(p)) / p.toothDepth;
  const ramp = (engagement(p) * rampRun(p)) / p.toothDepth;
  const drawn = share * p.pitch;
  return Math.max(0, Math.min(1, (drawn - free) / ramp));
}

interface Moment {
  readonly path: LoopPath;
  /** 1 when laid round */
  readonly curl: number;
  readonly lift: number;
}

function momentAt(p: Values, t: number): Moment {
  const { band, head, floor, toothedFrom, teeth, tip, ring } = layoutOf(p);
  const curl = Math.min(1, t / CURL);
  const home = closedLength(p, p.smallestBundle);
  const tight = Math.max(0, (t - CURL) / (1 - CURL));
  const length = band + (home - band) * tight;
  const [a, b] = closedLoop(length, head, floor);
  const atPawl = length + head - tip;
  const meshes = atPawl < toothedFrom + teeth * p.pitch;
  const clicks = (length - home) / p.pitch;
  const drawn = Math.ceil(clicks - 1e-9) - clicks;
  const path = pathOf({ length, closed: curl, a, b, printed: 1 / ring });
  return { path, curl, lift: meshes ? liftAt(p, drawn) : 0 };
}

/** A point of the band: carried along the middle line, teeth on the outside. */
function bandPoint(p: Values, { path, curl }: Moment, wrap: Wrap, at: readonly [number, number], z: number) {
  const { passageFrom, ring } = layoutOf(p);
  const [x, y] = asStraight(p, at);
  const half = p.bandThickness / 2;
  const place = along(path, -x);
  const off = y - half;
  const inside = Math.min(1, off / half);
  const tooth = Math.max(0, 1 - Math.max(0, y - p.bandThickness) / p.toothDepth);
  const bend = Math.max(0, (2 * Math.PI) / path.length - 1 / ring);
  const round = -x < path.length ? curl * half * bend : 0;
  return {
    x: place.x + off * Math.sin(place.heading),
    y: half + place.y - off * Math.cos(place.heading),
    z: z + curl * (passageFrom + p.clearance) * Math.min(1, -x / path.length),
    strain: round * inside * (inside > 0 ? wrap.factor * tooth : 1),
  };
}

function isPawl(p: Values, x: number, y: number): boolean {
  const { tip, root, skinTop, guardFrom } = layoutOf(p);
  const under = p.release === 'never' ? guardFrom - 1e-3 : Number.POSITIVE_INFINITY;
  return x > tip - 1e-3 && x < root - 1e-3 && y > skinTop + p.clearance / 2 && y < under;
}

/** A point of the pawl, lifted by a share of the overlap: sections turn with its middle line. */
function pawlPoint(p: Values, { flexible, bent }: BentFlushArm, lift: number, x: number, y: number) {
  const { root, roof } = layoutOf(p);
  const s = root - x;
  const middle = roof + p.pawlThickness / 2;
  const turned = lift * stationValue(bent, bent.angle, s);
  const off = y - middle;
  const inside = Math.max(-1, Math.min(1, (2 * off) / p.pawlThickness));
  return {
    x: x + off * Math.sin(turned),
    y: middle + lift * stationValue(bent, bent.y, s) + off * Math.cos(turned),
    strain: -lift * inside * strainAt(flexible, bent, Math.max(s, p.pawlFillet)),
  };
}

/** The band is laid round the bundle, put through its head and drawn tight click by click. */
export function motion(p: Values, material: Material): Motion {
  const wrap = wrapOn(p, p.smallestBundle);
  const pawl = pawlLifted(p, material.poisson.value);

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    if (t === 0) {
      out.positions.set(rest);
      out.strain.fill(0);
      return;
    }
    const moment = momentAt(p, t);
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const still = { x, y, z, strain: 0 };
      const moved = onBand(x, y)
        ? bandPoint(p, moment, wrap, [x, y], z)
        : isPawl(p, x, y)
          ? { z, ...pawlPoint(p, pawl, moment.lift, x, y) }
          : still;
      out.positions[i] = moved.x;
      out.positions[i + 1] = moved.y;
      out.positions[i + 2] = moved.z;
      out.strain[i / 3] = moved.strain;
    }
  }

  return { label: 'Close', from: 'as printed', to: 'drawn tight', peakStrain: wrap.peak, pose };
}
