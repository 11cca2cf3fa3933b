import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { StrainBand } from '@/components/studio/band/strain-band';
import { StandingProvider } from '@/components/studio/computed/standing-context';
import { createSession, presetTyped } from '@/components/studio/session';
import { SessionProvider } from '@/components/studio/session-context';
import { UseStrip } from '@/components/studio/sheet/use-strip';
import type { Family, Stance } from '@/generators/contract';
import { judgedFigure, type Report, report } from '@/generators/report';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

const { source } = ROUND_PLASTIC.poisson;

function bandOf(
  change: (was: Report) => Partial<Report>,
  material = ROUND_PLASTIC,
  volume: number | null = null,
  stances: readonly Stance[] = [],
): string {
  const check: Family['check'] = (...given) => {
    const was = TINY.check(...given);
    return report({ ...was, ...change(was) });
  };
  const session = createSession({ ...TINY, check, stances: () => stances }, [material], presetTyped(TINY));
  return renderToStaticMarkup(
    <SessionProvider value={session}>
      <StandingProvider>
        <StrainBand volume={volume} />
        <UseStrip />
      </StandingProvider>
    </SessionProvider>,
  );
}

const words = (html: string): string =>
  html
    .replaceAll(/<[^>]+>/g, ' ')
    .replaceAll(/\s+/g, ' ')
    .trim();

const peak = (given: object) => (was: Report) => ({ figures: [{ ...was.figures[0]!, ...given }] });

describe('the strain band', () => {
  it('holds figures only, so that on a phone the picture comes before the fields', () => {
    const html = bandOf(() => ({}));
    const band = html.slice(0, html.indexOf('</section>'));
    expect(band).toContain('Mass, printed solid');
    expect(band).not.toMatch(/<(select|input)\b/);
  });

  it('gives strain, limit and verdict in words, with every factor of the limit', () => {
    const text = words(bandOf(() => ({})));
    // 1.5 * 1.2 * 2 / 20^2 = 0.9 % of 4 % * 0.6 = 2.4 %
    expect(text).toContain('Peak strain 0.9 %, limit 2.4 %, within limit');
    expect(text).toContain('within limit, 63 % to spare');
    for (const part of ['short-term limit of RP', 'opened often', 'layers along the strain', 'at 23 °C']) {
      expect(text).toContain(part);
    }
    expect(text).toMatch(/handbook 0\.9 % .*corrected 0\.9 %/);
  });

  it('fills past the limit in another ink when it is over', () => {
    const html = bandOf(peak({ value: 0.036, verdict: 'over-limit' }));
    expect(words(html)).toContain('over limit, 50 % too much');
    expect(html).toContain('bg-over');
    expect(bandOf(() => ({}))).not.toContain('bg-over ');
  });

  it('hatches nothing and says why where the allowed strain is not known', () => {
    const html = bandOf(() => ({}), { ...ROUND_PLASTIC, allowableOnce: null });
    expect(html).not.toContain('hatched');
    expect(words(html)).toContain('limit not known, not known');
    expect(words(html)).toContain('Not known: short-term limit of RP');
  });

  it('says the figure is not known, with its reason, rather than nought', () => {
    const text = words(
      bandOf(peak({ value: null, handbook: null, verdict: 'not-known', because: 'The arm is too short.' })),
    );
    expect(text).toContain('Peak strain not known');
    expect(text).toContain('The arm is too short.');
    expect(text).not.toMatch(/Peak strain 0/);
  });

  it('does not know the mass before the solid is made, and gives neither weight nor price', () => {
    const text = words(bandOf(() => ({})));
    expect(text).toContain('Mass, printed solid … not known yet');
    expect(text).not.toMatch(/\d g\b|EUR/);
    // 2500 mm3 of 1.0 g/cm3 weigh 2.5 g
    const made = words(bandOf(() => ({}), ROUND_PLASTIC, 2500));
    expect(made).toMatch(/Mass, printed solid 2\.5\s*g/);
    expect(made).not.toContain('not known yet');
  });

  it('tells beside the layers which way up gives them', () => {
    const stance = { id: 'side', label: 'On its side', because: '', layers: 'along', orient: {} } as const;
    const text = words(
      bandOf(() => ({}), ROUND_PLASTIC, null, [
        stance,
        { ...stance, id: 'up', label: 'Upright', layers: 'across' },
      ]),
    );
    expect(text).toMatch(
      /On its side : layers along the strain, as the file has it unless you lay it otherwise/,
    );
    expect(text).toContain('Upright : layers across the strain.');
  });

  it('hatches below a least value when the governing figure is a load to be carried', () => {
    const load = judgedFigure({
      id: 'load',
      label: 'Stripping load',
      unit: 'N',
      value: 80,
      limit: 50,
      limitKind: 'min',
      because: 'The thread carries it.',
      source,
    });
    const html = bandOf(() => ({ governing: 'load', figures: [load] }));
    const text = words(html);
    expect(text).toContain('at least 50 N');
    expect(text).toContain('within limit, 60 % to spare');
    expect(text).toContain('The thread carries it.');
    expect(text).not.toContain('short-term limit');
    expect(html).toMatch(/hatched[^>]*style="left:0;width:/);
  });
});
