'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { classNames } from '@/components/ui/class-names';
import { PLACES } from './places';

export function NavLinks() {
  const path = usePathname();
  return (
    <ul className="flex flex-wrap items-center gap-x-1 sm:gap-x-3">
      {PLACES.map(({ href, name }) => {
        const here = path === href || path.startsWith(`${href}/`);
        return (
          <li key={href}>
            <Link
              href={href}
              aria-current={here ? 'page' : undefined}
              className="grid min-h-11 place-items-center px-2 font-medium text-muted hover:text-ink aria-[current]:font-semibold aria-[current]:text-ink"
            >
              <span className={classNames(here && 'marked')}>{name}</span>
            </Link>
          </li>
        );
      })}
    </ul>
  );
}
