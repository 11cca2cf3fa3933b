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

function elsewhere(effect: Effect, report: Report): string {
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
  if (effect === null) return <span className="text-right text-muted text-xs">not alone</span>;
  if (!effect) return <span />;
  if (effect.change === null || effect.change === 0) {
    const text = effect.change === null ? 'not known' : elsewhere(effect, report);
    return <span className="text-right text-muted text-xs">{text}</span>;
  }
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
