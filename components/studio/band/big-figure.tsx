import { formatQuantity, type Unit } from '@/lib/units';

/** A figure in generous numerals, its unit smaller behind it. */
export function BigFigure({ value, unit, size }: { value: number | null; unit: Unit; size: string }) {
  const text = formatQuantity(value, unit);
  const [, number = text, symbol = ''] = /^([+−-]?[\d.,]+(?:\u202f\d{3})*)(.*)$/u.exec(text) ?? [];
  if (number === 'not known') {
    return <span className="font-bold font-heading text-3xl tracking-tight">not known</span>;
  }
  return (
    <span
      className={`whitespace-nowrap font-bold font-heading tabular-nums leading-none tracking-[-0.035em] ${size}`}
    >
      {number}
      <span className="ml-[0.14em] font-semibold text-[0.5em] tracking-normal">{symbol.trim()}</span>
    </span>
  );
}
