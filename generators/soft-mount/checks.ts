import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { ISOLATES_FROM, transmissibility } from '@/lib/mechanics/vibration';
import { formatQuantity } from '@/lib/units';
import { type Curve, type Figure, judge, judgedFigure, plainFigure, type Report, report } from '../report';
import { type Carried, carriedBy, isLinear, LINEAR_SHARE, mountFault } from './mechanics';
import { freeHeight, onColumns, type Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  /** null with the reason where nothing is known */
  readonly carried: Carried | null;
  readonly missing: string;
}

/** Frequencies rise by the root of what shaking stiffens: half at most. */
const DYNAMIC = Math.sqrt(1.5);
/** Damping ratio: little, usual, much. */
const DAMPING = { soft: [0.05, 0.1, 0.15], stiff: [0.02, 0.03, 0.05] } as const;

const from = (p: Values) => (onColumns(p) ? source.COLUMN : source.SPRING);

function knockFigure({ p, allowable, carried, missing }: Context): Figure {
  const common = { id: 'peak-strain', label: 'Strain at the knock', unit: 'strain' } as const;
  if (!carried) return judgedFigure({ ...common, because: missing, source: from(p) });
  const linear = isLinear(p, carried.knock);
  const travel = formatQuantity(carried.knock, 'mm');
  const past = `Not known: it would travel ${travel}, past ${formatQuantity(LINEAR_SHARE * freeHeight(p), 'mm')}, a fifth of its height, where it stiffens, bottoms or gives way.`;
  const { axialStrain, axialStrainHandbook } = carried.stiffness;
  return judgedFigure({
    ...common,
    value: linear ? axialStrain * carried.knock : null,
    handbook: axialStrainHandbook === null || !linear ? null : axialStrainHandbook * carried.knock,
    limit: allowable.value,
    because: linear
      ? `It travels ${travel}, sag included. ${onColumns(p) ? 'Mean over the column: its edges strain more, keep the fillets.' : 'On the inside of the bends.'}`
      : past,
    source: source.KNOCK,
  });
}

function strainFigures({ p, allowable, carried, missing }: Context): Figure[] {
  const linear = carried !== null && isLinear(p, carried.sag);
  return [
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    plainFigure({
      id: 'static-strain',
      label: 'Strain at rest',
      unit: 'strain',
      value: linear ? carried.stiffness.axialStrain * carried.sag : null,
      because: !carried
        ? missing
        : linear
          ? 'Held for weeks it grows: plastics creep, by how much is not known here. Look at the sag again after a month.'
          : 'Not known: the sag is past a fifth of the free height.',
      source: from(p),
    }),
  ];
}

function stiffnessFigures({ p, carried, missing }: Context): Figure[] {
  const doubt = carried && !carried.inRange ? ' Past the range of the secant modulus; taken at its end.' : '';
  const modulus = carried
    ? `With ${formatQuantity(carried.modulus, 'MPa')} at the strain at rest.${doubt}`
    : missing;
  return [
    plainFigure({
      id: 'axial-stiffness',
      label: 'Stiffness upright',
      unit: 'N/mm',
      value: carried?.stiffness.axial ?? null,
      handbook: carried && onColumns(p) ? carried.stiffness.handbook : null,
      because: modulus,
      source: from(p),
    }),
    plainFigure({
      id: 'sway-stiffness',
      label: 'Stiffness sideways',
      unit: 'N/mm',
      value: carried?.stiffness.sway ?? null,
      handbook: carried?.stiffness.swayHandbook ?? null,
      because: carried
        ? onColumns(p)
          ? 'Along either side; the upper plate kept from turning.'
          : 'Along the length, the upper plate kept from turning. Across, the strips bend flatwise: far stiffer, not known here.'
        : missing,
      source: onColumns(p) ? source.SWAY : source.SPRING,
    }),
    plainFigure({
      id: 'static-sag',
      label: 'Sag under the mass',
      unit: 'mm',
      value: carried?.sag ?? null,
      because: carried ? `${p.mass} g at rest.` : missing,
      source: from(p),
    }),
  ];
}

function frequencyFigures({ p, material, carried, missing }: Context): Figure[] {
  const dampings = material.poisson.value >= 0.44 ? DAMPING.soft : DAMPING.stiff;
  const frequency = carried?.frequency ?? null;
  const shares = frequency === null ? null : dampings.map((z) => transmissibility(p.shaking / frequency, z));
  const stiffer =
    frequency === null ? null : transmissibility(p.shaking / (frequency * DYNAMIC), dampings[2]);
  const starts = frequency === null ? null : ISOLATES_FROM * frequency;
  const frequencyOf = (id: string, label: string, value: number | undefined): Figure =>
    plainFigure({
      id,
      label,
      unit: 'Hz',
      value: value ?? null,
      low: value ?? null,
      high: value === undefined ? null : value * DYNAMIC,
      because: carried
        ? 'From the static stiffness; shaken, plastics are stiffer by up to half (common practice, no source).'
        : missing,
      source: source.VIBRATION,
    });
  return [
    frequencyOf('natural-frequency', 'Natural frequency upright', carried?.frequency),
    frequencyOf('sway-frequency', 'Natural frequency sideways', carried?.swayFrequency),
    judgedFigure({
      id: 'isolates-from',
      label: 'Isolates from',
      unit: 'Hz',
      value: starts === null ? null : starts * DYNAMIC,
      handbook: starts,
      limit: p.shaking,
      because: carried
        ? 'Root two times the natural frequency, taken on its stiffer side; below it the mount makes shaking worse.'
        : missing,
      source: source.VIBRATION,
    }),
    plainFigure({
      id: 'transmitted',
      label: 'Share of the shaking that arrives',
      unit: 'ratio',
      value: shares?.[1] ?? null,
      low: shares ? Math.min(...shares) : null,
      high: shares && stiffer !== null ? Math.max(...shares, stiffer) : null,
      because: carried
        ? `At ${p.shaking} Hz; damping and stiffness when shaken are guesses of practice.`
        : missing,
      source: source.DAMPING,
    }),
  ];
}

