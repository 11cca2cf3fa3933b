'use client';

import { useCallback } from 'react';
import { Button } from '@/components/ui/button';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { type Figure, VERDICT_WORDS } from '@/generators/report';
import { figureOf } from '@/generators/sensitivity';
import { formatQuantity } from '@/lib/units';
import { useStanding } from './computed/standing-context';
import { useReading, useSession, useSubject } from './session-context';
import { useIdleMap } from './use-idle-map';
import { VerdictIcon } from './verdict';

interface Standing {
  readonly figure: Figure;
  /** share of the limit in use; null where it is not known */
  readonly share: number | null;
}

function shareOf({ value, limit, limitKind }: Figure): number | null {
  if (value === null || limit === null || value <= 0 || limit <= 0) return null;
  return limitKind === 'max' ? value / limit : limit / value;
}

/** The same part checked in every printed plastic, the one with most room first. */
function useStandings(): readonly (readonly [string, Standing])[] {
  const { materials } = useSession();
  const subject = useSubject();
  const printed = usePrinted();
  const make = useCallback(
    (id: string): Standing | null => {
      const material = materials.find((one) => one.id === id)!;
      const report = subject.family.check(subject.values, material, subject.use);
      const figure = figureOf(report, report.governing);
      return figure ? { figure, share: shareOf(figure) } : null;
    },
    [subject, materials],
  );
  const answers = useIdleMap(printed, make);
  return [...(answers?.found ?? [])]
    .filter((one): one is [string, Standing] => one[1] !== null)
    .sort(([, a], [, b]) => (a.share ?? Infinity) - (b.share ?? Infinity));
}

const lists = new WeakMap<object, readonly string[]>();

function usePrinted(): readonly string[] {
  const { materials } = useSession();
  const list =
    lists.get(materials) ?? materials.filter((one) => one.process === 'printed').map((one) => one.id);
  lists.set(materials, list);
  return list;
}

function ShareBar({ share }: { share: number | null }) {
  return (
    <span aria-hidden="true" className="relative hidden h-3 w-full max-w-56 bg-tint sm:block">
      <i className="hatched absolute inset-y-0 right-0 left-2/3" />
      {share !== null && (
        <i
          className="absolute inset-y-0 left-0 bg-petrol"
          style={{ width: `${Math.min(100, (share * 200) / 3)}%` }}
        />
      )}
      <i className="absolute -inset-y-1 left-2/3 border-over border-l-2" />
    </span>
  );
}

function Plastic({ id, standing }: { id: string; standing: Standing }) {
  const session = useSession();
  const material = session.materials.find((one) => one.id === id)!;
  const here = useReading((reading) => reading.material.id === id);
  const { figure, share } = standing;
  const verdict = figure.verdict ?? 'not-known';
  const use = () => {
    session.seal();
    session.type('material', id);
  };
  return (
    <li className="grid min-h-12 grid-cols-[1.5rem_1fr_auto] items-center gap-3 border-hair border-t py-1 sm:grid-cols-[1.5rem_minmax(8rem,1fr)_1.2fr_11rem_4rem]">
      <VerdictIcon verdict={verdict} size={22} />
      <span>
        <b className={here ? 'marked font-semibold' : 'font-semibold'}>{material.shortName}</b>
        <span className="block text-muted text-xs sm:hidden">
          {VERDICT_WORDS[verdict]}, {formatQuantity(figure.value, figure.unit)} of{' '}
          {formatQuantity(figure.limit, figure.unit)}
        </span>
      </span>
      <ShareBar share={share} />
      <span className="hidden text-sm leading-tight sm:block">
        {VERDICT_WORDS[verdict]}
        <span className="block font-mono text-muted text-xs">
          {formatQuantity(figure.value, figure.unit)} of {formatQuantity(figure.limit, figure.unit)}
        </span>
      </span>
      {here ? (
        <span className="text-center text-muted text-sm">in use</span>
      ) : (
        <Button small onClick={use} aria-label={`Use ${material.name}`}>
          Use
        </Button>
      )}
    </li>
  );
}

/** Which plastic: the same part in each, by how much of the limit it uses. */
export function Plastics() {
  const standings = useStandings();
  const { basis } = useStanding();
  return (
    <Sheet labelledBy="plastics" className="px-5 pt-4 pb-2 sm:px-7">
      <SheetTitle id="plastics" aside={<span className="text-muted text-sm">share of the limit in use</span>}>
        The same part in other plastics
      </SheetTitle>
      {basis.kind !== 'formula' && (
        <p className="text-muted text-sm">All by the corrected formula, so that they compare alike.</p>
      )}
      <ul className="mt-3">
        {standings.map(([id, standing]) => (
          <Plastic key={id} id={id} standing={standing} />
        ))}
      </ul>
    </Sheet>
  );
}
