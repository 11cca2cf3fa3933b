'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import * as members from '@/lib/access/members';
import { idField, lineField, rolesField } from '@/lib/forms/fields';
import { formAction } from '@/lib/forms/form';

const changed = (id: string) => revalidatePath(`/admin/members/${id}`);

export const giveRolesAction = formAction({
  schema: z.object({ id: idField, roles: rolesField }),
  async run({ id, roles }, { viewer }) {
    members.giveRoles(viewer, id, roles);
    changed(id);
    return 'The roles are set. They hold from the next page on.';
  },
});

export const suspendAction = formAction({
  schema: z.object({ id: idField, reason: lineField('a reason', 300) }),
  async run({ id, reason }, { viewer }) {
    members.suspendMember(viewer, id, reason);
    changed(id);
    return 'Suspended. Every sign-in of this member is ended.';
  },
});

export const restoreAction = formAction({
  schema: z.object({ id: idField }),
  async run({ id }, { viewer }) {
    members.restoreMember(viewer, id);
    changed(id);
    return 'Restored. The member can sign in again.';
  },
});