function knockFigures({ p, carried, missing }: Context): Figure[] {
  const buckling = carried?.stiffness.buckling ?? null;
  const force = carried && carried.stiffness.axial * carried.knock;
  return [
    judgedFigure({
      id: 'knock-travel',
      label: 'Travel at the knock',
      unit: 'mm',
      value: carried?.knock ?? null,
      limit: LINEAR_SHARE * freeHeight(p),
      because: carried
        ? `Falling ${p.dropHeight} mm. Past a fifth of the free height the formulas end.`
        : missing,
      source: source.KNOCK,
    }),
    ...(onColumns(p)
      ? [
          judgedFigure({
            id: 'buckling-load',
            label: 'Columns give way sideways at',
            unit: 'N',
            value: buckling,
            limit: force,
            limitKind: 'min',
            because: carried ? `The knock presses with ${formatQuantity(force, 'N')}.` : missing,
            source: source.BUCKLING,
          }),
        ]
      : []),
  ];
}

function printFigure({ p }: Context): Figure[] {
  if (!onColumns(p)) return [];
  const verdict = p.columnHeight <= 5 ? 'within-limit' : judge(p.columnHeight, 10);
  return [
    judgedFigure({
      id: 'bridge-span',
      label: 'Columns printed as bridges',
      unit: 'mm',
      value: p.columnHeight,
      limit: 10,
      verdict: verdict === 'over-limit' ? 'close-to-limit' : verdict,
      because:
        p.columnHeight <= 10
          ? 'On its side each column begins as a bridge from plate to plate.'
          : 'Over 10 mm the first strands of a column sag: slow, cool, or use S-springs, which need no bridge.',
      source: source.BRIDGE,
    }),
  ];
}

const STEPS = 24;

/** What any mount sends on, by how much faster than itself it is shaken: for plastics without figures of their own. */
function anyMount(): Curve {
  return {
    id: 'transmitted-over-ratio',
    label: 'Share of the shaking that arrives, any mount',
    x: { label: 'Shaking over natural frequency', unit: 'ratio' },
    y: { label: 'Share', unit: 'ratio' },
    points: Array.from({ length: 3 * STEPS + 1 }, (_, i) => {
      const ratio = (3 * i) / (3 * STEPS);
      return [ratio, transmissibility(ratio, DAMPING.soft[1])] as const;
    }),
  };
}

function curves({ p, carried }: Context): Curve[] {
  if (!carried) return [anyMount()];
  const most = Math.max(2 * p.shaking, 3 * carried.frequency);
  const sent: Curve = {
    id: 'transmitted-over-frequency',
    label: 'Share of the shaking that arrives',
    x: { label: 'Shaking', unit: 'Hz' },
    y: { label: 'Share', unit: 'ratio' },
    points: Array.from({ length: 3 * STEPS + 1 }, (_, i) => {
      const hertz = (most * i) / (3 * STEPS);
      return [hertz, transmissibility(hertz / carried.frequency, DAMPING.soft[1])] as const;
    }),
  };
  const furthest = LINEAR_SHARE * freeHeight(p);
  const pressed: Curve = {
    id: 'force-over-travel',
    label: 'Force over travel',
    x: { label: 'Travel', unit: 'mm' },
    y: { label: 'Force', unit: 'N' },
    points: Array.from({ length: STEPS + 1 }, (_, i) => {
      const travel = (furthest * i) / STEPS;
      return [travel, carried.stiffness.axial * travel] as const;
    }),
  };
  return [sent, pressed];
}

/** Report of a mount under its mass, shaken and knocked. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const fault = mountFault(p, material);
  const carried = fault ? null : carriedBy(p, material);
  const missing = fault ? `Not known: ${fault}.` : 'Not known: the modulus is not known.';
  const context: Context = { p, material, allowable, carried, missing };
  return report({
    governing: 'peak-strain',
    headline: ['natural-frequency', 'static-sag', 'transmitted'],
    figures: [
      knockFigure(context),
      ...strainFigures(context),
      ...frequencyFigures(context),
      ...stiffnessFigures(context),
      ...knockFigures(context),
      ...printFigure(context),
    ],
    curves: curves(context),
    allowable,
  });
}
