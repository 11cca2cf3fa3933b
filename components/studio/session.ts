import { temporal } from 'zundo';
import { createStore } from 'zustand/vanilla';
import type { Family, Preset } from '@/generators/contract';
import { fieldApplies, type NumberField, type ParameterValue } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import {
  type Design,
  designEntries,
  type Entries,
  entryText,
  presetDesign,
  readEntries,
} from '@/generators/url-state';
import type { FieldIssue } from '@/lib/errors';
import type { Material } from '@/lib/materials/types';
import { parseQuantity } from '@/lib/units/quantity';

/** What stands in the fields, and the preset it started from; null for a design that came by a link. */
export interface Typed {
  readonly entries: Entries;
  readonly from: string | null;
}

/** The last valid design with its check, and what is wrong with what is typed now. */
export interface Reading {
  readonly design: Design;
  readonly material: Material;
  readonly report: Report;
  readonly issues: readonly FieldIssue[];
}

export type Session = ReturnType<typeof createSession>;

const UNDO_STEPS = 200;

function sameTyped(a: Typed, b: Typed): boolean {
  const keys = Object.keys(a.entries);
  return (
    a.from === b.from &&
    keys.length === Object.keys(b.entries).length &&
    keys.every((key) => a.entries[key] === b.entries[key])
  );
}

const unknownMaterial = (id: string): FieldIssue => ({
  field: 'material',
  message: `Material ${id} is not in the list`,
});

/** The last valid values with the choices and switches as they stand now: what decides which fields apply. */
export function chosenValues(family: Family, entries: Entries, valid: Design['values']): Design['values'] {
  const chosen = Object.entries(family.parameters.fields).flatMap(
    ([key, field]): [string, ParameterValue][] => {
      const text = entries[key];
      if (text === undefined || field.type === 'number') return [];
      return [[key, field.type === 'toggle' ? text === 'true' : text]];
    },
  );
  return { ...valid, ...Object.fromEntries(chosen) };
}

const usable = (field: NumberField, text: string | undefined): boolean => {
  const value = parseQuantity(text ?? '', field.unit);
  return value !== null && value >= field.min && value <= field.max;
};

/** Where an entry is at fault by itself, what it breaks between dimensions is no news. */
function causes(family: Family, entries: Entries, issues: readonly FieldIssue[]): readonly FieldIssue[] {
  const own = issues.filter(({ field }) => {
    const spec = family.parameters.fields[field];
    return spec?.type !== 'number' ? !spec : !usable(spec, entries[field]);
  });
  return own.length > 0
    ? own.filter(({ field }, at) => own.findIndex((one) => one.field === field) === at)
    : issues;
}

/** Puts the last valid number in place of a faulty one whose field is out of sight. */
function withoutHiddenFaults(family: Family, entries: Entries, valid: Design['values']): Entries {
  const values = chosenValues(family, entries, valid);
  const mended = Object.entries(family.parameters.fields).flatMap(([key, field]) => {
    if (field.type !== 'number' || fieldApplies(family.parameters, key, values)) return [];
    return usable(field, entries[key]) ? [] : [[key, entryText(field, valid[key] ?? field.default)]];
  });
  return { ...entries, ...Object.fromEntries(mended) };
}

/** The design page's state: typed text with undo, and beside it the check of the last valid design. */
export function createSession(family: Family, materials: readonly Material[], start: Typed) {
  const materialOf = (id: string) => materials.find((material) => material.id === id);

  function readingOf(entries: Entries): Reading | readonly FieldIssue[] {
    const read = readEntries(family, entries);
    if (!read.ok) return causes(family, entries, read.issues);
    const design = read.values;
    const material = materialOf(design.material);
    if (!material) return [unknownMaterial(design.material)];
    return { design, material, report: family.check(design.values, material, design.use), issues: [] };
  }

  function firstReading(): Reading {
    const design = presetDesign(family);
    const own = readingOf(withoutHiddenFaults(family, start.entries, design.values));
    if ('design' in own) return own;
    const material = materialOf(design.material) ?? materials[0]!;
    const safe = readingOf(designEntries(family, { ...design, material: material.id }));
    if (!('design' in safe)) throw new Error(`the first preset of ${family.about.id} is not valid`);
    return { ...safe, issues: own };
  }

  const typed = createStore<Typed>()(temporal(() => start, { limit: UNDO_STEPS, equality: sameTyped }));
  const reading = createStore<Reading>()(() => firstReading());
  const focused = createStore<{ readonly field: string | null }>()(() => ({ field: null }));
  const history = typed.temporal;
  let running: string | null = null;

  typed.subscribe(({ entries }) => {
    const { design } = reading.getState();
    const next = readingOf(withoutHiddenFaults(family, entries, design.values));
    reading.setState('design' in next ? next : { issues: next });
  });

  /** Ends the run of edits that undo takes back as one. */
  const seal = () => {
    running = null;
  };

  return {
    family,
    materials,
    typed,
    reading,
    focused,
    history,
    seal,
    /** Edits of one field without a pause between them are one step of undo. */
    type(key: string, text: string) {
      if (running === key) history.getState().pause();
      typed.setState(({ entries, from }) => ({ entries: { ...entries, [key]: text }, from }));
      history.getState().resume();
      running = key;
    },
    replace(next: Typed) {
      seal();
      typed.setState(next);
    },
    undo() {
      seal();
      history.getState().undo();
    },
    redo() {
      seal();
      history.getState().redo();
    },
  };
}

export const presetTyped = (family: Family, preset: Preset<unknown> = family.presets[0]!): Typed => ({
  entries: designEntries(family, presetDesign(family, preset)),
  from: preset.id,
});
