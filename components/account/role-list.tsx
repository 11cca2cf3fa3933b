import type { Role } from '@/lib/access/policy';

/** What each role is for, in the order they are shown. */
export const ROLE_TEXTS: Readonly<Record<Role, string>> = {
  member: 'keeps designs, publishes, asks for prints',
  host: 'prints for others',
  librarian: 'reviews presets, keeps the material data',
  admin: 'runs the club’s Bendwell',
};

export function RoleList({ roles }: { roles: readonly Role[] }) {
  return (
    <ul aria-label="Roles" className="flex flex-wrap gap-1.5">
      {roles.map((role) => (
        <li
          key={role}
          title={ROLE_TEXTS[role]}
          className="rounded-full border border-hair bg-tint px-2.5 py-0.5 font-medium text-ink text-sm"
        >
          {role}
        </li>
      ))}
    </ul>
  );
}
