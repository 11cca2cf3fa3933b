import { significant } from '@/lib/units';
import { type Convergence, caseName } from './record';

/** Percent at the edges of the plot; smaller differences are drawn on the lower edge. */
const LEAST = 0.001;
const MOST = 10;
const DECADES = [10, 1, 0.1, 0.01, 0.001];

const across = (value: number, low: number, high: number): number =>
  (100 * (Math.log(value) - Math.log(low))) / (Math.log(high) - Math.log(low));

/** The range of degrees of freedom shown in every plot, so that they compare. */
const FEWEST = 200;
const LARGEST = 12_000;

const SERIES = [
  { key: 'strainPercent', name: 'peak strain', stroke: 'var(--clay)' },
  { key: 'forcePercent', name: 'force', stroke: 'var(--petrol)' },
] as const;

type Key = (typeof SERIES)[number]['key'];

function points({ meshes }: Convergence, key: Key) {
  return meshes.map((mesh) => ({
    x: across(mesh.unknowns, FEWEST, LARGEST),
    y: 100 - across(Math.min(MOST, Math.max(LEAST, Math.abs(mesh[key]))), LEAST, MOST),
  }));
}

const pathOf = (line: ReturnType<typeof points>): string =>
  `M${line.map(({ x, y }) => `${x.toFixed(2)} ${y.toFixed(2)}`).join('L')}`;

function Line({ run, series }: { run: Convergence; series: (typeof SERIES)[number] }) {
  const line = points(run, series.key);
  return (
    <>
      <path d={pathOf(line)} stroke={series.stroke} strokeWidth="2.5" />
      {line.map(({ x, y }) => (
        <path key={x} d={`M${x} ${y}h0.01`} stroke={series.stroke} strokeWidth="9" strokeLinecap="round" />
      ))}
    </>
  );
}

/** Degrees of freedom labelled under the plot. */
const COUNTS = [300, 1000, 3000, 10_000];

function Numbers({ run }: { run: Convergence }) {
  return (
    <details className="mt-2">
      <summary className="min-h-8 w-fit text-sm underline decoration-dotted underline-offset-4">
        As a table
      </summary>
      <table className="w-full max-w-md text-right font-mono text-sm">
        <caption className="sr-only">Convergence of {caseName(run)}</caption>
        <thead>
          <tr className="border-ink border-b-2">
            <th className="py-1 font-semibold">degrees of freedom</th>
            <th className="py-1 font-semibold">strain, %</th>
            <th className="py-1 font-semibold">force, %</th>
          </tr>
        </thead>
        <tbody>
          {run.meshes.map(({ unknowns, strainPercent, forcePercent }) => (
            <tr key={unknowns} className="border-hair border-b">
              <td className="py-0.5">{unknowns}</td>
              <td>{strainPercent}</td>
              <td>{forcePercent}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}

/** Difference to the finest mesh over degrees of freedom, both in tenfold steps. */
export function ConvergencePlot({ run }: { run: Convergence }) {
  return (
    <figure className="min-w-0">
      <figcaption className="mb-3">
        <b className="block font-heading text-lg leading-tight">{run.group}</b>
        <span className="text-muted text-sm">{caseName(run)}</span>
      </figcaption>
      <div className="grid grid-cols-[3.4rem_1fr] gap-x-2">
        <div aria-hidden="true" className="relative h-52">
          {DECADES.map((decade) => (
            <span
              key={decade}
              className="absolute right-0 -translate-y-1/2 font-mono text-muted text-xs"
              style={{ top: `${100 - across(decade, LEAST, MOST)}%` }}
            >
              {significant(decade, 1)} %
            </span>
          ))}
        </div>
        <svg
          aria-hidden="true"
          viewBox="0 0 100 100"
          preserveAspectRatio="none"
          fill="none"
          className="h-52 w-full overflow-visible [&_*]:[vector-effect:non-scaling-stroke]"
        >
          {DECADES.map((decade) => (
            <path
              key={decade}
              d={`M0 ${100 - across(decade, LEAST, MOST)}H100`}
              stroke={decade === LEAST ? 'var(--ink)' : 'var(--hair)'}
              strokeWidth={decade === LEAST ? 2 : 1}
            />
          ))}
          {COUNTS.map((count) => (
            <path key={count} d={`M${across(count, FEWEST, LARGEST)} 100v2.5`} stroke="var(--ink)" />
          ))}
          {SERIES.map((series) => (
            <Line key={series.key} run={run} series={series} />
          ))}
        </svg>
        <div aria-hidden="true" className="relative col-start-2 mt-2 h-5">
          {COUNTS.map((count) => (
            <span
              key={count}
              className="absolute -translate-x-1/2 font-mono text-muted text-xs"
              style={{ left: `${across(count, FEWEST, LARGEST)}%` }}
            >
              {count}
            </span>
          ))}
        </div>
      </div>
      <Numbers run={run} />
    </figure>
  );
}

export function ConvergenceKey() {
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1 text-sm">
      {SERIES.map(({ key, name, stroke }) => (
        <li key={key} className="flex items-center gap-2">
          <i aria-hidden="true" className="inline-block h-1 w-6" style={{ background: stroke }} />
          {name}
        </li>
      ))}
      <li className="text-muted">up: difference to the finest mesh; across: degrees of freedom</li>
    </ul>
  );
}
