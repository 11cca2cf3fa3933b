import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { Figures } from '@/components/studio/band/figures';
import type { Basis, Standing } from '@/components/studio/computed/standing';
import { bendingOf } from '@/generators/bend';
import hook from '@/generators/cantilever-hook';
import type { Computed } from '@/generators/computed';
import { checkOf } from '@/generators/sensitivity';
import { DEFAULT_USE } from '@/lib/materials/types';
import { linearPlastic } from '@/tests/support/materials';

const PLASTIC = linearPlastic(1500);
const values = hook.parameters.defaults;
const formula = checkOf({ family: hook, values, material: PLASTIC, use: DEFAULT_USE } as never);
const plane = bendingOf(hook, values, PLASTIC, DEFAULT_USE);

function text(basis: Basis, value?: number): string {
  if ('none' in plane) throw new Error(plane.none);
  const figures = formula.figures.map((one) =>
    one.id === 'peak-strain' && value !== undefined ? { ...one, value } : one,
  );
  const standing: Standing = { report: { ...formula, figures }, formula, basis, plane, solution: null };
  const figure = standing.report.figures.find(({ id }) => id === 'peak-strain')!;
  return renderToStaticMarkup(
    <Figures figure={figure} standing={value === undefined ? { ...standing, report: formula } : standing} />,
  )
    .replaceAll(/<[^>]+>/g, ' ')
    .replaceAll(/\s+/g, ' ')
    .trim();
}

describe('the three figures', () => {
  it('are handbook, corrected and computed, the last bearing the verdict', () => {
    const shown = text({ kind: 'computed', pending: false, computed: {} as Computed }, 0.0234);
    expect(shown).toMatch(/^handbook [\d.]+ % corrected [\d.]+ % computed 2\.34 % \(bears the verdict\)$/);
  });

  it('leave the verdict with the corrected one while the computed one is awaited', () => {
    expect(text({ kind: 'solving' })).toMatch(/corrected [\d.]+ % \(bears the verdict\) computed …$/);
  });

  it('are two where nothing is computed', () => {
    expect(text({ kind: 'formula', because: 'It twists.' })).toMatch(
      /^handbook [\d.]+ % corrected [\d.]+ % \(bears the verdict\)$/,
    );
  });
});
