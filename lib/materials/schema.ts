import { z } from 'zod';
import { UNIT_SYMBOL, type Unit } from '@/lib/units';
import type { Material } from './types';

const text = (max: number) => z.string().trim().min(1).max(max);
const unit = z.enum(Object.keys(UNIT_SYMBOL) as [Unit, ...Unit[]]);
const MARKS = ['verified', 'quoted', 'computed', 'derived', 'memory', 'common-practice', 'given'] as const;

export const sourceSchema = z.strictObject({ text: text(600), mark: z.enum(MARKS) });

const ordered = (given: { value: number; low?: number | undefined; high?: number | undefined }) =>
  (given.low ?? given.value) <= given.value && given.value <= (given.high ?? given.value);
const OUTSIDE = 'the value lies outside its own range';

export const quantitySchema = z
  .strictObject({
    value: z.number(),
    unit,
    low: z.number().optional(),
    high: z.number().optional(),
    source: sourceSchema,
  })
  .refine(ordered, OUTSIDE);

export const bandSchema = z
  .strictObject({ value: z.number(), low: z.number(), high: z.number(), unit, source: sourceSchema })
  .refine(ordered, OUTSIDE);

const rangeSchema = z.strictObject({ low: z.number(), high: z.number(), unit, source: sourceSchema });
const known = quantitySchema.nullable();

const secantSchema = z.strictObject({
  kind: z.enum(['softening', 'constant']),
  slope: z.number().min(0),
  validTo: z.number().positive(),
  assumed: z.boolean(),
  source: sourceSchema,
});

const judgementSchema = z.strictObject({
  rating: z.enum(['good', 'fair', 'poor', 'unknown']),
  because: text(300),
  source: sourceSchema,
});

const printSchema = z.strictObject({
  nozzle: rangeSchema.nullable(),
  bed: rangeSchema.nullable(),
  enclosure: z.enum(['needed', 'helpful', 'not-needed']),
  bedSurface: text(200),
  drying: z.strictObject({ temperature: rangeSchema, hours: rangeSchema }).nullable(),
  warp: z.enum(['low', 'medium', 'high', 'very-high', 'unknown']),
  source: sourceSchema,
});

export const priceSchema = z.strictObject({
  perKg: z.number().positive().max(10_000),
  currency: z.literal('EUR'),
  asOf: z.iso.date(),
  source: sourceSchema,
});

/** A plastic as it is stored and sent. */
export const materialSchema = z.strictObject({
  id: z
    .string()
    .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/)
    .max(60),
  name: text(120),
  shortName: text(60),
  process: z.enum(['printed', 'moulded']),
  summary: text(300),
  flexuralModulus: known,
  tensileModulus: known,
  tensileModulusAcross: known,
  secant: secantSchema,
  poisson: quantitySchema,
  yieldStrain: known,
  tensileStrength: known,
  tensileStrengthAcross: known,
  breakStrain: known.optional(),
  breakStrainAcross: known.optional(),
  allowableOnce: known,
  allowableOften: known,
  allowableAcross: known,
  friction: bandSchema,
  density: known,
  heatDeflection: known,
  glassTransition: known,
  continuousService: known,
  thermalExpansion: known,
  shrinkage: known,
  print: printSchema.nullable(),
  weather: judgementSchema,
  chemicals: judgementSchema,
  gluing: judgementSchema,
  foldEndurance: z.strictObject({
    class: z.enum(['long-life', 'thousands', 'few', 'unknown']),
    because: text(300),
    source: sourceSchema,
  }),
  drawsWhenFolded: z.boolean(),
  price: priceSchema.nullable(),
  gaps: z.record(z.string().max(60), text(300)).optional(),
}) satisfies z.ZodType<Material>;
