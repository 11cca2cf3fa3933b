import type { Material } from '@/lib/materials/types';
import { type Plug, plugOf } from '@/lib/mechanics/screw-closure';
import { jointOf, plugInner, type ScrewSizes } from '@/lib/mechanics/screw-sizes';
import { ringHoopStrain } from '@/lib/mechanics/seal';
import { type ThreadJoint, turnsToFree } from '@/lib/mechanics/thread-joint';
import type { Motion, Posed } from './contract';

/** Share of the slider on which the cap comes down to the thread before it turns. */
const APPROACH = 0.3;
const AIR = 6;

interface Place {
  /** height over home, mm, and angle turned back from home, rad */
  readonly lift: number;
  readonly turned: number;
}

/** Straight down to the first turn, then along the helix: right-handed, so clockwise as it goes down. */
function placeAt(p: ScrewSizes, joint: ThreadJoint, t: number): Place {
  const turns = turnsToFree(joint);
  const along = joint.thread.lead * turns;
  const apart = Math.max(0, p.neckHeight - joint.capMouth + AIR - along);
  const left = t < APPROACH ? 1 : (1 - t) / (1 - APPROACH);
  const above = t < APPROACH ? apart * (1 - t / APPROACH) : 0;
  return { lift: above + along * left, turned: 2 * Math.PI * turns * left };
}

type HoopStrain = (radius: number, height: number) => number;

/** Strain dies out over about this length past the end of the contact, mm. */
const dieAway = (radius: number, wall: number): number => Math.sqrt(radius * wall);

/** Hoop strain in the neck when the plug has entered by `entered` mm. */
function neckStrain(
  p: ScrewSizes,
  joint: ThreadJoint,
  plug: Plug,
  material: Material,
  entered: number,
): HoopStrain {
  const reach = dieAway(p.bore / 2, joint.neckWall);
  return (radius, height) => {
    const below = p.neckHeight - entered - height;
    const share = Math.max(0, 1 - Math.max(0, below) / reach);
    const rings = { contactRadius: p.bore / 2, freeRadius: joint.thread.rootDiameter / 2 };
    const poisson = material.poisson.value;
    return share * ringHoopStrain({ ...rings, atContact: plug.rings.neck, poisson, radius });
  };
}

/** Hoop strain in the plug, in the cap's own coordinates; the cap outside the plug has none. */
function plugRingStrain(p: ScrewSizes, plug: Plug, material: Material, entered: number): HoopStrain {
  const contactRadius = p.bore / 2;
  const outside = (p.bore + p.plugInterference) / 2;
  const freeRadius = plugInner(p) / 2;
  const reach = dieAway(contactRadius, p.plugWall);
  const tip = p.neckHeight - p.plugLength;
  return (radius, height) => {
    const isPlug = radius <= outside + 1e-3 && height < p.neckHeight - 1e-3;
    if (!isPlug) return 0;
    const share = Math.max(0, 1 - Math.max(0, height - tip - entered) / reach);
    const poisson = material.poisson.value;
    return (
      share *
      ringHoopStrain({
        contactRadius,
        freeRadius,
        atContact: plug.rings.plug,
        poisson,
        radius: Math.min(contactRadius, Math.max(radius, freeRadius, contactRadius / 20)),
      })
    );
  };
}

function move(rest: Float32Array, place: Place, strain: HoopStrain | null, out: Posed): void {
  const [cos, sin] = [Math.cos(place.turned), Math.sin(place.turned)];
  for (let at = 0; at < rest.length; at += 3) {
    const [x, y, z] = [rest[at]!, rest[at + 1]!, rest[at + 2]!];
    const hoop = strain ? strain(Math.hypot(x, y), z) : 0;
    const grown = 1 + hoop;
    out.positions[at] = grown * (x * cos - y * sin);
    out.positions[at + 1] = grown * (x * sin + y * cos);
    out.positions[at + 2] = z + place.lift;
    out.strain[at / 3] = hoop;
  }
}

/** Names of the bodies: the neck stands still, the cap turns, and what is laid in the cap turns with it. */
export interface ScrewBodies {
  readonly neck: string;
  readonly cap: string;
}

/** Screws the cap on, rigidly; only a plug and the neck round it strain, as the plug enters. */
export function screwMotion(p: ScrewSizes, material: Material, bodies: ScrewBodies): Motion {
  const joint = jointOf(p);
  const plug = plugOf(p, joint, material);

  function strainOf(body: string, lift: number): HoopStrain | null {
    const entered = plug ? p.plugLength - lift : 0;
    if (!plug || entered <= 0) return null;
    if (body !== bodies.neck && body !== bodies.cap) return null;
    return body === bodies.neck
      ? neckStrain(p, joint, plug, material, entered)
      : plugRingStrain(p, plug, material, entered);
  }

  function pose(body: string, rest: Float32Array, t: number, out: Posed): void {
    const place = placeAt(p, joint, t);
    const still: Place = { lift: 0, turned: 0 };
    move(rest, body === bodies.neck ? still : place, strainOf(body, place.lift), out);
  }

  return { label: 'Screw on', from: 'apart', to: 'screwed home', peakStrain: plug?.hoop ?? 0, pose };
}
