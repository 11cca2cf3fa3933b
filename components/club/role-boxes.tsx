'use client';

import { ROLE_TEXTS } from '@/components/account/role-list';
import { useForm } from '@/components/forms/action-form';
import { FieldError } from '@/components/forms/field-error';
import type { Role } from '@/lib/access/policy';

const GIVEN = ['host', 'librarian', 'admin'] as const satisfies readonly Role[];

/** Roles beside `member`, which everybody has. */
export function RoleBoxes({ chosen }: { chosen: readonly Role[] }) {
  const { state } = useForm();
  const kept = state.values.roles;
  const checked: readonly string[] = Array.isArray(kept) ? kept : chosen;
  return (
    <fieldset key={state.sent} className="grid gap-1">
      <legend className="mb-1 font-semibold">Roles beside member</legend>
      {GIVEN.map((role) => (
        <label key={role} className="flex min-h-8 cursor-pointer items-start gap-2.5 pointer-coarse:min-h-11">
          <input
            type="checkbox"
            name="roles"
            value={role}
            defaultChecked={checked.includes(role)}
            className="mt-0.5 size-5 shrink-0"
          />
          <span>
            {role} <span className="text-muted text-sm">{ROLE_TEXTS[role]}</span>
          </span>
        </label>
      ))}
      <FieldError id="roles-error">{state.errors.roles}</FieldError>
    </fieldset>
  );
}
