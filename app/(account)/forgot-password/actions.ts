'use server';

import { after } from 'next/server';
import { z } from 'zod';
import { countRecovery, sendResetLink } from '@/lib/auth/recovery';
import { emailField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

/** The work is done after the answer, so that neither its words nor its time tell whether the address has an account. */
export const askResetAction = formAction({
  schema: z.object({ email: emailField }),
  async run({ email }, { client }) {
    await countRecovery(email, client);
    after(() => sendResetLink(email));
    return `If ${email} has an account, a link is on its way. Look among unwanted mail too.`;
  },
});
