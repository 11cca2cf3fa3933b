import type { Kernel, Loop, NamedSolid, Solid, Vec2 } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { revolvedVolume } from '@/lib/geometry/thread-bodies';
import { beadHeight, beadHeights, lidBore, mouthHeight, skirtLength, type Values } from './schema';

/** Half section of the pot, counter-clockwise in (radius, height). */
export function potSection(p: Values): Loop {
  const outside = p.tubeDiameter / 2;
  const inside = outside - p.tubeWall;
  const crest = outside + beadHeight(p);
  const [foot, low, high, head] = beadHeights(p);
  return [
    [0, 0],
    [outside, 0],
    [outside, foot],
    [crest, low],
    [crest, high],
    [outside, head],
    [outside, p.potHeight],
    [inside, p.potHeight],
    [inside, p.floor],
    [0, p.floor],
  ];
}

/** Half section of the lid, home on the rim: the groove is the bead moved out by the clearance and longer by it. */
export function lidSection(p: Values): Loop {
  const bore = lidBore(p);
  const outside = bore + p.lidWall;
  const mouth = mouthHeight(p);
  const [foot, low, high, head] = beadHeights(p);
  const groove: Vec2[] = [
    [bore, head + p.clearance],
    [bore + beadHeight(p), high + p.clearance],
    [bore + beadHeight(p), low - p.clearance],
    [bore, foot - p.clearance],
  ];
  return [
    [bore, mouth],
    [outside, mouth],
    [outside, p.potHeight + p.top],
    [0, p.potHeight + p.top],
    [0, p.potHeight],
    [bore, p.potHeight],
    ...groove,
  ];
}

function slotCutters(p: Values, kernel: Kernel): Solid[] {
  const reach = lidBore(p) + p.lidWall + 1;
  const inner = lidBore(p) - 1;
  const height = skirtLength(p) + 1;
  const slot = kernel.box([reach - inner, p.slotWidth, height]);
  const out = translation([(reach + inner) / 2, 0, mouthHeight(p) - 1 + height / 2]);
  return Array.from({ length: p.slots }, (_, i) =>
    kernel.place(slot, compose(rotation('z', (2 * Math.PI * i) / p.slots), out)),
  );
}

/** "pot" on z = 0 and "lid" home on its rim, both free of strain. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const ring = kernel.revolve({ loops: [lidSection(p)] });
  return [
    { name: 'pot', solid: kernel.revolve({ loops: [potSection(p)] }) },
    { name: 'lid', solid: p.skirt === 'closed' ? ring : kernel.subtract(ring, slotCutters(p, kernel)) },
  ];
}

/** Volumes of the faceted bodies, mm3; slots have no closed form that fits every facet. */
export const volumes = (p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> | null =>
  p.skirt === 'slotted'
    ? null
    : {
        pot: revolvedVolume(potSection(p), segmentsPerTurn),
        lid: revolvedVolume(lidSection(p), segmentsPerTurn),
      };
