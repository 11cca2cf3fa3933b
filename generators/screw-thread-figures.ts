import {
  capHangingSide,
  type FormPoint,
  neckHangingSide,
  sidewaysStep,
} from '@/lib/mechanics/thread-outline';
import { type Figure, judgedFigure, plainFigure } from './report';
import type { ScrewContext } from './screw-context';
import * as source from './screw-sources';

/** Width of an extrusion line of a 0.4 mm nozzle, mm. */
const LINE_WIDTH = 0.45;

const mm = (value: number): string => `${value.toFixed(2)} mm`;

function sizeFigures({ p, mechanics, words }: ScrewContext): Figure[] {
  const { thread, cap } = mechanics.joint;
  const common = { unit: 'mm', source: source.PROFILE[p.profile] } as const;
  return [
    plainFigure({
      ...common,
      id: 'pitch-diameter',
      label: 'Pitch diameter',
      value: thread.pitchDiameter,
      handbook: thread.pitchDiameter,
      because: `Basic size d2, kept by the ${words.neck}; the ${words.cap}'s gap makes it ${mm(cap.pitchDiameter)} there.`,
    }),
    plainFigure({
      ...common,
      id: 'minor-diameter',
      label: 'Minor diameter',
      value: thread.minorDiameter,
      handbook: thread.minorDiameter,
      because: `Basic size D1; the ${words.cap}'s ridges are opened to ${mm(cap.minorDiameter)}.`,
    }),
    plainFigure({
      ...common,
      id: 'root-diameter',
      label: `Root diameter of the ${words.neck}`,
      value: thread.rootDiameter,
      handbook: thread.rootDiameter,
      because: `Basic size d3: what is left of the ${words.neck} under the thread, ${mm(mechanics.joint.neckWall)} of wall.`,
    }),
    plainFigure({
      id: 'lead',
      label: 'Lead',
      unit: 'mm',
      value: thread.lead,
      handbook: thread.lead,
      because: `Travel in one turn: pitch times ${p.starts === 1 ? 'one start' : `${p.starts} starts`}.`,
      source: source.GEOMETRY,
    }),
  ];
}

function engagementFigures({ p, mechanics, words }: ScrewContext): Figure[] {
  const { thread, engagedTurns } = mechanics.joint;
  const turns = engagedTurns * p.starts;
  return [
    judgedFigure({
      id: 'engagement-depth',
      label: 'Radial overlap of the threads',
      unit: 'mm',
      value: thread.engagement - p.clearance,
      handbook: thread.engagement,
      limit: LINE_WIDTH,
      limitKind: 'min',
      because: 'Basic engaged depth less the clearance; it should be no less than one extrusion line.',
      source: source.OVERLAP,
    }),
    judgedFigure({
      id: 'engaged-turns',
      label: 'Turns of thread that bear',
      unit: 'turns',
      value: turns,
      handbook: p.turns * p.starts,
      limit: 1,
      limitKind: 'min',
      verdict: turns >= 1 - 1e-9 ? 'within-limit' : turns > 0.5 ? 'close-to-limit' : 'over-limit',
      because:
        turns < p.turns * p.starts - 1e-9
          ? `The skirt is too short for all the turns of the ${words.neck}. Bottle finishes have one turn, all starts counted; under half a turn the ${words.cap} tips.`
          : `Bottle finishes have one turn, all starts counted; under half a turn the ${words.cap} tips, and a screw that carries a load wants three.`,
      source: source.FINISH,
    }),
  ];
}

function overhangFigures({ p, layerHeight, mechanics, words }: ScrewContext): Figure[] {
  const { thread } = mechanics.joint;
  const angle = (thread.loadFlank * 180) / Math.PI;
  const step = (side: FormPoint[]) => sidewaysStep(side, layerHeight);
  const neck = step(neckHangingSide(thread));
  const cap = step(capHangingSide(thread, p.clearance));
  const straight = layerHeight / Math.tan(thread.loadFlank);
  const worst = Math.max(neck, cap);
  const part = (id: string, label: string, value: number, because: string) =>
    plainFigure({ id, label, unit: 'mm', value, handbook: straight, because, source: source.LINE });
  return [
    judgedFigure({
      id: 'flank-overhang',
      label: 'Sideways step a layer',
      unit: 'mm',
      value: worst,
      handbook: straight,
      limit: LINE_WIDTH,
      because: `The flank of ${angle.toFixed(0)}° that hangs when ${words.neck} and ${words.cap} are printed standing steps out this far from layer to layer; past one line width the next line lies in the air. Thinner layers help.`,
      source: source.LINE,
    }),
    part(
      'flank-overhang-neck',
      `Step on the ${words.neck}`,
      neck,
      `Lower flank of the ridge, ${words.neck} standing; the upper flank faces up and rests on what is below.`,
    ),
    part(
      'flank-overhang-cap',
      `Step on the ${words.cap}`,
      cap,
      `Upper flank of the ridge, which hangs when the ${words.cap} lies on its top; the other flank faces up.`,
    ),
  ];
}

export const screwThreadFigures = (context: ScrewContext): Figure[] => [
  ...sizeFigures(context),
  ...engagementFigures(context),
  ...overhangFigures(context),
];
