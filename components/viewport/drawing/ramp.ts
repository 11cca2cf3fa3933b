/**
 * Colours of strain. Size is lightness, falling evenly from pale to dark; sign is hue, warm for tension and blue for
 * compression, which stay apart in the common kinds of colour blindness. The picture and its scale use this one
 * function. Colours are mixed in Oklab (Ottosson 2020, matrices from memory) and given as sRGB, 0 to 1.
 */
export type Rgb = readonly [number, number, number];

/** Lines and the forbidden hatch on painted surfaces, the same by day and by night as the ramp is. */
export const PAINT_INK = '#0f2a2e';
export const PAINT_OVER = '#b3301f';

const LIGHT = 0.95;
const DARK = 0.3;

interface HueStop {
  readonly at: number;
  readonly chroma: number;
  /** degrees in Oklab */
  readonly hue: number;
}

const TENSION: readonly HueStop[] = [
  { at: 0, chroma: 0.02, hue: 100 },
  { at: 0.25, chroma: 0.1, hue: 88 },
  { at: 0.5, chroma: 0.145, hue: 62 },
  { at: 0.75, chroma: 0.15, hue: 38 },
  { at: 1, chroma: 0.1, hue: 18 },
];
const COMPRESSION: readonly HueStop[] = [
  { at: 0, chroma: 0.02, hue: 100 },
  { at: 0.25, chroma: 0.05, hue: 215 },
  { at: 0.5, chroma: 0.09, hue: 235 },
  { at: 0.75, chroma: 0.11, hue: 252 },
  { at: 1, chroma: 0.1, hue: 268 },
];

function between(stops: readonly HueStop[], share: number): { a: number; b: number } {
  const upper = Math.max(
    1,
    stops.findIndex((stop) => stop.at >= share),
  );
  const [low, high] = [stops[upper - 1]!, stops[upper]!];
  const part = (share - low.at) / (high.at - low.at);
  const plane = ({ chroma, hue }: HueStop) => ({
    a: chroma * Math.cos((hue * Math.PI) / 180),
    b: chroma * Math.sin((hue * Math.PI) / 180),
  });
  const [p, q] = [plane(low), plane(high)];
  return { a: p.a + part * (q.a - p.a), b: p.b + part * (q.b - p.b) };
}

function fromOklab(light: number, a: number, b: number): Rgb {
  const l = (light + 0.3963377774 * a + 0.2158037573 * b) ** 3;
  const m = (light - 0.1055613458 * a - 0.0638541728 * b) ** 3;
  const s = (light - 0.0894841775 * a - 1.291485548 * b) ** 3;
  return [
    encode(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s),
    encode(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s),
    encode(-0.0041960863 * l - 0.7034186147 * m + 1.707614701 * s),
  ];
}

/** Linear light to sRGB, clipped to what a screen shows (IEC 61966-2-1). */
function encode(linear: number): number {
  const clipped = Math.min(1, Math.max(0, linear));
  return clipped <= 0.0031308 ? 12.92 * clipped : 1.055 * clipped ** (1 / 2.4) - 0.055;
}

/** `share` is strain over the end of the scale, -1 (compression) to 1 (tension). */
export function strainColour(share: number): Rgb {
  const size = Math.min(1, Math.abs(share));
  const { a, b } = between(share < 0 ? COMPRESSION : TENSION, size);
  return fromOklab(LIGHT + (DARK - LIGHT) * size, a, b);
}

export const cssColour = ([r, g, b]: Rgb): string =>
  `rgb(${Math.round(255 * r)} ${Math.round(255 * g)} ${Math.round(255 * b)})`;

/** CSS gradient from no strain to the end of the scale. */
export function strainGradient(sign: 1 | -1, direction: string): string {
  const stops = Array.from({ length: 13 }, (_, k) => cssColour(strainColour((sign * k) / 12)));
  return `linear-gradient(${direction}, ${stops.join(', ')})`;
}

/**
 * End of the scale. With an allowable strain the scale reaches past it, so that a colour means a share of what is
 * allowed and designs can be compared; otherwise it ends at the peak.
 */
export function scaleEnd(peak: number, allowable: number | null): number {
  const end = Math.max(peak, allowable === null ? 0 : 1.25 * allowable);
  return end > 0 ? end : 0.01;
}
