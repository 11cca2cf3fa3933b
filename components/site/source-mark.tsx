import { MARK_WORDS } from '@/components/studio/source-note';
import { classNames } from '@/components/ui/class-names';
import type { Mark, Source } from '@/lib/materials/types';

/** How far a mark can be relied on: read or computed from the text, told by another, or by nobody in print. */
const WEIGHT: Readonly<Record<Mark, string>> = {
  verified: 'bg-ok-soft text-ok',
  computed: 'bg-ok-soft text-ok',
  derived: 'bg-petrol-soft text-petrol',
  quoted: 'bg-near-soft text-near',
  memory: 'bg-near-soft text-near',
  'common-practice': 'bg-unknown-soft text-unknown',
  given: 'bg-unknown-soft text-unknown',
};

export const SourceMark = ({ mark }: { mark: Mark }) => (
  <span
    className={classNames('whitespace-nowrap rounded-full px-2.5 py-0.5 font-semibold text-xs', WEIGHT[mark])}
  >
    {MARK_WORDS[mark]}
  </span>
);

export const SourceLine = ({ source }: { source: Source }) => (
  <p className="flex flex-wrap items-center gap-x-2 gap-y-1 text-muted text-sm">
    <span>{source.text}</span>
    <SourceMark mark={source.mark} />
  </p>
);
