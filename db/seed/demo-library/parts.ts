import { FAMILIES } from '@/generators';
import type { Family } from '@/generators/contract';
import { parseParameters } from '@/generators/parameters';
import { materialById } from '@/lib/materials/data';
import type { Use } from '@/lib/materials/types';
import { VARIANTS } from './variants';

export interface DemoPart {
  readonly family: Family;
  readonly title: string;
  readonly purpose: string;
  readonly material: string;
  readonly use: Use;
  readonly values: Record<string, unknown>;
  /** place in the list of the part it started from */
  readonly from: number | null;
}

interface Given extends Omit<DemoPart, 'values'> {
  readonly given: object;
}

/** A part that is valid; a variant that a family no longer takes is left out. */
function partOf({ given, ...rest }: Given): DemoPart[] {
  const parsed = parseParameters(rest.family.parameters, given);
  return parsed.ok && materialById(rest.material) ? [{ ...rest, values: parsed.values }] : [];
}

/** Every preset of every family, then what members made of them. */
export async function demoParts(): Promise<DemoPart[]> {
  const families = await Promise.all(FAMILIES.map(({ load }) => load()));
  const presets = families.flatMap((family) => family.presets.map((preset) => ({ family, preset })));
  const parts = presets.flatMap(({ family, preset }) =>
    partOf({
      family,
      title: preset.name,
      purpose: preset.purpose,
      material: preset.material,
      use: preset.use,
      given: preset.values as object,
      from: null,
    }),
  );
  const variants = VARIANTS.flatMap(({ family: id, of, title, purpose, material, values }) => {
    const from = presets.findIndex(({ family, preset }) => family.about.id === id && preset.id === of);
    const origin = presets[from];
    if (!origin) return [];
    const { family, preset } = origin;
    const given = { ...(preset.values as object), ...values };
    return partOf({
      family,
      title,
      purpose,
      material: material ?? preset.material,
      use: preset.use,
      given,
      from,
    });
  });
  return [...parts, ...variants];
}
