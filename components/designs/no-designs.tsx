import Link from 'next/link';

export function NoDesigns({ narrowed, deleted }: { narrowed: boolean; deleted: boolean }) {
  if (narrowed) return <p className="mt-8 text-muted">No design fits that. Widen the filter above.</p>;
  if (deleted) return <p className="mt-8 text-muted">Nothing deleted in the last 30 days.</p>;
  return (
    <p className="mt-8 max-w-prose text-lg text-muted">
      Nothing kept yet.{' '}
      <Link href="/design" className="text-ink underline underline-offset-4">
        Choose a part
      </Link>
      , change it to fit yours and press “Keep this design”, or start from something in the club library.
    </p>
  );
}
