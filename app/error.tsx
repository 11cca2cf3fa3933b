'use client';

import { DeadEnd } from '@/components/layout/dead-end';
import { Button } from '@/components/ui/button';

export default function ErrorPage({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <DeadEnd mark="!" title="This page broke">
      <p>
        The fault is ours, not yours. A design you were working on is kept in this browser and in the address
        of the page.
        {error.digest && (
          <span className="mt-2 block font-mono text-sm">Mark of this fault: {error.digest}</span>
        )}
      </p>
      <Button look="ink" onClick={reset}>
        Try again
      </Button>
    </DeadEnd>
  );
}
