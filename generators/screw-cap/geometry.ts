import type { Kernel, NamedSolid } from '@/lib/geometry/kernel';
import type { Ridge } from '@/lib/geometry/thread';
import {
  type CapSeal,
  type CapShape,
  capBody,
  capVolume,
  gripOutline,
  type NeckShape,
  neckSection,
  threadedBody,
  threadedVolume,
} from '@/lib/geometry/thread-bodies';
import { LAND_HEIGHT, type ThreadJoint } from '@/lib/mechanics/thread-joint';
import { jointOf, plugChamfers, plugInner, type Values } from './schema';

export function neckRidge(p: Values, { neckForm, neckBase, thread }: ThreadJoint): Ridge {
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
export function capRidge(p: Values, { capForm, capBase, capFrom, engagedTurns, thread }: ThreadJoint): Ridge {
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

function neckShape(p: Values, { neckForm, rimChamfer }: ThreadJoint): NeckShape {
  const core = neckForm[0]![0];
  return {
    core,
    bore: p.bore / 2,
    flange: core + p.flangeWidth,
    height: p.neckHeight,
    flangeThickness: p.flangeThickness,
    rimChamfer,
    boreChamfer: p.seal === 'plug' ? plugChamfers(p).bore : 0,
  };
}

function sealOf(p: Values, { land }: ThreadJoint): CapSeal {
  if (p.seal === 'land') return { kind: 'land', ...land, height: LAND_HEIGHT };
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

function capShape(p: Values, joint: ThreadJoint, segments: number): CapShape {
  const bore = joint.capForm[0]![0];
  return {
    outline: gripOutline(p.grip, bore + p.wall, segments),
    mouth: joint.capMouth,
    rim: p.neckHeight,
    top: joint.capTop,
    bore,
    mouthChamfer: joint.mouthChamfer,
    seal: sealOf(p, joint),
  };
}

/** Neck and cap screwed home, shoulder of the neck at z = 0. A plug overlaps the bore by its interference. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const joint = jointOf(p);
  const { segmentsPerTurn } = kernel.quality;
  const section = neckSection(neckShape(p, joint), segmentsPerTurn);
  return [
    { name: 'neck', solid: threadedBody(kernel, section, neckRidge(p, joint)) },
    { name: 'cap', solid: capBody(kernel, capShape(p, joint, segmentsPerTurn), capRidge(p, joint)) },
  ];
}

/** Volumes in mm3 of the faceted bodies; the ridges within a thousandth. */
export function volumes(p: Values, segments: number): Record<string, number> {
  const joint = jointOf(p);
  const section = neckSection(neckShape(p, joint), segments);
  return {
    neck: threadedVolume(section, neckRidge(p, joint), segments),
    cap: capVolume(capShape(p, joint, segments), capRidge(p, joint), segments),
  };
}
