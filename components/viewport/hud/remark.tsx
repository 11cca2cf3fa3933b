import type { ViewportState } from '../types';

interface RemarkProps {
  readonly state: ViewportState;
  /** mm between the layer lines shown; null off the bed */
  readonly layerStep: number | null;
}

function wordsOf({ message }: ViewportState, layerStep: number | null): string | null {
  if (message) return message;
  return layerStep === null
    ? null
    : `Layers lie level: a line every ${layerStep} mm of height. Bed squares are 10 mm.`;
}

/** What there is to say about the picture. */
export function Remark({ state, layerStep }: RemarkProps) {
  return (
    <p
      role="status"
      className="pointer-events-none w-fit max-w-full rounded-field bg-sheet/90 px-2 py-1 text-[13px] text-muted empty:hidden"
    >
      {wordsOf(state, layerStep)}
    </p>
  );
}
