/**
 * Units inside the program: mm, N, N mm, MPa, radians inside formulas, strain as a fraction, °C, g.
 * Degrees and percent appear only at the edge (parameters, API, screens).
 */
export type Unit =
  | 'mm'
  | 'mm2'
  | 'mm3'
  | 'ml'
  | 'deg'
  | 'strain'
  | 'ratio'
  | 'count'
  | 'N'
  | 'N/mm'
  | 'Nmm'
  | 'Nm'
  | 'MPa'
  | 'g'
  | 'g/cm3'
  | 'degC'
  | '1/K'
  | 'Hz'
  | 'turns'
  | 'cycles'
  | 'h'
  | 'per-kg'
  | 'text';

export const DEGREE = Math.PI / 180;

export const radians = (degrees: number): number => degrees * DEGREE;
export const degrees = (radian: number): number => radian / DEGREE;

/** Written form of a unit, as it stands behind a figure. Strain is written in percent. */
export const UNIT_SYMBOL: Readonly<Record<Unit, string>> = {
  mm: 'mm',
  mm2: 'mm²',
  mm3: 'mm³',
  ml: 'ml',
  deg: '°',
  strain: '%',
  ratio: '',
  count: '',
  N: 'N',
  'N/mm': 'N/mm',
  Nmm: 'N mm',
  Nm: 'N m',
  MPa: 'MPa',
  g: 'g',
  'g/cm3': 'g/cm³',
  degC: '°C',
  '1/K': '1/K',
  Hz: 'Hz',
  turns: 'turns',
  cycles: 'cycles',
  h: 'h',
  'per-kg': 'per kg',
  text: '',
};

/**
 * Reads a decimal written with a comma or a point ("1,5", "1.5", " 12 "). Returns null for anything else,
 * thousands separators and exponents included, so that nothing is silently misread.
 */
export function parseDecimal(text: string): number | null {
  const trimmed = text.trim().replace(/^−/, '-');
  if (!/^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/.test(trimmed)) return null;
  const value = Number(trimmed.replace(',', '.'));
  return Number.isFinite(value) ? value : null;
}

/** Rounds to a number of significant digits and drops trailing zeros; for figures on screen. */
export function significant(value: number, digits = 3): string {
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(digits));
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(rounded))));
  const text = rounded.toFixed(Math.min(decimals, 6));
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** Digits of a whole number in threes from 10 000 on: "1 000 000". */
const grouped = (text: string): string =>
  /^-?\d{5,}$/.test(text) ? text.replace(/\B(?=(\d{3})+$)/g, '\u202f') : text;

/** A figure with its unit, strain in percent: "1.22 %", "6.4 N", "30°". */
export function formatQuantity(value: number | null, unit: Unit, digits = 3): string {
  if (value === null || !Number.isFinite(value)) return 'not known';
  const shown = grouped(significant(unit === 'strain' ? value * 100 : value, digits));
  const symbol = UNIT_SYMBOL[unit];
  if (symbol === '') return shown;
  return unit === 'deg' ? `${shown}${symbol}` : `${shown}\u202f${symbol}`;
}
