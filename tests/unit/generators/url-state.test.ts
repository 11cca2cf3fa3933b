import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { FAMILIES } from '@/generators';
import type { Family } from '@/generators/contract';
import { type Field, fieldApplies, type ParameterValue, parseParameters } from '@/generators/parameters';
import {
  type Design,
  designEntries,
  LINK_LIMIT,
  LINK_WORDS,
  linkEntries,
  presetDesign,
  readEntries,
  writeLink,
} from '@/generators/url-state';
import { TINY } from './tiny-family';

const families: Family[] = [TINY, ...(await Promise.all(FAMILIES.map((entry) => entry.load())))];

function anyValue(field: Field): fc.Arbitrary<ParameterValue> {
  if (field.type === 'toggle') return fc.boolean();
  if (field.type === 'choice') return fc.constantFrom(...field.options.map((option) => option.value));
  const steps = Math.floor((field.max - field.min) / field.step);
  const onGrid = fc
    .integer({ min: 0, max: steps })
    .map((n) => Number((field.min + n * field.step).toFixed(6)));
  const fine = fc
    .double({ min: field.min, max: field.max, noNaN: true })
    .map((value) => Math.min(field.max, Math.max(field.min, Number(value.toFixed(6)) || 0)));
  return field.whole ? onGrid : fc.oneof(onGrid, fine);
}

const designOf = (family: Family): fc.Arbitrary<Design> =>
  fc.record({
    values: fc.record(
      Object.fromEntries(
        Object.entries(family.parameters.fields).map(([key, field]) => [key, anyValue(field)]),
      ),
    ),
    material: fc.constantFrom('pp', 'petg', 'tpu-95a'),
    use: fc.record({
      opening: fc.constantFrom('once', 'sometimes', 'often'),
      layers: fc.constantFrom('along', 'across'),
      temperature: fc.integer({ min: -40, max: 150 }),
    }),
  });

const readLink = (family: Family, query: string) => readEntries(family, linkEntries(family, query).entries);

const accepted = (family: Family, design: Design): boolean =>
  parseParameters(family.parameters, design.values).ok;

describe('a link', () => {
  it.each(families)('brings back the same $about.id design', (family) => {
    fc.assert(
      fc.property(designOf(family), (design) => {
        const read = readLink(family, writeLink(family, design));
        if (accepted(family, design)) expect(read).toEqual({ ok: true, values: design });
        else expect(read.ok).toBe(false);
      }),
      { numRuns: 200, seed: 7 },
    );
  });

  it.each(families)('stays short enough to be read for every preset of $about.id', (family) => {
    for (const preset of family.presets) {
      const link = writeLink(family, presetDesign(family, preset));
      expect(link.length).toBeLessThan(LINK_LIMIT);
      expect(readLink(family, link)).toEqual({ ok: true, values: presetDesign(family, preset) });
    }
  });

  it.each(families)('has no word that is also a parameter of $about.id', (family) => {
    expect(LINK_WORDS.filter((word) => word in family.parameters.fields)).toEqual([]);
  });

  it('says only what differs from the defaults, and always the plastic', () => {
    const design = presetDesign(TINY);
    expect(writeLink(TINY, design)).toBe('material=round&armLength=20');
    expect(writeLink(TINY, { ...design, values: TINY.parameters.defaults })).toBe('material=round');
  });

  it('takes a comma for a decimal point, and the later of two values', () => {
    const read = readLink(TINY, 'armLength=12,5&armLength=14%2C5');
    expect(read.ok && read.values.values.armLength).toBe(14.5);
    expect(linkEntries(TINY, 'armLength=12&tip=1&armLength=14&from=a&from=b')).toMatchObject({
      repeated: ['armLength'],
      unknown: ['from'],
    });
  });

  it('takes figures with their units', () => {
    const read = readLink(TINY, 'armLength=1.45%20cm&temperature=60%20%C2%B0C');
    expect(read.ok && [read.values.values.armLength, read.values.use.temperature]).toEqual([14.5, 60]);
  });

  it('names every field at fault with its bound and unit', () => {
    const read = readLink(TINY, 'armLength=900&undercut=wide&temperature=400&opening=daily');
    expect(read.ok ? [] : read.issues).toEqual(
      expect.arrayContaining([
        { field: 'armLength', message: 'Arm length must be at most 60 mm', bound: 60, unit: 'mm' },
        { field: 'undercut', message: 'Undercut must be a number in mm', unit: 'mm' },
        { field: 'opening', message: 'Opened must be one of once, sometimes, often' },
        {
          field: 'temperature',
          message: 'Temperature must be a number from -40 to 150 °C',
          bound: 150,
          unit: 'degC',
        },
      ]),
    );
  });

  it.each(['material=../secrets', 'material=%E0%A4%A', 'material=', `material=${'a'.repeat(61)}`])(
    'refuses %s as a material',
    (query) => {
      const read = readLink(TINY, query);
      expect(read.ok ? [] : read.issues.map((issue) => issue.field)).toEqual(['material']);
    },
  );

  it('is read up to the last whole word within its longest length', () => {
    const long = `armLength=21&${'x=1&'.repeat(LINK_LIMIT / 4)}thickness=3`;
    expect(linkEntries(TINY, long)).toMatchObject({
      entries: { armLength: '21', thickness: '2.0' },
      unknown: ['x'],
      unread: ['x', 'thickness'],
    });
    expect(linkEntries(TINY, `armLength=${'1'.repeat(LINK_LIMIT)}`).entries).toEqual({});
  });

  it('keeps what was typed in it, and names the words it does not know', () => {
    const { entries, unknown } = linkEntries(TINY, '?armLength=9oo&from=mail');
    expect(entries).toMatchObject({ armLength: '9oo', thickness: '2.0', material: 'round' });
    expect(unknown).toEqual(['from']);
    expect(linkEntries(TINY, '?from=mail').entries).toEqual({});
  });
});

describe('what is typed', () => {
  it('reads back as the design it shows', () => {
    const design = presetDesign(TINY, TINY.presets[1]);
    expect(designEntries(TINY, design)).toMatchObject({
      armLength: '10.0',
      arms: '2',
      receiver: 'true',
      opening: 'once',
      temperature: '23',
    });
    expect(readEntries(TINY, designEntries(TINY, design))).toEqual({ ok: true, values: design });
  });

  it('is refused where a relation does not hold, at the field of the relation', () => {
    const entries = { ...designEntries(TINY, presetDesign(TINY)), tip: '3' };
    expect(readEntries(TINY, entries)).toEqual({
      ok: false,
      issues: [{ field: 'tip', message: 'Tip thickness must be at most the thickness, 2 mm', unit: 'mm' }],
    });
  });

  it('is shown for fields that apply and kept for those that do not', () => {
    const design = presetDesign(TINY);
    expect(fieldApplies(TINY.parameters, 'noseRadius', design.values)).toBe(false);
    expect(designEntries(TINY, design).noseRadius).toBe('0.5');
  });
});
