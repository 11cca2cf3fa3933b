'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { acceptInvitation } from '@/lib/auth/accept-invitation';
import { nameField, newPasswordField, tokenField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

export const acceptInvitationAction = formAction({
  schema: z.object({ token: tokenField, name: nameField, password: newPasswordField }),
  secrets: ['password', 'token'],
  async run({ token, name, password }, { client }) {
    await acceptInvitation(token, { name, password }, client);
    revalidatePath('/', 'layout');
    redirect('/account');
  },
});
