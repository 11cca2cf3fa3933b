import { classNames } from '@/components/ui/class-names';
import { FinishedImage } from '@/components/ui/finished-image';

/** A part as the server draws it, on the tone that suits its colours in both palettes. */
export function Drawing({
  src,
  alt,
  className,
  eager,
}: {
  src: string;
  alt: string;
  className?: string;
  eager?: boolean;
}) {
  return (
    <FinishedImage
      src={src}
      alt={alt}
      width={400}
      height={300}
      loading={eager ? 'eager' : 'lazy'}
      className={classNames('h-auto w-full bg-[color-mix(in_oklab,var(--sheet),var(--edge)_18%)]', className)}
    />
  );
}
