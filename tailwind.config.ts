import type { Config } from 'tailwindcss';

const token = (name: string) => `var(--${name})`;

export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        paper: token('paper'),
        grid: token('grid'),
        sheet: token('sheet'),
        tint: token('tint'),
        ink: token('ink'),
        muted: token('muted'),
        hair: token('hair'),
        edge: token('edge'),
        petrol: token('petrol'),
        'petrol-soft': token('petrol-soft'),
        marker: token('marker'),
        'marker-ink': token('marker-ink'),
        clay: token('clay'),
        hatch: token('hatch'),
        ok: token('ok'),
        'ok-soft': token('ok-soft'),
        near: token('near'),
        'near-soft': token('near-soft'),
        over: token('over'),
        'over-soft': token('over-soft'),
        unknown: token('unknown'),
        'unknown-soft': token('unknown-soft'),
      },
      fontFamily: {
        heading: ['var(--font-heading)', 'sans-serif'],
        text: ['var(--font-text)', 'sans-serif'],
        mono: ['var(--font-mono)', 'monospace'],
      },
      borderRadius: { sheet: '4px', field: '3px' },
      boxShadow: { lift: token('lift') },
    },
  },
} satisfies Config;
