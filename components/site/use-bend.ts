'use client';
import { useEffect, useMemo, useState } from 'react';
import { familyEntry } from '@/generators';
import type { Family, Motion } from '@/generators/contract';
import type { Material } from '@/lib/materials/types';
import { bendBody, bendPicture } from './bend-picture';
import { bodyFrom, type PlainBody } from './plain-body';
import { readings, SAMPLE_FAMILY, SAMPLE_MATERIAL, SAMPLE_PLASTICS, sampleValues } from './sample';

interface Works {
  readonly family: Family;
  readonly plastics: readonly Material[];
  readonly motion: Motion;
}

async function load(): Promise<Works> {
  const [family, { materialById }] = await Promise.all([
    familyEntry(SAMPLE_FAMILY)!.load(),
    import('@/lib/materials/data'),
  ]);
  const plastics = SAMPLE_PLASTICS.map((id) => materialById(id)!);
  const motion = family.motion(sampleValues(family), materialById(SAMPLE_MATERIAL)!);
  return { family, plastics, motion };
}

/** The family's check and motion, fetched when the page is at rest; until then the page shows what it came with. */
export function useBend(plain: PlainBody, pull: number) {
  const [works, setWorks] = useState<Works | null>(null);
  useEffect(() => {
    let wanted = true;
    void load().then((loaded) => wanted && setWorks(loaded));
    return () => {
      wanted = false;
    };
  }, []);
  const body = useMemo(() => works && bendBody(bodyFrom(plain), works.motion), [works, plain]);
  return useMemo(() => {
    if (!works || !body) return null;
    return {
      picture: bendPicture(body, works.motion, pull),
      rows: readings(works.family, works.plastics, pull),
    };
  }, [works, body, pull]);
}
