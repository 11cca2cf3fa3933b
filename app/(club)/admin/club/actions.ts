'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { changeClub } from '@/lib/access/club';
import { emailField, lineField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

const optionalEmail = z.union([z.literal('').transform(() => null), emailField]);

export const changeClubAction = formAction({
  schema: z.object({ name: lineField('the club’s name', 80), contactEmail: optionalEmail }),
  async run(settings, { viewer }) {
    changeClub(viewer, settings);
    revalidatePath('/', 'layout');
    return 'Kept.';
  },
});
