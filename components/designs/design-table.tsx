'use client';

import { Copy, Trash2 } from 'lucide-react';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { send } from '@/components/forms/send';
import { VerdictMark } from '@/components/studio/verdict';
import { Button } from '@/components/ui/button';
import type { DesignSummary } from '@/lib/access/designs';
import { DesignPicture } from './design-picture';
import { SortHead } from './sort-head';
import { When } from './when';

export interface Row extends DesignSummary {
  readonly familyName: string;
  readonly materialName: string;
}

interface Told {
  readonly text: string;
  /** design that can be brought back */
  readonly deleted?: string;
}

function useChanges() {
  const router = useRouter();
  const [told, setTold] = useState<Told | null>(null);
  const change = async (sent: ReturnType<typeof send>, done: Told) => {
    const answer = await sent;
    setTold(answer.ok ? done : { text: answer.message });
    router.refresh();
  };
  const address = (id: string) => `/api/v1/designs/${id}`;
  return {
    told,
    copy: ({ id, name }: Row) => change(send('POST', `${address(id)}/copy`), { text: `Copied “${name}”.` }),
    remove: ({ id, name }: Row) =>
      change(send('DELETE', address(id)), {
        text: `Deleted “${name}”. It can be brought back for 30 days.`,
        deleted: id,
      }),
    undelete: (id: string) => change(send('POST', `${address(id)}/undelete`), { text: 'Brought back.' }),
  };
}

type Changes = ReturnType<typeof useChanges>;

function RowActions({ row, deleted, changes }: { row: Row; deleted: boolean; changes: Changes }) {
  if (deleted) {
    return (
      <Button small aria-label={`Bring back ${row.name}`} onClick={() => changes.undelete(row.id)}>
        Bring back
      </Button>
    );
  }
  return (
    <span className="flex justify-end">
      <Button look="quiet" small aria-label={`Copy ${row.name}`} onClick={() => changes.copy(row)}>
        <Copy aria-hidden="true" size={17} />
      </Button>
      <Button look="quiet" small aria-label={`Delete ${row.name}`} onClick={() => changes.remove(row)}>
        <Trash2 aria-hidden="true" size={17} />
      </Button>
    </span>
  );
}

function Line({ row, deleted, changes }: { row: Row; deleted: boolean; changes: Changes }) {
  return (
    <tr className="border-hair border-t align-middle hover:bg-tint">
      <td className="w-24 py-2 pl-4 sm:w-32">
        <DesignPicture row={row} deleted={deleted} />
      </td>
      <td className="px-3 py-2 sm:px-4">
        {deleted ? (
          <span className="font-semibold">{row.name}</span>
        ) : (
          <Link
            href={`/designs/${row.id}`}
            prefetch={false}
            className="font-bold text-lg underline-offset-4 hover:underline"
          >
            {row.name}
          </Link>
        )}
        <span className="block text-muted text-sm lg:hidden">
          {row.familyName}, {row.materialName}
        </span>
        <span className="mt-1 block md:hidden">
          <VerdictMark verdict={row.verdict} />
        </span>
      </td>
      <td className="hidden px-4 lg:table-cell">{row.familyName}</td>
      <td className="hidden px-4 lg:table-cell">{row.materialName}</td>
      <td className="hidden px-4 md:table-cell">
        <VerdictMark verdict={row.verdict} />
      </td>
      <td className="hidden px-4 text-muted text-sm sm:table-cell">
        <When iso={row.changedAt} />
      </td>
      <td className="py-2 pr-3 text-right">
        <RowActions row={row} deleted={deleted} changes={changes} />
      </td>
    </tr>
  );
}

function ToldStrip({ told, undelete }: Pick<Changes, 'told' | 'undelete'>) {
  const id = told?.deleted;
  return (
    <div role="status" className="contents">
      {told && (
        <p className="mt-4 flex flex-wrap items-center gap-x-4 gap-y-1 border-marker border-l-4 bg-sheet px-4 py-1.5 text-sm shadow-lift">
          {told.text}
          {id !== undefined && (
            <Button small onClick={() => undelete(id)}>
              Undo
            </Button>
          )}
        </p>
      )}
    </div>
  );
}

/** Kept designs, a row each, with what can be done to them. `query` is the address's, for the sort links. */
export function DesignTable({
  rows,
  deleted,
  query,
}: {
  rows: readonly Row[];
  deleted: boolean;
  query: string;
}) {
  const changes = useChanges();
  const head = (sort: string, name: string, hidden: string) => (
    <SortHead sort={sort} query={query} className={hidden}>
      {name}
    </SortHead>
  );
  return (
    <>
      <ToldStrip told={changes.told} undelete={changes.undelete} />
      {rows.length > 0 && (
        <table className="mt-4 w-full rounded-sheet border border-hair bg-sheet shadow-lift">
          <caption className="sr-only">{deleted ? 'Deleted designs' : 'Your designs'}</caption>
          <thead className="text-left text-sm">
            <tr>
              <th scope="col" className="py-2 pl-4 font-semibold text-muted">
                Picture
              </th>
              {head('name', 'Name', '')}
              {head('family', 'Part', 'hidden lg:table-cell')}
              {head('material', 'Plastic', 'hidden lg:table-cell')}
              {head('verdict', 'Verdict', 'hidden md:table-cell')}
              {head('changed', 'Changed', 'hidden sm:table-cell')}
              <th scope="col" className="pr-3">
                <span className="sr-only">Actions</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <Line key={row.id} row={row} deleted={deleted} changes={changes} />
            ))}
          </tbody>
        </table>
      )}
    </>
  );
}
