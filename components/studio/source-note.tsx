import { Note } from '@/components/ui/note';
import type { Mark, Source } from '@/lib/materials/types';

export const MARK_WORDS: Readonly<Record<Mark, string>> = {
  verified: 'read in the source',
  quoted: 'as quoted in another text',
  computed: 'published formula, computed here',
  derived: 'derived here, checked numerically',
  memory: 'from memory of the source',
  'common-practice': 'common practice, no source',
  given: 'given by you',
};

/** Where a figure comes from, on demand. */
export function SourceNote({ source, of }: { source: Source; of: string }) {
  return (
    <Note
      aria-label={`Source of ${of}`}
      className="min-h-6 rounded-field text-muted text-xs underline decoration-dotted underline-offset-4 hover:text-ink pointer-coarse:min-h-9"
      trigger="source"
    >
      <SourceText source={source} />
    </Note>
  );
}

export function SourceText({ source }: { source: Source }) {
  return (
    <>
      <p>{source.text}</p>
      <p className="mt-1 text-muted">{MARK_WORDS[source.mark]}</p>
    </>
  );
}
