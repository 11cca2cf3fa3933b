'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import { signIn } from '@/lib/auth/sign-in';
import { InvalidInput } from '@/lib/errors';
import { currentPasswordField, emailField, nextField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

const REFUSALS = {
  refused: 'Address and password do not fit together',
  suspended: 'This account is suspended. Ask who runs your club’s Bendwell',
} as const;

export const signInAction = formAction({
  schema: z.object({ email: emailField, password: currentPasswordField, next: nextField }),
  secrets: ['password'],
  async run({ email, password, next }, { client }) {
    const answer = await signIn(email, password, client);
    if (answer !== 'signed-in') throw new InvalidInput([{ field: 'password', message: REFUSALS[answer] }]);
    revalidatePath('/', 'layout');
    redirect(next);
  },
});
