'use client';

import type { ReactNode } from 'react';
import { useFormStatus } from 'react-dom';
import { Button, type ButtonLook } from '@/components/ui/button';

/** Sends its form; while that runs it says so and cannot be pressed twice. */
export function SubmitButton({
  children,
  look = 'ink',
  small = false,
}: {
  children: ReactNode;
  look?: ButtonLook;
  small?: boolean;
}) {
  const { pending } = useFormStatus();
  return (
    <Button type="submit" look={look} small={small} aria-disabled={pending} aria-busy={pending}>
      {children}
    </Button>
  );
}
