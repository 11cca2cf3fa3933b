import { describe, expect, it } from 'vitest';
import {
  bondedStiffness,
  bucklingLoad,
  columnFault,
  columnStiffness,
  columnSway,
  shapeFactor,
} from '@/lib/mechanics/rubber-column';
import solved from './columns.json';

const rubber = { modulus: solved.modulus, poisson: solved.poisson };
const columns = solved.columns.map((column) => [column.height, column] as const);
const plain = ({ side, height }: { side: number; height: number }) => (rubber.modulus * side ** 2) / height;

describe('square rubber columns against solid finite elements', () => {
  it.each(columns)('of 8 mm, %d mm high, are covered', (_, column) => {
    expect(columnFault(column, rubber.poisson)).toBeNull();
  });

  it.each(columns)('of 8 mm, %d mm high, are as stiff upright within two percent', (_, column) => {
    const told = columnStiffness(column, rubber) / plain(column);
    expect(Math.abs(told / column.compression - 1)).toBeLessThan(0.02);
    expect(Math.abs(column.compression_coarse / column.compression - 1)).toBeLessThan(0.005);
  });

  it.each(columns)('of 8 mm, %d mm high, are as stiff sideways within two percent', (_, column) => {
    const told = columnSway(column, rubber) / plain(column);
    expect(Math.abs(told / column.shear - 1)).toBeLessThan(0.02);
  });

  // Gent & Lindley 1959 (from memory): bonded blocks are 1 + 2 S^2 times as stiff as free ones.
  it('confirm the published shape factor for the shortest column', () => {
    const short = solved.columns[0]!;
    expect(shapeFactor(short)).toBe(0.5);
    expect(bondedStiffness(short, rubber) / plain(short)).toBeCloseTo(1.5, 12);
    expect(Math.abs(1.5 / short.compression - 1)).toBeLessThan(0.01);
  });
});

describe('slim columns', () => {
  // Timoshenko & Gere (from memory): ends held, one free to shift, P = pi^2 E I / l^2; sway stiffness 12 E I / l^3.
  it('tend to the beam and to Euler', () => {
    const slim = { side: 1, height: 1000 };
    const inertia = 1 / 12;
    expect(columnSway(slim, rubber, 'plain') / ((12 * inertia) / 1000 ** 3)).toBeCloseTo(1, 4);
    expect(bucklingLoad(slim, rubber) / ((Math.PI ** 2 * inertia) / 1000 ** 2)).toBeCloseTo(1, 3);
  });

  it('are refused past six times their side, and plastics that are not like rubber', () => {
    expect(columnFault({ side: 2, height: 13 }, 0.465)).toMatch(/six times/);
    expect(columnFault({ side: 2, height: 10 }, 0.35)).toMatch(/rubber-like/);
  });
});
