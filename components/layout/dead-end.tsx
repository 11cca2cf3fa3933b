import type { ReactNode } from 'react';

/** A page that has nothing to show: says why and what to do. */
export function DeadEnd({ mark, title, children }: { mark: string; title: string; children: ReactNode }) {
  return (
    <main className="frame grid flex-1 content-center gap-6 py-16 sm:grid-cols-[auto_1fr] sm:gap-12">
      <p
        aria-hidden="true"
        className="hatched grid size-32 place-items-center rounded-sheet border border-hair bg-sheet font-bold font-heading text-5xl"
      >
        {mark}
      </p>
      <div className="max-w-prose">
        <h1 className="font-bold text-4xl tracking-tight">{title}</h1>
        <div className="mt-3 grid justify-items-start gap-5 text-muted">{children}</div>
      </div>
    </main>
  );
}
