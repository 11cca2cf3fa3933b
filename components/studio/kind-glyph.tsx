import type { Kind } from '@/generators/contract';

/** What stands still in ink, what gives in marker. */
const GLYPH: Readonly<Record<Kind, { still: string; gives: string }>> = {
  straps: { still: 'M24 14a10 10 0 1 1-.01 0z', gives: 'M31 40A17 17 0 1 1 40 29L44 38' },
  clips: { still: 'M5 44h38M5 24h10M28 24h15', gives: 'M20 41V9l9 8h-8' },
  caps: { still: 'M16 42V26M32 42V26M16 31l16-3M16 37l16-3', gives: 'M10 24V9h28v15' },
  hinges: { still: 'M4 40L18 22M44 40L30 22', gives: 'M18 22c3-7 9-7 12 0' },
  mounts: { still: 'M8 8h32M8 42h32', gives: 'M16 8c8 8-8 12 0 17s-8 9 0 17M32 8c8 8-8 12 0 17s-8 9 0 17' },
  coupons: { still: 'M5 14h38v20H5z', gives: 'M12 24h.1M20 24h2M29 24h3.5M38 24h.5' },
};

export function KindGlyph({ kind, size = 48 }: { kind: Kind; size?: number }) {
  const { still, gives } = GLYPH[kind];
  return (
    <svg width={size} height={size} viewBox="0 0 48 48" aria-hidden="true" fill="none" strokeLinejoin="round">
      <path d={gives} stroke="var(--marker)" strokeWidth="5.5" strokeLinecap="round" />
      <path d={still} stroke="currentColor" strokeWidth="3.5" />
    </svg>
  );
}
