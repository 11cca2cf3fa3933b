import { parseDecimal, UNIT_SYMBOL, type Unit } from './index';

/** How else a unit may be written behind a figure, with the factor to the unit itself. An inch is 25.4 mm exactly. */
const WRITTEN: Partial<Readonly<Record<Unit, Readonly<Record<string, number>>>>> = {
  mm: { cm: 10, m: 1000, in: 25.4, inch: 25.4, inches: 25.4, '"': 25.4, '″': 25.4 },
  deg: { deg: 1, degree: 1, degrees: 1, º: 1 },
  degC: { c: 1, '°c': 1, degc: 1 },
  turns: { turn: 1 },
};

function factorOf(word: string, unit: Unit): number | null {
  const written = word.toLowerCase();
  if (written === '') return 1;
  // strain is a fraction inside and in percent on screen: a sign would leave open which was meant
  if (unit === 'strain') return null;
  if (written === UNIT_SYMBOL[unit].toLowerCase()) return 1;
  const others = WRITTEN[unit] ?? {};
  return Object.hasOwn(others, written) ? others[written]! : null;
}

/**
 * Reads a decimal with or without its unit ("12,5 mm", "0.1cm", "30°") in the unit asked for; lengths in mm also from
 * cm, m and inches. Null for anything else, another unit included. Rounded to a millionth, as links write numbers.
 */
export function parseQuantity(text: string, unit: Unit): number | null {
  const [, figure = '', word = ''] = /^([^a-z°º"″%]*)(.*)$/is.exec(text.trim()) ?? [];
  const value = parseDecimal(figure);
  const factor = factorOf(word.trim(), unit);
  if (value === null || factor === null) return null;
  return factor === 1 ? value : Number((value * factor).toFixed(6));
}
