import type { Rgb } from '@/components/viewport/drawing/ramp';
import { arrange, type Moved } from '@/components/viewport/mesh/arrange';
import { prepare } from '@/components/viewport/mesh/prepare';
import type { Family } from '@/generators/contract';
import { bedPlacements } from '@/generators/lay-on-bed';
import { createKernelHost, type KernelHost } from '@/lib/geometry/host';
import type { BuiltBody, Quality } from '@/lib/geometry/kernel';
import { materialById } from '@/lib/materials/data';

let host: Promise<KernelHost> | null = null;

/** Coarser than a preview: the picture is small. */
const PICTURE: Quality = { name: 'preview', segmentsPerTurn: 24, segmentsPerFillet: 6 };

/** Bodies of a part for a page that is written once, when the site is built. */
export async function bodiesOf(family: Family, values: unknown): Promise<BuiltBody[]> {
  host ??= createKernelHost();
  return (await host).build((kernel) => family.build(values, kernel), PICTURE);
}

/** Colours of pictures that stand alone and know no palette: what bends marker yellow, the rest petrol. */
export const PICTURE_COLOURS: readonly Rgb[] = [
  [0.965, 0.8, 0.36],
  [0.42, 0.66, 0.68],
];

/** Moment of the motion a part is shown at. */
const SHOWN_AT = 0.62;

/** The part as it is best told apart: a single body on its way, several side by side as printed. */
export async function shownPart(family: Family): Promise<Moved[]> {
  const preset = family.presets[0]!;
  const values = { ...family.parameters.defaults, ...preset.values };
  const bodies = await bodiesOf(family, values);
  if (bodies.length > 1) {
    const still = bodies.map((body) => prepare(body, null));
    return arrange(still, null, 0, bedPlacements(bodies, family.stances(values)[0]!));
  }
  const motion = family.motion(values, materialById(preset.material)!);
  return arrange(
    bodies.map((body) => prepare(body, motion, 3000)),
    motion,
    SHOWN_AT,
  );
}
