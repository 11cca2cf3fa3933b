import { describe, expect, it } from 'vitest';
import { rowsOf } from '@/components/studio/checks/curve-table';
import { exportLink } from '@/components/studio/head/files';
import { changeText } from '@/components/studio/sheet/effect-cell';
import { undoStroke } from '@/components/studio/use-undo-keys';
import { marginWords } from '@/components/studio/verdict';
import { judgedFigure } from '@/generators/report';
import { presetDesign } from '@/generators/url-state';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

const { source } = ROUND_PLASTIC.poisson;
const figure = (value: number | null, limit: number | null, limitKind: 'max' | 'min' = 'max') =>
  judgedFigure({ id: 'x', label: 'X', unit: 'N', because: '', source, value, limit, limitKind });

describe('the margin of a figure', () => {
  it.each([
    [figure(12, 18), '33 % to spare'],
    [figure(17.95, 18), 'under 1 % to spare'],
    [figure(20, 18), '11 % too much'],
    [figure(45, 18), '2.5 times the limit'],
    [figure(30, 20, 'min'), '50 % to spare'],
    [figure(15, 20, 'min'), '25 % too little'],
    [figure(4730, 149, 'min'), '32 times as much'],
    [figure(null, 18), undefined],
    [figure(12, null), undefined],
  ])('case %#: is told in words', (one, words) => {
    expect(marginWords(one)).toBe(words);
  });
});

describe('the effect of a dimension', () => {
  it('is written to the third digit of the figure it changes', () => {
    expect(changeText(-0.0012, 0.012, 'strain')).toBe('−0.12');
    expect(changeText(0.00085, 0.00833, 'strain')).toBe('+0.085');
    expect(changeText(3.4, 120, 'N')).toBe('+3');
  });

  it('is never nought where something moves', () => {
    expect(changeText(0.0000001, 0.012, 'strain')).toBe('<0.01');
  });
});

describe('the keys of undo', () => {
  const held = { ctrlKey: false, metaKey: false, shiftKey: false, altKey: false };

  it.each([
    [{ key: 'z', ctrlKey: true }, 'undo'],
    [{ key: 'z', metaKey: true }, 'undo'],
    [{ key: 'Z', ctrlKey: true, shiftKey: true }, 'redo'],
    [{ key: 'y', ctrlKey: true }, 'redo'],
    [{ key: 'z' }, null],
    [{ key: 'z', ctrlKey: true, altKey: true }, null],
  ])('case %#: are read', (stroke, expected) => {
    expect(undoStroke({ ...held, ...stroke })).toBe(expected);
  });
});

describe('the address of a file', () => {
  it('says the part, the file and the design', () => {
    const design = presetDesign(TINY);
    expect(exportLink(TINY, design, { format: 'stl', stance: null })).toBe(
      '/api/v1/export?family=tiny&format=stl&quality=export&material=round&armLength=20',
    );
    expect(exportLink(TINY, design, { format: '3mf', stance: 'flat', body: 'hook' })).toContain(
      'format=3mf&quality=export&stance=flat&bodies=hook&',
    );
  });
});

describe('the table of a curve', () => {
  const axis = { label: 'Travel', unit: 'mm' } as const;
  const curve = (count: number) => ({
    id: 'c',
    label: 'C',
    x: axis,
    y: axis,
    points: Array.from({ length: count }, (_, n) => [n, 2 * n] as const),
  });

  it('keeps the first and the last point of a long curve', () => {
    const rows = rowsOf(curve(500));
    expect(rows).toHaveLength(21);
    expect([rows[0], rows.at(-1)]).toEqual([
      { at: 0, x: 0, y: 0 },
      { at: 499, x: 499, y: 998 },
    ]);
  });

  it('gives a short one whole, with its band', () => {
    expect(
      rowsOf({
        ...curve(2),
        band: [
          [0, 1],
          [1, 3],
        ],
      }),
    ).toEqual([
      { at: 0, x: 0, y: 0, low: 0, high: 1 },
      { at: 1, x: 1, y: 2, low: 1, high: 3 },
    ]);
  });
});
