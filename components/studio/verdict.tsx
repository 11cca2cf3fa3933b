import { classNames } from '@/components/ui/class-names';
import { type Figure, VERDICT_WORDS, type Verdict } from '@/generators/report';
import { significant } from '@/lib/units';

const INK: Readonly<Record<Verdict, string>> = {
  'within-limit': 'text-ok',
  'close-to-limit': 'text-near',
  'over-limit': 'text-over',
  'not-known': 'text-unknown',
};

const WASH: Readonly<Record<Verdict, string>> = {
  'within-limit': 'bg-ok-soft',
  'close-to-limit': 'bg-near-soft',
  'over-limit': 'bg-over-soft',
  'not-known': 'bg-unknown-soft',
};

const SHAPE: Readonly<Record<Verdict, { outline: string; sign: string; dash?: string }>> = {
  'within-limit': {
    outline: 'M10 1.8a8.2 8.2 0 1 1 0 16.4a8.2 8.2 0 1 1 0-16.4z',
    sign: 'M6 10.4l2.8 2.8L14 7.4',
  },
  'close-to-limit': { outline: 'M10 2.2l8.4 15H1.6z', sign: 'M10 7.6v4.8M10 14.4v.6' },
  'over-limit': {
    outline: 'M6.7 1.8h6.6l4.9 4.9v6.6l-4.9 4.9H6.7l-4.9-4.9V6.7z',
    sign: 'M7 7l6 6M13 7l-6 6',
  },
  'not-known': {
    outline: 'M10 1.8a8.2 8.2 0 1 1 0 16.4a8.2 8.2 0 1 1 0-16.4z',
    sign: 'M7.6 7.7c.2-1.4 1.2-2.1 2.5-2.1 1.4 0 2.4.9 2.4 2.1 0 1.8-2.4 1.8-2.4 3.8M10.1 14v.6',
    dash: '2.4 2.2',
  },
};

export function VerdictIcon({ verdict, size = 20 }: { verdict: Verdict; size?: number }) {
  const { outline, sign, dash } = SHAPE[verdict];
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 20 20"
      aria-hidden="true"
      fill="none"
      className={classNames('shrink-0', INK[verdict])}
      stroke="currentColor"
      strokeWidth="1.7"
      strokeLinecap="round"
      strokeLinejoin="round"
    >
      <path d={outline} strokeDasharray={dash} />
      <path d={sign} strokeWidth="2" />
    </svg>
  );
}

export function VerdictMark({ verdict, more }: { verdict: Verdict; more?: string }) {
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-1.5 rounded-full py-0.5 pr-3 pl-1 font-semibold text-sm',
        INK[verdict],
        WASH[verdict],
      )}
    >
      <VerdictIcon verdict={verdict} />
      <span>
        {VERDICT_WORDS[verdict]}
        {more && `, ${more}`}
      </span>
    </span>
  );
}

/** How far a figure is from its limit, in words; nothing where either is not known. */
export function marginWords({ value, limit, limitKind }: Figure): string | undefined {
  if (value === null || limit === null || limit <= 0 || !Number.isFinite(value)) return undefined;
  const margin = limitKind === 'max' ? (limit - value) / limit : (value - limit) / limit;
  const percent = Math.abs(margin) * 100;
  const amount = percent < 1 ? 'under 1 %' : `${Math.round(percent)} %`;
  if (limitKind === 'min' && value >= 3 * limit) return `${significant(value / limit, 2)} times as much`;
  if (margin >= 0) return `${amount} to spare`;
  return limitKind === 'max' && value >= 2 * limit
    ? `${(value / limit).toFixed(1)} times the limit`
    : `${amount} ${limitKind === 'max' ? 'too much' : 'too little'}`;
}

export const VERDICT_FILL: Readonly<Record<Verdict, string>> = {
  'within-limit': 'bg-petrol',
  'close-to-limit': 'bg-near',
  'over-limit': 'bg-over',
  'not-known': 'bg-unknown',
};
