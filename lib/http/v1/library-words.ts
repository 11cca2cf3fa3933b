import { z } from 'zod';
import { KIND_NAME } from '@/generators/contract';
import { VERDICTS } from './responses';

const KINDS = Object.keys(KIND_NAME) as [keyof typeof KIND_NAME, ...(keyof typeof KIND_NAME)[]];
const SIZES = [50, 100, 180, 250] as const;

const yes = z
  .literal('yes')
  .optional()
  .catch(undefined)
  .transform((text) => text === 'yes');

/** The words of a library address. What makes no sense is as if it were not there: a link never fails. */
const words = z.object({
  text: z.string().trim().min(1).max(100).optional().catch(undefined),
  kind: z.enum(KINDS).optional().catch(undefined),
  material: z.string().trim().min(1).max(60).optional().catch(undefined),
  verdict: z.enum(VERDICTS).optional().catch(undefined),
  fits: z.coerce.number().pipe(z.literal(SIZES)).optional().catch(undefined),
  open: yes,
  favourites: yes,
  sort: z.enum(['best', 'newest', 'worked', 'favourites', 'title']).optional().catch(undefined),
  after: z.string().max(140).optional().catch(undefined),
});

export type LibraryWords = z.infer<typeof words>;

export const readLibraryWords = (query: URLSearchParams): LibraryWords =>
  words.parse(Object.fromEntries(query));

const wholeNumber = z.coerce.number().int().min(1).max(100_000);

/** The version an address names; none where it names none, or nothing that could be one. */
export const readVersion = (given: unknown): number | undefined =>
  wholeNumber.optional().catch(undefined).parse(given);

export const slugParams = z.object({
  slug: z.string().min(1).max(80, 'The address must have at most 80 characters'),
});
