import type { Ridge } from '@/lib/geometry/thread';
import { type CapSeal, type CapShape, type Grip, gripOutline } from '@/lib/geometry/thread-bodies';
import { jointOf, plugChamfers, plugInner, type ScrewSizes } from '@/lib/mechanics/screw-sizes';
import { LAND_HEIGHT } from '@/lib/mechanics/thread-joint';

/** Ridge of the neck, shoulder at z = 0. */
export function neckRidge(p: ScrewSizes): Ridge {
  const { neckForm, neckBase, thread } = jointOf(p);
  return {
    outline: neckForm,
    facing: 'outward',
    lead: thread.lead,
    starts: p.starts,
    turns: p.turns,
    base: neckBase,
    phase: 0,
  };
}

/** The cap's ridge begins `capFrom` turns up the neck's, half a pitch under it. */
export function capRidge(p: ScrewSizes): Ridge {
  const { capForm, capBase, capFrom, engagedTurns, thread } = jointOf(p);
  return {
    outline: capForm,
    facing: 'inward',
    lead: thread.lead,
    starts: p.starts,
    turns: engagedTurns,
    base: capBase + thread.lead * capFrom,
    phase: capFrom,
  };
}

function sealOf(p: ScrewSizes): CapSeal {
  if (p.seal === 'land') return { kind: 'land', ...jointOf(p).land, height: LAND_HEIGHT };
  if (p.seal === 'none') return { kind: 'none' };
  const outer = (p.bore + p.plugInterference) / 2;
  return {
    kind: 'plug',
    inner: plugInner(p) / 2,
    outer,
    length: p.plugLength,
    tipChamfer: plugChamfers(p).tip,
  };
}

/** A cap whose roof lies `lift` mm over the rim, for a seal laid in. */
export function capShape(p: ScrewSizes, grip: Grip, segments: number, lift = 0): CapShape {
  const { capForm, capMouth, capTop, mouthChamfer } = jointOf(p);
  const bore = capForm[0]![0];
  return {
    outline: gripOutline(grip, bore + p.wall, segments),
    mouth: capMouth,
    rim: p.neckHeight + lift,
    top: capTop,
    bore,
    mouthChamfer,
    seal: sealOf(p),
  };
}
