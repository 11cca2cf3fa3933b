import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import type { Viewer } from '@/lib/access/policy';

/** "Ines Marlow" as "Ines M." */
export function shortName(name: string): string {
  const [first = '', ...rest] = name.split(/\s+/);
  const last = rest.at(-1)?.[0];
  return last ? `${first} ${last}.` : first;
}

/** The right end of the header: the club, and the way to the account or to the sign-in. */
export function HeaderAccount({ viewer, club }: { viewer: Viewer; club: string | null }) {
  return (
    <>
      {club && <span className="hidden max-w-56 truncate text-muted text-sm lg:inline">{club}</span>}
      <Link href={viewer ? '/account' : '/sign-in'} className={buttonClass('line')} prefetch={false}>
        <span className="max-w-40 truncate">{viewer ? shortName(viewer.name) : 'Sign in'}</span>
      </Link>
    </>
  );
}
