'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { confirmAddress } from '@/lib/auth/confirm-address';
import { tokenField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

export const confirmAddressAction = formAction({
  schema: z.object({ token: tokenField }),
  secrets: ['token'],
  async run({ token }, { client }) {
    await confirmAddress(token, client);
    revalidatePath('/', 'layout');
    redirect('/sign-in?done=confirmed');
  },
});
