import type { Kernel, Loop, NamedSolid, Solid, Vec2 } from '@/lib/geometry/kernel';
import { convexCut, loopArea } from '@/lib/geometry/loops';
import { translation } from '@/lib/geometry/placement';
import {
  aroundCircle,
  capBody,
  capVolume,
  revolvedVolume,
  threadedBody,
  threadedVolume,
} from '@/lib/geometry/thread-bodies';
import { plugChamfers } from '@/lib/mechanics/screw-sizes';
import { capRidge, capShape, neckRidge } from '../screw-shape';
import { discOf, discRadius, hasDisc, layoutOf, ROOMS, screwOf } from './layout';
import type { Values } from './schema';

/** Dividers reach this far into the floor so that they fuse, mm. */
const SUNK = 0.3;

/** Half section of the pot, counter-clockwise in (radius, height), the shoulder at 0. */
export function potSection(p: Values, segments: number): Loop {
  const { body, room, mouth, core, rim, floor, bottom, narrows, foot, rimChamfer } = layoutOf(p);
  const around = (radius: number) => aroundCircle(radius, segments);
  const entry = p.seal === 'plug' ? plugChamfers(screwOf(p)).bore : 0;
  const inside: Vec2[] =
    entry > 0
      ? [
          [around(mouth) + entry, rim],
          [around(mouth), rim - entry],
        ]
      : [[around(mouth), rim]];
  const shoulder: Vec2[] =
    p.body === 'flush'
      ? [
          [body, 0],
          [core, 0],
        ]
      : [];
  const neck: Vec2[] =
    p.body === 'flush'
      ? [
          [around(mouth), -p.wall],
          [around(room), narrows],
        ]
      : [];
  return [
    [0, bottom],
    [body - foot, bottom],
    [body, bottom + foot],
    ...shoulder,
    [core, rim - rimChamfer],
    [core - rimChamfer, rim],
    ...inside,
    ...neck,
    [around(room), floor],
    [0, floor],
  ];
}

/** Outline of the divider from above: arms from the middle to `reach`, counter-clockwise. */
export function dividerOutline(arms: number, thickness: number, reach: number): Loop {
  const half = thickness / 2;
  const turn = (2 * Math.PI) / arms;
  const at = (angle: number, along: number, across: number): Vec2 => [
    along * Math.cos(angle) - across * Math.sin(angle),
    along * Math.sin(angle) + across * Math.cos(angle),
  ];
  return Array.from({ length: arms }, (_, arm): Vec2[] => {
    const angle = arm * turn;
    const corner = half / Math.sin(turn / 2);
    const tip = [at(angle, reach, -half), at(angle, reach, half)];
    // of two arms in one line the corner lies on their side
    return arms === 2 ? tip : [...tip, at(angle + turn / 2, corner, 0)];
  }).flat();
}

function divider(p: Values, kernel: Kernel): Solid[] {
  const arms = ROOMS[p.divider];
  if (arms === 1) return [];
  const { room, floor, dividerTop } = layoutOf(p);
  const outline = dividerOutline(arms, p.dividerThickness, room + p.wall / 2);
  const walls = kernel.extrude({ loops: [outline] }, dividerTop - floor + SUNK);
  return [kernel.place(walls, translation([0, 0, floor - SUNK]))];
}

const discSection = (p: Values): Loop => {
  const { rim } = layoutOf(p);
  return [
    [0, rim],
    [discRadius(p), rim],
    [discRadius(p), rim + discOf(p)],
    [0, rim + discOf(p)],
  ];
};

/** Pot and lid screwed home with the disc between them where there is one. A plug overlaps the mouth by its interference. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const { segmentsPerTurn } = kernel.quality;
  const sizes = screwOf(p);
  const section = potSection(p, segmentsPerTurn);
  const cap = capShape(sizes, p.grip, segmentsPerTurn, discOf(p));
  const disc = hasDisc(p) ? [{ name: 'disc', solid: kernel.revolve({ loops: [discSection(p)] }) }] : [];
  return [
    { name: 'pot', solid: threadedBody(kernel, section, neckRidge(sizes), divider(p, kernel)) },
    { name: 'lid', solid: capBody(kernel, cap, capRidge(sizes)) },
    ...disc,
  ];
}

/** Area in mm2 of the divider inside the faceted wall of the room, which stands half a facet out of step. */
function dividerArea(p: Values, segments: number): number {
  const arms = ROOMS[p.divider];
  if (arms === 1) return 0;
  const { room } = layoutOf(p);
  const wall = Array.from({ length: segments }, (_, at): Vec2 => {
    const angle = (2 * Math.PI * (at + 0.5)) / segments;
    return [aroundCircle(room, segments) * Math.cos(angle), aroundCircle(room, segments) * Math.sin(angle)];
  });
  return loopArea(convexCut(dividerOutline(arms, p.dividerThickness, room + p.wall / 2), wall));
}

/** Volumes in mm3 of the faceted bodies; the ridges within a thousandth. */
export function volumes(p: Values, segments: number): Record<string, number> {
  const sizes = screwOf(p);
  const { floor, dividerTop } = layoutOf(p);
  const pot = threadedVolume(potSection(p, segments), neckRidge(sizes), segments);
  const lid = capVolume(capShape(sizes, p.grip, segments, discOf(p)), capRidge(sizes), segments);
  const bodies = { pot: pot + dividerArea(p, segments) * (dividerTop - floor), lid };
  return hasDisc(p) ? { ...bodies, disc: revolvedVolume(discSection(p), segments) } : bodies;
}
