'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { sendAgain } from '@/lib/access/outgoing-mail';
import { idField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

export const sendAgainAction = formAction({
  schema: z.object({ id: idField }),
  async run({ id }, { viewer }) {
    sendAgain(viewer, id);
    revalidatePath('/admin/mail');
    return 'It is tried again at once.';
  },
});
