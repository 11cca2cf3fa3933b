import type { Loop, Vec2 } from '@/lib/geometry/kernel';
import { withoutRepeats } from '@/lib/geometry/outline';
import { radians } from '@/lib/units';
import { bodyRadius, cavityRadius, ribRadius, ribStarts, type Values } from './schema';

/** Outline of one rib from foot to foot, (radius, height above the flange): 45 degrees behind, lead-in in front. */
function rib(p: Values, start: number): Vec2[] {
  const crest = ribRadius(p);
  const body = bodyRadius(p, 0);
  const taper = Math.tan(radians(p.taperAngle));
  const lead = Math.tan(radians(p.leadAngle));
  const end = start + p.ribWidth;
  const behind = (body - crest + start) / (1 + taper);
  const front = (crest + end * lead - body) / (lead - taper);
  return [
    [bodyRadius(p, behind), behind],
    [crest, start],
    [crest, end],
    [bodyRadius(p, front), front],
  ];
}

/** Half section, counter-clockwise in (radius, height): flange on the bed, narrow end up. */
export function section(p: Values): Loop {
  const floor = p.flangeThickness;
  const flange = p.boreDiameter / 2 + p.flangeOverhang;
  const end = p.plugLength;
  const outside: Vec2[] = [
    [bodyRadius(p, 0), 0],
    ...ribStarts(p).flatMap((start) => rib(p, start)),
    [bodyRadius(p, end), end],
  ];
  const inside: Vec2[] =
    p.kind === 'solid'
      ? [[0, end]]
      : [
          [cavityRadius(p, end), end],
          [cavityRadius(p, 0), 0],
          [0, 0],
        ];
  const raised = [...outside, ...inside].map(([r, h]): Vec2 => [r, h + floor]);
  return withoutRepeats([[0, 0], [flange, 0], [flange, floor], ...raised]);
}
