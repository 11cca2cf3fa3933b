'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { LICENCES, type Licence } from '@/components/library/licences';
import { handIn } from '@/lib/access/hand-in';
import { lineField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

const LICENCE_IDS = Object.keys(LICENCES) as [Licence, ...Licence[]];

const tags = z
  .string()
  .max(200, 'At most 200 characters')
  .transform((text) => [...new Set(text.split(',').map((tag) => tag.trim().toLowerCase()))].filter(Boolean))
  .pipe(z.array(z.string().max(30, 'A tag has at most 30 characters')).max(8, 'At most eight tags'));

const MOST_PHOTOS = 6;

export const handInAction = formAction({
  schema: z.object({
    designId: z.string().max(60),
    title: lineField('a title', 80),
    purpose: z.string().trim().min(1, 'Say what it is for').max(1000, 'At most 1000 characters'),
    printingNotes: z.string().trim().max(2000, 'At most 2000 characters'),
    tags,
    licence: z.enum(LICENCE_IDS, 'Choose a licence'),
    photos: z.array(z.string().max(60)).max(MOST_PHOTOS, `At most ${MOST_PHOTOS} photos`).default([]),
    alts: z.array(z.string().trim().max(200, 'At most 200 characters')).max(MOST_PHOTOS).default([]),
  }),
  async run({ photos, alts, ...words }, { viewer }) {
    const named = photos.map((id, at) => ({ id, alt: alts[at] || `${words.title}, photo ${at + 1}` }));
    await handIn(viewer, { ...words, photos: named });
    redirect(`/designs/${words.designId}/publish`);
  },
});
