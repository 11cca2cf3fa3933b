'use client';

import { useSyncExternalStore } from 'react';
import { type Field, fieldApplies, type ParameterValue, warnings } from '@/generators/parameters';
import { type Figure, VERDICT_WORDS } from '@/generators/report';
import { USE_FIELDS, writeLink } from '@/generators/url-state';
import { formatQuantity } from '@/lib/units';
import { useStandingReport } from './computed/standing-context';
import { useReading, useSession } from './session-context';

const never = () => () => {};
const useOrigin = () =>
  useSyncExternalStore(
    never,
    () => window.location.origin,
    () => '',
  );

function valueText(field: Field, value: ParameterValue | undefined): string {
  if (field.type === 'number') return formatQuantity(Number(value), field.unit, 6);
  if (field.type === 'toggle') return value ? 'yes' : 'no';
  return field.options.find((option) => option.value === value)?.label ?? String(value);
}

function Lines({ title, lines }: { title: string; lines: readonly (readonly [string, string])[] }) {
  return (
    <section className="mt-4 break-inside-avoid">
      <h2 className="border-black border-b font-bold">{title}</h2>
      <dl className="columns-2 gap-x-10 text-[9.5pt]">
        {lines.map(([name, text]) => (
          <div key={name} className="flex break-inside-avoid justify-between gap-4 py-px">
            <dt>{name}</dt>
            <dd className="text-right font-semibold">{text}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}

function figureText({ value, low, high, limit, limitKind, unit, verdict }: Figure): string {
  const text = (one: number) => formatQuantity(one, unit);
  const parts = [
    formatQuantity(value, unit),
    low !== null && high !== null && low !== high && `(${text(low)} to ${text(high)})`,
    limit !== null && `${limitKind === 'max' ? 'at most' : 'at least'} ${text(limit)}`,
    verdict && VERDICT_WORDS[verdict],
  ];
  return parts.filter(Boolean).join(', ').replace(', (', ' (');
}

function useDimensions(): readonly (readonly [string, readonly (readonly [string, string])[]])[] {
  const { parameters } = useSession().family;
  const values = useReading((reading) => reading.design.values);
  const fields = Object.entries(parameters.fields).filter(([key]) => fieldApplies(parameters, key, values));
  return Object.entries(parameters.groups)
    .map(([id, title]) => {
      const own = fields.filter(([, field]) => field.group === id);
      return [
        title,
        own.map(([key, field]) => [field.label, valueText(field, values[key])] as const),
      ] as const;
    })
    .filter(([, lines]) => lines.length > 0);
}

/** What is printed of the design page: name, link, dimensions, figures, cautions. Those of every part are in the foot. */
export function PrintSheet({ title }: { title?: string | undefined }) {
  const { family } = useSession();
  const { design, material, issues } = useReading((reading) => reading);
  const report = useStandingReport();
  const origin = useOrigin();
  const dimensions = useDimensions();
  const { opening, layers, temperature } = design.use;
  const use: readonly (readonly [string, string])[] = [
    ['Plastic', material.name],
    [USE_FIELDS.opening.label, valueText(USE_FIELDS.opening, opening)],
    [USE_FIELDS.layers.label, valueText(USE_FIELDS.layers, layers)],
    [USE_FIELDS.temperature.label, valueText(USE_FIELDS.temperature, temperature)],
  ];
  const cautions = warnings(family.parameters, design.values).map(({ message }) => message);
  return (
    <div data-print="" className="hidden text-black print:block">
      <p className="font-bold font-heading text-3xl">{title ?? family.about.name}</p>
      {title && <p>{family.about.name}</p>}
      <p className="break-all font-mono text-[8pt]">
        {origin}/design/{family.about.id}?{writeLink(family, design)}
      </p>
      {issues.length > 0 && <p>The last valid part: {issues[0]!.message}.</p>}
      <p className="mt-2 font-semibold">All together: {VERDICT_WORDS[report.verdict]}.</p>
      <Lines title="Plastic and use" lines={use} />
      {dimensions.map(([group, lines]) => (
        <Lines key={group} title={group} lines={lines} />
      ))}
      <section className="mt-4">
        <h2 className="border-black border-b font-bold">Figures</h2>
        <table className="w-full text-[9.5pt]">
          <tbody>
            {report.figures.map((figure) => (
              <tr key={figure.id} className="break-inside-avoid align-top">
                <th scope="row" className="pr-4 text-left font-normal">
                  {figure.label}
                </th>
                <td className="text-right font-semibold">{figureText(figure)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </section>
      <section className="mt-4 break-inside-avoid text-[9.5pt]">
        <h2 className="border-black border-b font-bold text-base">Cautions</h2>
        <ul>
          {cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
          <li>The figures are estimates for a first print. Prove the part by test before you rely on it.</li>
        </ul>
      </section>
    </div>
  );
}
