'use client';

import type { ComponentProps } from 'react';

/** On or off, as a slide that says so by shape and place, not by colour alone. */
export function SwitchField({ ...rest }: Omit<ComponentProps<'input'>, 'type'>) {
  return (
    <span className="relative inline-flex min-h-10 items-center pointer-coarse:min-h-11">
      <input
        {...rest}
        type="checkbox"
        className="peer h-6 w-11 cursor-pointer appearance-none rounded-full border-2 border-edge bg-sheet transition-colors checked:border-petrol checked:bg-petrol"
      />
      <span
        aria-hidden="true"
        className="pointer-events-none absolute left-1 size-4 rounded-full bg-edge transition-transform peer-checked:translate-x-5 peer-checked:bg-sheet"
      />
    </span>
  );
}
