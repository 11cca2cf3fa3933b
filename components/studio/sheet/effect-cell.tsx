import type { Figure, Report } from '@/generators/report';
import { type Effect, figureOf } from '@/generators/sensitivity';
import { UNIT_SYMBOL, type Unit } from '@/lib/units';
import { shown } from '../scale';

const signed = (text: string, negative: boolean): string => `${negative ? '−' : '+'}${text}`;

/** A change in shown units, to the third digit of the figure it changes, never "0" for something that moves. */
export function changeText(change: number, value: number | null, unit: Unit): string {
  const size = Math.abs(shown(change, unit));
  const figure = Math.max(Math.abs(shown(value ?? change, unit)), 1e-3);
  const decimals = Math.min(4, Math.max(0, 2 - Math.floor(Math.log10(figure))));
  const least = 10 ** -decimals;
  return size < least / 2 ? `<${least.toFixed(decimals)}` : signed(size.toFixed(decimals), change < 0);
}

const FORCES: readonly Unit[] = ['N', 'N/mm'];
const TORQUES: readonly Unit[] = ['Nmm', 'Nm'];

/** What the words in the column mean, each told under the sheet where it stands in it. */
const MEANING = {
  'not alone':
    'no step of this dimension by itself gives a part that can be made; another has to move with it',
  'force only': 'leaves this figure as it is and moves a force',
  'torque only': 'leaves this figure as it is and moves a torque',
  'other figures': 'leaves this figure as it is and moves others at the head of the page',
  none: 'moves none of the figures at the head of the page',
  'not known': 'the figure after the step is not known',
} as const;

export type EffectWord = keyof typeof MEANING;

/** The word that stands for an effect without a size; null where there is a size, or no answer yet. */
export function effectWord(effect: Effect | null | undefined, report: Report): EffectWord | null {
  if (effect === null) return 'not alone';
  if (!effect) return null;
  if (effect.change === null) return 'not known';
  return effect.change === 0 ? elsewhere(effect, report) : null;
}

/** The meaning of the words that stand in the column. */
export function EffectWords({ words }: { words: ReadonlySet<EffectWord> }) {
  const used = (Object.keys(MEANING) as EffectWord[]).filter((word) => words.has(word));
  if (used.length === 0) return null;
  return (
    <dl aria-label="Words in the effect column" className="border-hair border-t px-4 py-3 text-xs sm:px-5">
      {used.map((word) => (
        <div key={word} className="flex gap-x-2 py-0.5">
          <dt className="w-20 shrink-0 font-semibold">{word}</dt>
          <dd className="text-muted">{MEANING[word]}</dd>
        </div>
      ))}
    </dl>
  );
}

function elsewhere(effect: Effect, report: Report): EffectWord {
  const units = effect.moves.flatMap((id) => figureOf(report, id)?.unit ?? []);
  if (units.length === 0) return 'none';
  if (units.every((unit) => FORCES.includes(unit))) return 'force only';
  return units.every((unit) => TORQUES.includes(unit)) ? 'torque only' : 'other figures';
}

/** What one step of a dimension does to the governing figure. */
export function EffectCell({
  effect,
  report,
  governing,
  unit,
}: {
  effect: Effect | null | undefined;
  report: Report;
  governing: Figure;
  unit: Unit;
}) {
  const word = effectWord(effect, report);
  if (word) return <span className="text-right text-muted text-xs">{word}</span>;
  if (!effect?.change) return <span />;
  const size = String(Math.abs(effect.step));
  const step = signed(unit === 'deg' ? `${size}°` : `${size} ${UNIT_SYMBOL[unit]}`, effect.step < 0);
  return (
    <span className="text-right text-xs leading-tight sm:whitespace-nowrap">
      <span className="block text-muted sm:inline">{step} </span>
      <span className="sr-only">changes {governing.label} by </span>
      <b className={effect.change > 0 ? 'font-mono text-clay' : 'font-mono text-petrol'}>
        {changeText(effect.change, governing.value, governing.unit)}
      </b>
    </span>
  );
}
