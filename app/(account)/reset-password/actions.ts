'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { resetPassword } from '@/lib/auth/recovery';
import { newPasswordField, tokenField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

export const resetPasswordAction = formAction({
  schema: z.object({ token: tokenField, password: newPasswordField }),
  secrets: ['password', 'token'],
  async run({ token, password }, { client }) {
    await resetPassword(token, password, client);
    redirect('/sign-in?done=reset');
  },
});
