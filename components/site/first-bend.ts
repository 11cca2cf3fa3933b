import { familyEntry } from '@/generators';
import { writeLink } from '@/generators/url-state';
import { materialById } from '@/lib/materials/data';
import type { BendProps } from './bend';
import { bendBody, bendPicture, crestTravel } from './bend-picture';
import { bodiesOf } from './built';
import { bodyFrom, plainBody } from './plain-body';
import {
  FIRST_PULL,
  readings,
  SAMPLE_FAMILY,
  SAMPLE_MATERIAL,
  SAMPLE_PLASTICS,
  SAMPLE_USE,
  sampleValues,
} from './sample';

export const loadSample = () => familyEntry(SAMPLE_FAMILY)!.load();

/** Everything the first page shows before any script has run. */
export async function firstBend(): Promise<Omit<BendProps, 'children'>> {
  const family = await loadSample();
  const [built] = await bodiesOf(family, sampleValues(family));
  const body = plainBody(built!);
  const motion = family.motion(sampleValues(family), materialById(SAMPLE_MATERIAL)!);
  const prepared = bendBody(bodyFrom(body), motion);
  const rest = bendPicture(prepared, motion, 0).strokes.filter(({ kind }) => kind === 'crease');
  return {
    body,
    picture: bendPicture(prepared, motion, FIRST_PULL),
    rows: readings(
      family,
      SAMPLE_PLASTICS.map((id) => materialById(id)!),
      FIRST_PULL,
    ),
    rest: rest.map(({ path }) => path).join(''),
    travel: crestTravel(motion, body.name),
  };
}

/** Address that opens the hook of the first page. */
export async function sampleLink(): Promise<string> {
  const family = await loadSample();
  const values = family.parameters.schema.parse(sampleValues(family));
  const query = writeLink(family, { values, material: SAMPLE_MATERIAL, use: SAMPLE_USE });
  return `/design/${SAMPLE_FAMILY}?${query}`;
}
