import { z } from 'zod';
import type { DesignFilter } from '@/lib/access/designs';
import { VERDICTS } from './responses';

const word = z.string().trim().min(1).max(60).optional().catch(undefined);

/** The words of a list's address. What makes no sense is as if it were not there: a link never fails. */
const filter = z.object({
  search: z.string().trim().min(1).max(80).optional().catch(undefined),
  family: word,
  material: word,
  verdict: z.enum(VERDICTS).optional().catch(undefined),
  deleted: z
    .literal('yes')
    .optional()
    .catch(undefined)
    .transform((text) => text === 'yes'),
  sort: z.enum(['changed', 'name', 'family', 'material', 'verdict']).catch('changed'),
  order: z.enum(['up', 'down']).optional().catch(undefined),
  page: z.coerce.number().int().min(1).max(100).catch(1),
});

export type DesignWords = z.infer<typeof filter>;

export const readDesignWords = (words: URLSearchParams): DesignWords =>
  filter.parse(Object.fromEntries(words));

export function designFilter({ order, ...rest }: DesignWords): DesignFilter {
  return { ...rest, descending: order === undefined ? rest.sort === 'changed' : order === 'down' };
}
