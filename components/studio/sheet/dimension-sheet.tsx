'use client';

import { useCallback, useMemo } from 'react';
import { useStore } from 'zustand';
import { Sheet } from '@/components/ui/sheet';
import { type Field, fieldApplies } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { effectOf, figureOf, numbersOf } from '@/generators/sensitivity';
import { UNIT_SYMBOL } from '@/lib/units';
import { useCalibrated, useStandingReport } from '../computed/standing-context';
import { chosenValues } from '../session';
import { useReading, useSession } from '../session-context';
import { useIdleMap } from '../use-idle-map';
import { ChoiceRow, ToggleRow } from './choice-row';
import { EffectCell, type EffectWord, EffectWords, effectWord } from './effect-cell';
import { Group } from './group';
import { NumberRow } from './number-row';

function useEffects() {
  const subject = useCalibrated();
  const keys = useMemo(() => numbersOf(subject), [subject]);
  const make = useCallback((key: string) => effectOf(subject, key), [subject]);
  return useIdleMap(keys, make);
}

/** Keys of the fields that apply now, by group, groups in their order and empty ones left out. */
function useGroups(): readonly (readonly [string, string, readonly string[]])[] {
  const { family, typed } = useSession();
  const entries = useStore(typed, (state) => state.entries);
  const valid = useReading((reading) => reading.design.values);
  const { fields, groups } = family.parameters;
  const values = chosenValues(family, entries, valid);
  const keys = Object.keys(fields).filter((key) => fieldApplies(family.parameters, key, values));
  return Object.entries(groups)
    .map(([id, title]) => [id, title, keys.filter((key) => fields[key]!.group === id)] as const)
    .filter(([, , own]) => own.length > 0);
}

function Row({
  name,
  field,
  effects,
}: {
  name: string;
  field: Field;
  effects: ReturnType<typeof useEffects>;
}) {
  const report = useStandingReport();
  const valid = useReading((reading) => reading.design.values[name]);
  if (field.type === 'choice') return <ChoiceRow name={name} field={field} />;
  if (field.type === 'toggle') return <ToggleRow name={name} field={field} />;
  const governing = figureOf(report, report.governing);
  const effect = governing && (
    <EffectCell effect={effects?.found.get(name)} report={report} governing={governing} unit={field.unit} />
  );
  return <NumberRow name={name} field={field} valid={Number(valid)} effect={effect ?? <span />} />;
}

const wordsIn = (effects: ReturnType<typeof useEffects>, report: Report): ReadonlySet<EffectWord> =>
  new Set([...(effects?.found.values() ?? [])].flatMap((effect) => effectWord(effect, report) ?? []));

/** Every dimension of the part by group, with what each does. */
export function DimensionSheet() {
  const { family } = useSession();
  const groups = useGroups();
  const effects = useEffects();
  const report = useStandingReport();
  const governing = figureOf(report, report.governing);
  const words = governing ? wordsIn(effects, report) : new Set<EffectWord>();
  const symbol = governing && UNIT_SYMBOL[governing.unit];
  const legend =
    governing && `effect on ${governing.unit === 'strain' ? 'strain' : governing.label.toLowerCase()}`;
  return (
    <Sheet labelledBy="dimensions">
      <h2 id="dimensions" className="sr-only">
        Dimensions
      </h2>
      {groups.map(([id, title, keys], at) => (
        <Group
          key={id}
          id={id}
          title={title}
          aside={at === 0 && legend && (symbol ? `${legend}, ${symbol}` : legend)}
        >
          {keys.map((key) => (
            <Row key={key} name={key} field={family.parameters.fields[key]!} effects={effects} />
          ))}
        </Group>
      ))}
      <EffectWords words={words} />
    </Sheet>
  );
}
