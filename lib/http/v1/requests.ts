import { z } from 'zod';
import { USE_FIELDS } from '@/generators/url-state';
import type { FieldUnits } from '../issues';

export const familyId = z
  .string({ error: 'family must be the id of a part family' })
  .min(1, 'family must be the id of a part family')
  .max(60, 'family must have at most 60 characters')
  .meta({ description: 'Id of a part family, see GET /api/v1/families', examples: ['cantilever-hook'] });

export const materialId = z
  .string({ error: 'material must be the id of a material, or an object with its id' })
  .min(1, 'material must be the id of a material')
  .max(60, 'material must have at most 60 characters');

const bounded = (name: string, unit: string, min: number, max: number) => {
  const withUnit = unit === '' ? '' : ` ${unit}`;
  return z
    .number({ error: `${name} must be a number${unit && ` in ${unit}`}` })
    .min(min, `${name} must be at least ${min}${withUnit}`)
    .max(max, `${name} must be at most ${max}${withUnit}`)
    .meta({ unit });
};

const frictionFigure = bounded('Friction', '', 0.01, 2);
const frictionBand = z
  .strictObject({ value: frictionFigure, low: frictionFigure, high: frictionFigure })
  .refine(({ value, low, high }) => low <= value && value <= high, 'Friction must lie inside its band');

const materialWithOverrides = z
  .strictObject({
    id: materialId,
    secantModulus: bounded('Secant modulus', 'MPa', 0.1, 20_000).optional(),
    friction: z
      .union([frictionFigure, frictionBand], {
        error: 'friction must be a number, or a band of value, low and high',
      })
      .optional(),
    allowableStrain: bounded('Allowable strain', 'as a fraction', 0.0001, 2).optional(),
  })
  .meta({
    description:
      'A material with single properties given: secant modulus (MPa, used as it stands), friction (one figure carries a band of +- 50 %), allowable strain (fraction, final: no factor for use, layers or temperature is applied to it).',
  });

export const parameters = z
  .record(z.string().max(60), z.unknown())
  .refine((given) => Object.keys(given).length <= 200, 'parameters must have at most 200 entries')
  .meta({ description: 'By name, as in the JSON Schema of the family; left out ones take the default.' });

const { temperature } = USE_FIELDS;
export const use = z
  .strictObject({
    opening: z
      .enum(['once', 'sometimes', 'often'], 'opening must be one of once, sometimes, often')
      .optional(),
    layers: z.enum(['along', 'across'], 'layers must be one of along, across').optional(),
    temperature: bounded('Temperature', '°C', temperature.min, temperature.max).optional(),
  })
  .meta({ description: 'How the part is used; left out: opened often, layers along the strain, 23 °C.' });

export const checkRequest = z.strictObject({
  family: familyId,
  parameters: parameters.optional(),
  material: z.union([materialId, materialWithOverrides], {
    error: 'material must be the id of a material, or an object with its id',
  }),
  use: use.optional(),
  method: z.enum(['closed', 'fe', 'both'], 'method must be one of closed, fe, both').optional().meta({
    description:
      'What the verdict stands on. closed (default): the corrected formulas. both: finite elements on the outline where the part bends as a plane shape, else the formulas. fe: finite elements, not known where there are none.',
  }),
});

const bodyName = z
  .string({ error: 'bodies must be names of bodies' })
  .min(1, 'bodies must be names of bodies')
  .max(60, 'a name in bodies must have at most 60 characters');
const bodies = z
  .array(bodyName, { error: 'bodies must be a list of names' })
  .min(1, 'bodies must name at least 1 body')
  .max(20, 'bodies must name at most 20 bodies');

const wish = {
  family: familyId,
  format: z.enum(['stl', '3mf'], 'format must be one of stl, 3mf'),
  quality: z.enum(['preview', 'export'], 'quality must be one of preview, export').default('export'),
  stance: z
    .string({ error: 'stance must be the id of a stance' })
    .max(60, 'stance must have at most 60 characters')
    .optional()
    .meta({ description: 'How the part lies on the bed; the best of the family where left out' }),
  name: z
    .string({ error: 'name must be a text' })
    .trim()
    .min(1, 'name must have at least 1 character')
    .max(80, 'name must have at most 80 characters')
    .optional()
    .meta({ description: 'What the design is called, for the file name and the title inside' }),
};

export const exportRequest = z.strictObject({
  ...wish,
  parameters: parameters.optional(),
  bodies: bodies.optional().meta({ description: 'Names of the bodies wanted; all where left out' }),
  material: materialId.optional().meta({ description: 'Id of the material, named in 3MF files' }),
});

/** The words of an export link that are not the design itself; bodies are parted by commas. */
export const exportWords = z.object({
  ...wish,
  bodies: z
    .string()
    .transform((text) => text.split(','))
    .pipe(bodies)
    .optional(),
});
export const EXPORT_WORDS = Object.keys(exportWords.shape);

export const CHECK_UNITS: FieldUnits = {
  'use.temperature': 'degC',
  'material.secantModulus': 'MPa',
  'material.allowableStrain': 'strain',
  'material.friction': 'ratio',
};

export const idParams = z.object({ id: z.string().min(1).max(60, 'The id must have at most 60 characters') });
