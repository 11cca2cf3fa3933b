import { type Entries, repeatedIn } from '@/generators/url-state';
import type { FileWish } from '@/lib/access/export';
import { InvalidInput } from '@/lib/errors';
import { issuesOf } from '../issues';
import { EXPORT_WORDS, exportWords } from './requests';

/** Of two values for one word either could be meant. */
function refuseRepeated(words: readonly string[]): void {
  const repeated = repeatedIn(words);
  if (repeated.length === 0) return;
  throw new InvalidInput(
    repeated.map((field) => ({ field, message: `${field} must be given at most once` })),
  );
}

/** Splits the query of an export link into what file is wanted and the words of the design. */
export function readExportLink(query: string): { wish: FileWish; entries: Entries } {
  const words = [...new URLSearchParams(query)];
  refuseRepeated(words.map(([word]) => word));
  const own = words.filter(([word]) => EXPORT_WORDS.includes(word));
  const design = words.filter(([word]) => !EXPORT_WORDS.includes(word));
  const wish = exportWords.safeParse(Object.fromEntries(own));
  if (!wish.success) throw new InvalidInput(issuesOf(wish.error, 'address'));
  return { wish: wish.data, entries: Object.fromEntries(design) };
}
