'use client';
import { type RefObject, useEffect, useState } from 'react';

const TOKENS = ['paper', 'sheet', 'ink', 'muted', 'hair', 'edge', 'petrol', 'marker', 'over'] as const;

/** The page's colours as the browser resolves them, day or night; `shade` is the darker of paper and ink. */
export type Palette = Readonly<Record<(typeof TOKENS)[number] | 'shade', string>>;

/** Any opaque CSS colour as `#rrggbb`, which is how a canvas gives back what it is told to fill with. */
function hexOf(pen: CanvasRenderingContext2D | null, colour: string): string {
  if (!pen) return colour;
  pen.fillStyle = '#808080';
  pen.fillStyle = colour;
  return String(pen.fillStyle);
}

function read(element: Element): Palette {
  const style = getComputedStyle(element);
  const pen = document.createElement('canvas').getContext('2d');
  const colours = Object.fromEntries(
    TOKENS.map((token) => [token, hexOf(pen, style.getPropertyValue(`--${token}`).trim())]),
  ) as Record<(typeof TOKENS)[number], string>;
  const bright = (hex: string) => channels(hex).reduce((sum, value) => sum + value, 0);
  const shade =
    bright(colours.ink) < bright(colours.paper) ? colours.ink : mix(colours.paper, '#000000', 0.7);
  return { ...colours, shade };
}

const channels = (hex: string): number[] => [1, 3, 5].map((at) => Number.parseInt(hex.slice(at, at + 2), 16));

/** Follows the system's and the page's choice of light or dark. */
export function usePalette(element: RefObject<Element | null>): Palette | null {
  const [palette, setPalette] = useState<Palette | null>(null);
  useEffect(() => {
    const refresh = () => element.current && setPalette(read(element.current));
    refresh();
    const dark = matchMedia('(prefers-color-scheme: dark)');
    const chosen = new MutationObserver(refresh);
    dark.addEventListener('change', refresh);
    chosen.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme', 'class'] });
    return () => {
      dark.removeEventListener('change', refresh);
      chosen.disconnect();
    };
  }, [element]);
  return palette;
}

/** Mixes two `#rrggbb` colours; share 0 gives the first. */
export function mix(first: string, second: string, share: number): string {
  const [p, q] = [channels(first), channels(second)];
  return `#${p
    .map((value, k) =>
      Math.round(value + share * (q[k]! - value))
        .toString(16)
        .padStart(2, '0'),
    )
    .join('')}`;
}

/** What bends is marker yellow, what receives it petrol. */
export const bodyColour = (palette: Palette, index: number): string =>
  index === 0 ? mix(palette.marker, palette.sheet, 0.12) : mix(palette.petrol, palette.sheet, 0.35);
