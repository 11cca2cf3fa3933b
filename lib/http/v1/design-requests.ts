import { z } from 'zod';
import { familyId, materialId, parameters, use } from './requests';

const CONTROL = /[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]/u;

export const designName = z
  .string({ error: 'name must be a text' })
  .trim()
  .min(1, 'name must have at least 1 character')
  .max(80, 'name must have at most 80 characters')
  .refine((text) => !CONTROL.test(text), 'name must be a single line of plain text')
  .meta({ description: 'What the member calls the design' });

const revision = z
  .int('revision must be a whole number')
  .min(1, 'revision must be at least 1')
  .max(1e9, 'revision must be at most 1000000000')
  .meta({ description: 'The revision the change was made on; 409 where the design has moved on' });

const content = {
  family: familyId,
  material: materialId,
  use: use.optional(),
  parameters: parameters.optional(),
};

export const newDesignRequest = z.strictObject({
  name: designName,
  ...content,
  startedFrom: z
    .string({ error: 'startedFrom must be the id of a version' })
    .max(60, 'startedFrom must have at most 60 characters')
    .optional()
    .meta({ description: 'Published version of a preset the design starts from' }),
});

export const saveDesignRequest = z.strictObject({
  revision,
  ...content,
  apart: z
    .boolean()
    .optional()
    .meta({ description: 'A state of its own in the history, however soon after the last' }),
});
export const renameRequest = z.strictObject({ name: designName });
export const restoreRequest = z.strictObject({ revision });

export const stateParams = z.object({
  id: z.string().min(1).max(60, 'The id must have at most 60 characters'),
  state: z.coerce.number().int().min(1).max(1e9),
});
