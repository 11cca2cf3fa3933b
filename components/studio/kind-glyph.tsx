import type { Kind } from '@/generators/contract';

/** What stands still in ink, what gives in marker. */
const GLYPH: Readonly<Record<Kind, { still: string; gives: string }>> = {
  straps: { still: 'M6 40h9M33 40h9M6 40v-6M42 40v-6', gives: 'M15 40C15 14 33 14 33 40' },
  clips: { still: 'M6 42h36M31 8h11v10H31', gives: 'M12 42C12 28 16 18 27 13l1 6h-6' },
  caps: { still: 'M16 42V26M32 42V26M16 31l16-3M16 37l16-3', gives: 'M10 24V9h28v15' },
  hinges: { still: 'M4 34h15v7H4zM29 34h15v7H29z', gives: 'M19 36c3-7 7-7 10 0' },
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
