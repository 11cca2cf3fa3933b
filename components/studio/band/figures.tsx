import { classNames } from '@/components/ui/class-names';
import type { Figure } from '@/generators/report';
import { formatQuantity } from '@/lib/units';
import { formulaBeside, isComputedFor, type Standing } from '../computed/standing';

const SIGN = {
  handbook: 'M1 2h10L6 9z',
  corrected: 'M6 1l5 5-5 5-5-5z',
  computed: 'M2 1h8v10H2z',
} as const;

type Name = keyof typeof SIGN;

interface Told {
  readonly name: Name;
  readonly text: string;
  /** the verdict stands on this one */
  readonly bears: boolean;
}

/** The mark of a figure on the scale and beside it. */
export function FigureSign({ name, filled = false }: { name: Name; filled?: boolean }) {
  return (
    <svg viewBox="0 0 12 12" width="12" height="12" aria-hidden="true" className="block shrink-0">
      <path
        d={SIGN[name]}
        fill={filled ? 'currentColor' : 'var(--sheet)'}
        stroke="currentColor"
        strokeWidth="1.3"
      />
    </svg>
  );
}

function told(figure: Figure, standing: Standing): readonly Told[] {
  const text = (value: number) => formatQuantity(value, figure.unit);
  const beside = formulaBeside(standing, figure.id);
  const isComputed = beside !== null;
  const corrected = isComputed ? beside : figure.value;
  const list: Told[] = [];
  if (figure.handbook !== null) list.push({ name: 'handbook', text: text(figure.handbook), bears: false });
  if (corrected !== null) list.push({ name: 'corrected', text: text(corrected), bears: !isComputed });
  if (isComputed) list.push({ name: 'computed', text: text(figure.value!), bears: true });
  else if (isComputedFor(standing, figure.id)) list.push({ name: 'computed', text: '…', bears: false });
  return list;
}

/** Handbook, corrected and computed figure side by side; the one that bears the verdict is marked. */
export function Figures({ figure, standing }: { figure: Figure; standing: Standing }) {
  return (
    <dl className="flex flex-wrap gap-x-6 gap-y-0.5 text-sm">
      {told(figure, standing).map(({ name, text, bears }) => (
        <div key={name} className="flex items-center gap-1.5" data-figure={name}>
          <dt className="flex items-center gap-1.5 text-muted">
            <FigureSign name={name} filled={bears} />
            {name}
          </dt>
          <dd className={classNames('font-mono', bears && 'marked font-semibold')}>
            {text}
            {bears && <span className="sr-only"> (bears the verdict)</span>}
          </dd>
        </div>
      ))}
    </dl>
  );
}
