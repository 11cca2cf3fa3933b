import { z } from 'zod';
import { KIND_NAME, type Kind } from '@/generators/contract';
import type { CheckResult } from '@/lib/access/check';
import type { FamilyDescription } from '@/lib/access/families';
import { materialSchema, sourceSchema } from '@/lib/materials/schema';
import { UNIT_SYMBOL, type Unit } from '@/lib/units';
import type { Problem } from '../problem';

const unit = z
  .enum(Object.keys(UNIT_SYMBOL) as [Unit, ...Unit[]])
  .meta({ description: 'Strain is a fraction, angles are degrees.' });
const source = sourceSchema;
const layers = z.enum(['along', 'across']);
const use = z.strictObject({
  opening: z.enum(['once', 'sometimes', 'often']),
  layers,
  temperature: z.number(),
});
export const VERDICTS = ['within-limit', 'close-to-limit', 'over-limit', 'not-known'] as const;
const verdict = z.enum(VERDICTS);
const known = z.number().nullable();
const values = z.record(z.string(), z.unknown());

const figure = z.strictObject({
  id: z.string(),
  label: z.string(),
  unit,
  value: known.meta({ description: 'Corrected figure, on which the verdict stands; null: not known' }),
  handbook: known.meta({ description: 'Closed form as printed' }),
  low: known,
  high: known,
  limit: known,
  limitKind: z.enum(['max', 'min']),
  verdict: verdict.nullable(),
  because: z.string(),
  source,
});

const axis = z.strictObject({ label: z.string(), unit });
const points = z.array(z.tuple([known, known]));
const curve = z.strictObject({
  id: z.string(),
  label: z.string(),
  x: axis,
  y: axis,
  points,
  band: points.optional(),
});

const allowable = z.strictObject({
  value: known,
  factors: z.array(
    z.strictObject({
      id: z.enum(['short-term', 'use', 'layers', 'temperature']),
      label: z.string(),
      value: known,
      source,
      note: z.string().optional(),
    }),
  ),
  because: z.string(),
  stiffness: z
    .enum(['as-given', 'softer', 'not-known'])
    .meta({ description: 'What forces from the moduli of 23 °C are worth at the temperature of use' }),
});

const computed = z.strictObject({
  method: z.enum(['linear', 'non-linear']),
  fellBack: z
    .string()
    .nullable()
    .meta({ description: 'Why the answer is linear although large displacement was asked for' }),
  strain: z.number().meta({ description: 'Peak strain as a fraction, without sign' }),
  kind: z.enum(['tension', 'compression']),
  body: z.string(),
  place: z
    .tuple([z.number(), z.number(), z.number()])
    .meta({ description: 'Of the peak on the body at rest, mm' }),
  force: known.meta({ description: 'N, or N mm for a moment; null where the modulus is not known' }),
  formula: known.meta({ description: 'Peak strain of the corrected formula' }),
  difference: known.meta({ description: 'Computed over formula, less 1' }),
  likely: z.string().nullable().meta({ description: 'Likely reason of a difference over 0.1' }),
  unstable: z.boolean().meta({ description: 'The part snaps through on the way' }),
  errorEstimate: z.number().meta({ description: 'Of the peak, from the mesh, as a fraction of it' }),
  elements: z.int(),
  unknowns: z.int().meta({ description: 'Degrees of freedom' }),
});

export const checkResponse = z.strictObject({
  method: z.enum(['closed', 'fe', 'both']),
  computed: z
    .union([computed, z.strictObject({ none: z.string() })])
    .nullable()
    .meta({ description: 'Finite elements on the outline, or why there are none; null where not asked for' }),
  verdict,
  governing: z.string().meta({ description: 'Id of the figure shown on the strain band' }),
  headline: z.array(z.string()),
  figures: z.array(figure),
  curves: z.array(curve),
  allowable,
  warnings: z.array(z.strictObject({ id: z.string(), field: z.string(), message: z.string() })),
  family: z.string(),
  parameters: values,
  material: z.string(),
  use,
}) satisfies z.ZodType<CheckResult>;

export const familyResponse = z.strictObject({
  id: z.string(),
  kind: z.enum(Object.keys(KIND_NAME) as [Kind, ...Kind[]]),
  name: z.string(),
  summary: z.string(),
  rightWhen: z.string(),
  wrongWhen: z.string(),
  bendsBy: z.string(),
  parameters: values.meta({ description: 'JSON Schema with title, unit, bounds, step, group, default' }),
  groups: z.array(z.strictObject({ id: z.string(), label: z.string() })),
  relations: z.array(
    z.strictObject({
      id: z.string(),
      field: z.string(),
      severity: z.enum(['refuse', 'warn']),
      text: z.string(),
    }),
  ),
  presets: z.array(
    z.strictObject({
      id: z.string(),
      name: z.string(),
      purpose: z.string(),
      material: z.string(),
      use,
      values,
    }),
  ),
  stances: z.array(z.strictObject({ id: z.string(), label: z.string(), because: z.string(), layers })),
}) satisfies z.ZodType<FamilyDescription>;

export const materialResponse = materialSchema.meta({
  description: 'A plastic in one state. Null: not known, the reason under gaps where there is one.',
});
export const familiesResponse = z.strictObject({ families: z.array(familyResponse) });
export const materialsResponse = z.strictObject({ materials: z.array(materialResponse) });

export const healthResponse = z.strictObject({ status: z.literal('ok'), materials: z.int() });

export const problemSchema = z
  .strictObject({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    detail: z.string(),
    instance: z.string(),
    requestId: z.string(),
    errors: z
      .array(
        z.strictObject({
          field: z.string(),
          message: z.string(),
          bound: z.number().optional(),
          unit: z.string().optional(),
          min: z.number().optional(),
          max: z.number().optional(),
        }),
      )
      .optional(),
  })
  .meta({ description: 'Problem details as of RFC 9457.' }) satisfies z.ZodType<Problem>;
