import Link from 'next/link';
import { When } from '@/components/designs/when';
import type { OwnVersion } from '@/lib/access/hand-in';

export const STATE_WORDS: Readonly<Record<OwnVersion['state'], string>> = {
  waiting: 'Waiting for a librarian',
  'sent-back': 'Sent back',
  published: 'Published',
  retired: 'Retired',
};

/** What became of the versions of a design that were handed in. */
export function HandedIn({ slug, versions }: { slug: string | null; versions: readonly OwnVersion[] }) {
  return (
    <ol>
      {versions.map(({ id, number, title, state, handedInAt, decisionNote }) => (
        <li key={id} className="border-hair border-t py-2">
          <p>
            <b className="font-semibold">
              {STATE_WORDS[state]}: version {number}
            </b>
            , {title}, handed in <When iso={handedInAt} />
            {(state === 'published' || state === 'retired') && slug && (
              <>
                {' '}
                <Link href={`/library/${slug}?version=${number}`} className="underline underline-offset-4">
                  in the library
                </Link>
              </>
            )}
          </p>
          {decisionNote && <p className="mt-1 border-marker border-l-4 pl-3">{decisionNote}</p>}
        </li>
      ))}
    </ol>
  );
}
