import type { Kernel, NamedSolid } from '@/lib/geometry/kernel';
import {
  capBody,
  capVolume,
  type NeckShape,
  neckSection,
  threadedBody,
  threadedVolume,
} from '@/lib/geometry/thread-bodies';
import { jointOf, plugChamfers } from '@/lib/mechanics/screw-sizes';
import { capRidge, capShape, neckRidge } from '../screw-shape';
import type { Values } from './schema';

function neckShape(p: Values): NeckShape {
  const { neckForm, rimChamfer } = jointOf(p);
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

/** Neck and cap screwed home, shoulder of the neck at z = 0. A plug overlaps the bore by its interference. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const { segmentsPerTurn } = kernel.quality;
  const section = neckSection(neckShape(p), segmentsPerTurn);
  return [
    { name: 'neck', solid: threadedBody(kernel, section, neckRidge(p)) },
    { name: 'cap', solid: capBody(kernel, capShape(p, p.grip, segmentsPerTurn), capRidge(p)) },
  ];
}

/** Volumes in mm3 of the faceted bodies; the ridges within a thousandth. */
export function volumes(p: Values, segments: number): Record<string, number> {
  const section = neckSection(neckShape(p), segments);
  return {
    neck: threadedVolume(section, neckRidge(p), segments),
    cap: capVolume(capShape(p, p.grip, segments), capRidge(p), segments),
  };
}
