'use client';

import { SelectField } from '@/components/ui/select-field';
import { USE_FIELDS } from '@/generators/url-state';
import { useEntry, useIssue, useReading, useSession } from '../session-context';
import { ChoiceRow } from './choice-row';
import { describedBy, FieldRow, fieldId } from './field-row';
import { NumberRow } from './number-row';

function MaterialRow() {
  const session = useSession();
  const value = useEntry('material');
  const issue = useIssue('material');
  const material = useReading((reading) => reading.material);
  const optionsOf = (process: 'printed' | 'moulded') =>
    session.materials
      .filter((one) => one.process === process)
      .map(({ id, name }) => ({ value: id, label: name.replace(/, (printed|moulded)\b/, '') }));
  const moulded = optionsOf('moulded');
  const stray = session.materials.some(({ id }) => id === value) ? [] : [{ value, label: value }];
  return (
    <FieldRow
      name="material"
      label="Plastic"
      layout="stack"
      help={<p>{material.summary}</p>}
      error={issue && `${issue.message}; the check is for ${material.shortName}.`}
      control={
        <SelectField
          id={fieldId('material')}
          value={value}
          aria-invalid={issue ? true : undefined}
          aria-describedby={describedBy('material', Boolean(issue))}
          options={[
            ...stray,
            { label: 'Printed', options: optionsOf('printed') },
            ...(moulded.length > 0 ? [{ label: 'Moulded, to compare', options: moulded }] : []),
          ]}
          onChange={(event) => {
            session.seal();
            session.type('material', event.target.value);
          }}
        />
      }
    />
  );
}

/** Which way up gives which layers, the best first, as it lies in the file unless another is chosen. */
function LayersRow() {
  const { family } = useSession();
  const values = useReading((reading) => reading.design.values);
  const stances = family.stances(values);
  const more = stances.map(({ id, label, layers }, at) => (
    <p key={id} className="mt-2">
      <b>{label}</b>: layers {layers} the strain
      {at === 0 && ', as the file has it unless you lay it otherwise'}.
    </p>
  ));
  return <ChoiceRow name="layers" field={USE_FIELDS.layers} layout="stack" more={more} />;
}

/** Plastic and how the part is used: what the allowed strain comes from. */
export function UseStrip() {
  const temperature = useReading((reading) => reading.design.use.temperature);
  return (
    <fieldset className="grid grid-cols-2 gap-x-2 rounded-sheet border border-hair bg-sheet px-2 pt-1 pb-2 shadow-lift sm:px-3 [&>div:first-of-type]:col-span-2 [&>div:last-of-type]:col-span-2">
      <legend className="sr-only">Plastic and use</legend>
      <MaterialRow />
      <ChoiceRow name="opening" field={USE_FIELDS.opening} layout="stack" />
      <NumberRow name="temperature" field={USE_FIELDS.temperature} valid={temperature} layout="stack" />
      <LayersRow />
    </fieldset>
  );
}
