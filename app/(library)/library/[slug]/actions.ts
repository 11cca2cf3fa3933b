'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { getMaterial } from '@/lib/access/materials';
import { reportOn, startFrom } from '@/lib/access/presets';
import { lineField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

const place = { slug: z.string().max(80), version: z.coerce.number().int().min(1).max(100_000) };

export const reportAction = formAction({
  schema: z.object({
    ...place,
    worked: z.enum(['yes', 'no'], 'Say whether it worked'),
    material: z.string().max(60),
    printer: lineField('the printer', 60),
    note: z.string().trim().max(600, 'At most 600 characters'),
  }),
  async run({ slug, worked, material, ...given }, { viewer }) {
    reportOn(viewer, slug, { ...given, worked: worked === 'yes', material: getMaterial(material).shortName });
    revalidatePath(`/library/${slug}`);
    return 'Thank you. Your report stands below';
  },
});

export const startAction = formAction({
  schema: z.object(place),
  async run({ slug, version }, { viewer }) {
    const { id } = await startFrom(viewer, slug, version);
    redirect(`/designs/${id}`);
  },
});
