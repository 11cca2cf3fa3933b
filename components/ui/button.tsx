import type { ComponentProps } from 'react';
import { classNames } from './class-names';

const LOOK = {
  ink: 'border-ink bg-ink text-paper hover:bg-petrol hover:border-petrol hover:text-sheet',
  line: 'border-ink bg-sheet text-ink hover:bg-petrol-soft',
  quiet: 'border-transparent text-ink hover:bg-petrol-soft',
} as const;

export type ButtonLook = keyof typeof LOOK;

export const buttonClass = (look: ButtonLook = 'line', small = false): string =>
  classNames(
    'inline-flex shrink-0 items-center justify-center gap-2 whitespace-nowrap rounded-field border font-semibold',
    'transition-colors disabled:cursor-default disabled:border-hair disabled:bg-transparent disabled:text-edge',
    small ? 'min-h-8 px-2.5 text-sm pointer-coarse:min-h-11' : 'min-h-10 px-4 pointer-coarse:min-h-11',
    LOOK[look],
  );

export function Button({
  look,
  small,
  className,
  ...rest
}: ComponentProps<'button'> & { look?: ButtonLook; small?: boolean }) {
  return <button type="button" {...rest} className={classNames(buttonClass(look, small), className)} />;
}
