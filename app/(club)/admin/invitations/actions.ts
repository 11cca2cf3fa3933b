'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { inviteMember, withdrawInvitation } from '@/lib/access/invitations';
import { emailField, idField, rolesField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

export const inviteAction = formAction({
  schema: z.object({ email: emailField, roles: rolesField }),
  async run({ email, roles }, { viewer }) {
    await inviteMember(viewer, email, roles);
    revalidatePath('/admin/invitations');
    return `An invitation to ${email} is on its way.`;
  },
});

export const withdrawAction = formAction({
  schema: z.object({ id: idField }),
  async run({ id }, { viewer }) {
    withdrawInvitation(viewer, id);
    revalidatePath('/admin/invitations');
    return 'The invitation is withdrawn.';
  },
});
