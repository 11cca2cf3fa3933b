import { describe, expect, it } from 'vitest';
import { type Rgb, scaleEnd, strainColour } from '@/components/viewport/drawing/ramp';

const linear = (c: number) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4);
/** CIE 1976 lightness of an sRGB colour (IEC 61966-2-1 and CIE 15), 0 to 100. */
const lightness = ([r, g, b]: Rgb) => {
  const y = 0.2126 * linear(r) + 0.7152 * linear(g) + 0.0722 * linear(b);
  return y > 0.008856 ? 116 * Math.cbrt(y) - 16 : 903.3 * y;
};
const shares = Array.from({ length: 41 }, (_, k) => k / 40);

/** Colour blindness of full severity, Machado, Oliveira and Fernandes 2009, matrices from memory. */
const BLIND = {
  protanopia: [0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998],
  deuteranopia: [0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.01182, 0.04294, 0.968881],
  tritanopia: [1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.3039],
};
const seen = (m: number[], [r, g, b]: Rgb): Rgb => {
  const v = [linear(r), linear(g), linear(b)];
  return [0, 3, 6].map(
    (row) => m[row]! * v[0]! + m[row + 1]! * v[1]! + m[row + 2]! * v[2]!,
  ) as unknown as Rgb;
};

describe('colours of strain', () => {
  it.each([1, -1])('darken without a step back as strain grows (sign %i)', (sign) => {
    const steps = shares.map((share) => lightness(strainColour(sign * share)));
    for (let k = 1; k < steps.length; k += 1) expect(steps[k]!).toBeLessThan(steps[k - 1]!);
    expect(steps[0]! - steps.at(-1)!).toBeGreaterThan(55);
  });

  it('are as dark in compression as in tension of the same size', () => {
    for (const share of shares) {
      const apart = lightness(strainColour(share)) - lightness(strainColour(-share));
      expect(Math.abs(apart)).toBeLessThan(6);
    }
  });

  it.each(Object.entries(BLIND))('keep tension and compression apart under %s', (_, matrix) => {
    for (const share of [0.4, 0.6, 0.8]) {
      const [t, c] = [seen(matrix, strainColour(share)), seen(matrix, strainColour(-share))];
      const bright = Math.max(...t, ...c);
      expect(Math.hypot(t[0] - c[0], t[1] - c[1], t[2] - c[2]) / bright).toBeGreaterThan(0.25);
    }
  });

  it('reach past the allowable strain, and past the peak where that is larger', () => {
    expect(scaleEnd(0.01, 0.02)).toBeCloseTo(0.025);
    expect(scaleEnd(0.05, 0.02)).toBe(0.05);
    expect(scaleEnd(0.03, null)).toBe(0.03);
  });

  it('have a scale even where nothing strains', () => {
    expect(scaleEnd(0, null)).toBeGreaterThan(0);
  });
});
