import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { SiteFooter } from '@/components/layout/site-footer';
import { PartTiles } from '@/components/site/part-tiles';
import { TINY } from '../../generators/tiny-family';

const aboutAll = (count: number) =>
  Array.from({ length: count }, (_, k) => ({ ...TINY.about, id: `part-${k}`, name: `Part ${k}` }));

/** Columns of the grid and of its last tile at a width, as their classes say. */
function gridOf(count: number, width: 'sm' | 'lg' | 'xl') {
  const html = renderToStaticMarkup(<PartTiles families={aboutAll(count)} />);
  const columns = Number(new RegExp(`${width}:grid-cols-(\\d)`).exec(html)![1]);
  const last = html.slice(html.lastIndexOf('<li'));
  const span = Number(new RegExp(`${width}:col-span-(\\d)`).exec(last)![1]);
  return { columns, span, tiles: html.split('<li').length - 2 };
}

describe('the tiles of the parts', () => {
  it.each(['sm', 'lg', 'xl'] as const)(
    'leave no part alone in its row at %s, however many there are',
    (width) => {
      for (let count = 1; count <= 25; count += 1) {
        const { columns, span, tiles } = gridOf(count, width);
        expect(tiles).toBe(count);
        expect(span).toBeLessThanOrEqual(columns);
        expect((count + span) % columns, `${count} parts`).toBe(0);
      }
    },
  );
});

describe('the foot of every page', () => {
  it('leads to what the figures mean', () => {
    expect(renderToStaticMarkup(<SiteFooter />)).toContain('href="/about"');
  });
});
