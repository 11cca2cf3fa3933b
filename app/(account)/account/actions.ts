'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { endSession } from '@/lib/auth/session';
import { formAction } from '@/lib/forms/form';

export const signOutAction = formAction({
  schema: z.object({}),
  async run() {
    await endSession();
    revalidatePath('/', 'layout');
    redirect('/');
  },
});
