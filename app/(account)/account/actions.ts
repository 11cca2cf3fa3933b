'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { z } from 'zod';
import * as account from '@/lib/access/account';
import { permit } from '@/lib/access/policy';
import { beginSession, currentSession, endSession } from '@/lib/auth/session';
import { SignInNeeded } from '@/lib/errors';
import { currentPasswordField, emailField, idField, nameField, newPasswordField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

export const signOutAction = formAction({
  schema: z.object({}),
  async run() {
    await endSession();
    revalidatePath('/', 'layout');
    redirect('/');
  },
});

export const renameAction = formAction({
  schema: z.object({ name: nameField }),
  async run({ name }, { viewer }) {
    account.renameSelf(viewer, name);
    revalidatePath('/', 'layout');
    return 'Your name is changed. What you published before keeps the name it was published under.';
  },
});

export const changePasswordAction = formAction({
  schema: z.object({ password: currentPasswordField, next: newPasswordField }),
  secrets: ['password', 'next'],
  async run({ password, next }, { viewer, client }) {
    const { id } = await account.changePassword(viewer, password, next);
    await beginSession(id, client.userAgent);
    revalidatePath('/account');
    return 'Your password is changed. Every other sign-in is ended.';
  },
});

export const changeEmailAction = formAction({
  schema: z.object({ email: emailField, password: currentPasswordField }),
  secrets: ['password'],
  async run({ email, password }, { viewer }) {
    await account.askEmailChange(viewer, password, email);
    return `A link was mailed to ${email}. The address changes once you open it.`;
  },
});

export const verifyAction = formAction({
  schema: z.object({}),
  async run(_, { viewer }) {
    await account.askVerification(viewer);
    return 'A link was mailed to you.';
  },
});

export const endSessionAction = formAction({
  schema: z.object({ id: idField }),
  async run({ id }, { viewer }) {
    account.endOwnSession(viewer, id);
    revalidatePath('/account');
    return 'That sign-in is ended.';
  },
});

export const endOtherSessionsAction = formAction({
  schema: z.object({}),
  async run(_, { viewer }) {
    permit(viewer, 'account.own');
    const present = await currentSession();
    if (!present) throw new SignInNeeded();
    account.endOtherSessions(viewer, present.id);
    revalidatePath('/account');
    return 'Every other sign-in is ended.';
  },
});

export const deleteAccountAction = formAction({
  schema: z.object({ password: currentPasswordField }),
  secrets: ['password'],
  async run({ password }, { viewer }) {
    await account.deleteAccount(viewer, password);
    await endSession();
    revalidatePath('/', 'layout');
    redirect('/sign-in?done=deleted');
  },
});
