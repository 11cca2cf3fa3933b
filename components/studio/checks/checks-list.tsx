'use client';

import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { warnings } from '@/generators/parameters';
import { type Figure, VERDICT_WORDS } from '@/generators/report';
import { formatQuantity } from '@/lib/units';
import { formulaBeside } from '../computed/standing';
import { useStanding } from '../computed/standing-context';
import { useReading, useSession } from '../session-context';
import { ToField } from '../sheet/to-field';
import { SourceNote } from '../source-note';
import { marginWords, VerdictIcon, VerdictMark } from '../verdict';

const text = (value: number | null, figure: Figure): string => formatQuantity(value, figure.unit);

function limitText(figure: Figure): string | null {
  if (figure.limit === null) return figure.verdict ? 'limit not known' : null;
  return `${figure.limitKind === 'max' ? 'at most' : 'at least'} ${text(figure.limit, figure)}`;
}

/** `formula`: of the corrected formula, where the figure was computed. */
function Aside({ figure, formula }: { figure: Figure; formula: number | null }) {
  const { low, high, handbook, value } = figure;
  const parts = [
    low !== null && high !== null && low !== high && `${text(low, figure)} to ${text(high, figure)}`,
    handbook !== null && handbook !== value && `handbook ${text(handbook, figure)}`,
    formula !== null && `formula ${text(formula, figure)}`,
  ].filter(Boolean);
  if (parts.length === 0) return null;
  return (
    <p className="text-muted text-xs tabular-nums">
      {parts.map((part) => (
        <span key={String(part)} className="mr-3 sm:mr-0 sm:block">
          {part}
        </span>
      ))}
    </p>
  );
}

function Check({ figure, formula }: { figure: Figure; formula: number | null }) {
  const words = [figure.verdict && VERDICT_WORDS[figure.verdict], limitText(figure), marginWords(figure)];
  return (
    <li className="grid grid-cols-[1.5rem_1fr_auto] content-start gap-x-3 border-hair border-t py-3.5 sm:grid-cols-[1.5rem_1fr_11rem] sm:gap-x-5">
      <span className="col-start-1 row-span-2 row-start-1 pt-0.5">
        {figure.verdict && <VerdictIcon verdict={figure.verdict} size={22} />}
      </span>
      <h3 className="col-start-2 row-start-1 pt-0.5 font-semibold leading-snug">{figure.label}</h3>
      <p className="col-start-3 row-start-1 text-right font-bold font-heading text-2xl tabular-nums leading-tight tracking-tight">
        {text(figure.value, figure)}
      </p>
      <div className="col-span-2 col-start-2 text-sm leading-snug sm:col-span-1 sm:col-start-3 sm:row-start-2 sm:text-right">
        {figure.verdict && (
          <p>
            {words.filter(Boolean).map((word, at) => (
              <span key={word} className={at === 0 ? 'font-semibold sm:block' : 'text-muted sm:block'}>
                {at > 0 && <span className="sm:hidden">, </span>}
                {word}
              </span>
            ))}
          </p>
        )}
        <Aside figure={figure} formula={formula} />
      </div>
      <div className="col-span-2 col-start-2 mt-0.5 max-w-prose text-muted text-sm sm:col-span-1 sm:row-start-2">
        {figure.because} <SourceNote source={figure.source} of={figure.label} />
      </div>
    </li>
  );
}

function Warnings() {
  const { family } = useSession();
  const values = useReading((reading) => reading.design.values);
  const list = warnings(family.parameters, values);
  if (list.length === 0) return null;
  return (
    <ul className="mt-3 grid gap-1.5 border-near border-l-4 bg-near-soft px-3 py-2.5 text-sm">
      {list.map(({ id, field, message }) => (
        <li key={id} className="flex items-start gap-2">
          <VerdictIcon verdict="close-to-limit" size={18} />
          <span>
            {message} <ToField name={field} />
          </span>
        </li>
      ))}
    </ul>
  );
}

/** Every figure of the check: what it is, its limit, the verdict, why, and where it comes from. */
export function ChecksList() {
  const standing = useStanding();
  const { report } = standing;
  return (
    <Sheet labelledBy="checks" className="px-5 pt-4 pb-2 sm:px-7">
      <SheetTitle id="checks" aside={<VerdictMark verdict={report.verdict} more="all together" />}>
        Checks
      </SheetTitle>
      <Warnings />
      <ul className="mt-3 grid gap-x-12 xl:grid-cols-2">
        {report.figures.map((figure) => (
          <Check key={figure.id} figure={figure} formula={formulaBeside(standing, figure.id)} />
        ))}
      </ul>
    </Sheet>
  );
}
