import type { Source } from '@/lib/materials/types';
import { guideStrain, guideUndercut } from '@/lib/mechanics/beam';
import { shoulderConcentration } from '@/lib/mechanics/fillet';
import { MOST_DEFLECTION } from '@/lib/mechanics/standing-arm';
import { formatQuantity } from '@/lib/units';
import { type Figure, judgedFigure, plainFigure } from '../report';
import { inPanel } from './dimensions';
import {
  armOf,
  deflectionRatio,
  GUIDE_MOST_DEFLECTION,
  peakOf,
  permissibleDeflection,
  rootShare,
  slenderness,
} from './mechanics';
import { CORRECTED, GUIDE, PRACTICE } from './sources';
import { inGuideRange, type Subject } from './subject';

/** Where the arm is strained most, in words. */
function placeOf({ values, strain }: Subject): string {
  if (strain.arm > strain.fillet) return 'On the thin part of the arm, away from its root.';
  const ratio = (size: number) => Number((values.rootFillet / size).toFixed(2));
  return inPanel(values)
    ? `At the corners where the arm runs into the panel (radius ${ratio(values.rootWidth)} of the width), the panel giving way.`
    : `At the end of the root fillet (radius ${ratio(values.rootThickness)} of the thickness), the root turning with the arm.`;
}

function peakReason(subject: Subject): string {
  const { values, strain, allowable, strainTrouble } = subject;
  if (strainTrouble) return `Not known: ${strainTrouble}.`;
  const limit = allowable.value === null ? allowable.because : '';
  if (strain.wall !== null && strain.wall > strain.arm) {
    return `The wall of ${values.wallThickness} mm bends harder than the arm: a thicker wall or a shorter span helps. ${limit}`.trim();
  }
  return `${placeOf(subject)} ${limit}`.trim();
}

function peakFigure(subject: Subject): Figure {
  const { values, strain, allowable, strainTrouble } = subject;
  return judgedFigure({
    id: 'peak-strain',
    label: 'Peak strain',
    unit: 'strain',
    value: strainTrouble ? null : peakOf(strain),
    handbook: inGuideRange(values) ? guideStrain(armOf(values), values.undercut) : null,
    limit: allowable.value,
    because: peakReason(subject),
    source: CORRECTED,
  });
}

function permissibleFigure({ values, flexible, allowable, strainTrouble }: Subject): Figure {
  const limit = allowable.value;
  const value = limit === null || strainTrouble ? null : permissibleDeflection(values, flexible, limit);
  return plainFigure({
    id: 'permissible-undercut',
    label: 'Undercut the arm can pass',
    unit: 'mm',
    value,
    handbook: limit === null ? null : guideUndercut(armOf(values), limit),
    because:
      limit === null
        ? allowable.because
        : value === null
          ? 'Not known: more than half the arm length, past what the formulas cover.'
          : 'Tip deflection at which the peak strain just meets the allowable strain.',
    source: CORRECTED,
  });
}

function wallFigure({ strain, strainTrouble }: Subject): Figure[] {
  if (strain.wall === null) return [];
  return [
    plainFigure({
      id: 'wall-strain',
      label: 'Strain in the wall',
      unit: 'strain',
      value: strainTrouble ? null : strain.wall,
      because: 'At the end of the fillet in the wall plate; counts where it is higher than the arm.',
      source: CORRECTED,
    }),
  ];
}

const ROARK: Source = { text: "Roark's Formulas for Stress and Strain, Table 17.1", mark: 'computed' };

/** Our concentration beside the published one of a bar with shoulders as high as it is thick on both sides. */
function concentrationFigure({ values, strain, strainTrouble }: Subject): Figure[] {
  if (inPanel(values)) return [];
  const ratio = values.rootFillet / values.rootThickness;
  const published = ratio >= 0.05 && ratio <= 1;
  return [
    plainFigure({
      id: 'fillet-concentration',
      label: 'Concentration at the fillet',
      unit: 'ratio',
      value: strainTrouble ? null : strain.fillet / strain.nominal,
      handbook: published ? shoulderConcentration(1, 1, ratio) : null,
      because: strainTrouble
        ? `Not known: ${strainTrouble}.`
        : 'Peak over nominal strain where the root fillet ends; the published figure is for a shoulder, ours for an arm on its base.',
      source: ROARK,
    }),
  ];
}

export function strainFigures(subject: Subject): Figure[] {
  const { values, allowable, flexible } = subject;
  return [
    peakFigure(subject),
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]?.source ?? PRACTICE,
    }),
    plainFigure({
      id: 'tip-deflection',
      label: 'Tip deflection',
      unit: 'mm',
      value: values.undercut,
      handbook: values.undercut,
      because:
        'The catch has to pass the window edge: the tip moves by the whole undercut, the clearance not counted.',
      source: GUIDE,
    }),
    permissibleFigure(subject),
    ...wallFigure(subject),
    ...concentrationFigure(subject),
    plainFigure({
      id: 'root-share',
      label: 'Give of the root',
      unit: 'ratio',
      value: rootShare(flexible),
      because: 'Share of the tip deflection that comes from the root turning and not from the arm bending.',
      source: CORRECTED,
    }),
    plainFigure({
      id: 'slenderness',
      label: 'Length over thickness',
      unit: 'ratio',
      value: slenderness(values),
      because: 'At least 5, better 8 to 10 in print; below 5 shear and the root take over.',
      source: PRACTICE,
    }),
    plainFigure({
      id: 'deflection-ratio',
      label: 'Deflection over length',
      unit: 'ratio',
      value: deflectionRatio(values),
      because: `The plain formula holds to about ${formatQuantity(1 / 8, 'ratio')} and is not shown past ${GUIDE_MOST_DEFLECTION}; the corrected one holds to ${MOST_DEFLECTION}.`,
      source: PRACTICE,
    }),
    plainFigure({
      id: 'strain-at-rest',
      label: 'Strain when closed',
      unit: 'strain',
      value: 0,
      because:
        'The closed hook is not bent, so it does not creep. Keep it so: a clip held bent loses much of its force in weeks.',
      source: GUIDE,
    }),
  ];
}
