'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { classNames } from '@/components/ui/class-names';

const PAGES = [
  { href: '/admin', name: 'Members', also: '/admin/members' },
  { href: '/admin/invitations', name: 'Invitations' },
  { href: '/admin/mail', name: 'Outgoing mail' },
  { href: '/admin/audit', name: 'Audit trail' },
  { href: '/admin/club', name: 'Club and backup' },
] as const;

export function AdminNav() {
  const path = usePathname();
  return (
    <nav aria-label="Running the club" className="mb-6 border-hair border-b">
      <ul className="-ml-2 flex flex-wrap gap-x-2">
        {PAGES.map(({ href, name, ...page }) => {
          const here = path === href || ('also' in page && path.startsWith(page.also));
          return (
            <li key={href}>
              <Link
                href={href}
                aria-current={here ? 'page' : undefined}
                className="grid min-h-11 place-items-center px-2 text-muted hover:text-ink aria-[current]:font-semibold aria-[current]:text-ink"
              >
                <span className={classNames(here && 'marked')}>{name}</span>
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
