/** A line to type in, for pages made on the server too. */
export const lineClass =
  'h-10 w-full rounded-field border border-edge bg-sheet px-3 hover:border-ink aria-invalid:border-2 aria-invalid:border-over aria-invalid:bg-over-soft pointer-coarse:h-11 pointer-coarse:text-base';
