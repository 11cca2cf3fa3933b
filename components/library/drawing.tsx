import { classNames } from '@/components/ui/class-names';

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
    // biome-ignore lint/performance/noImgElement: drawn on the server at the size it is shown
    <img
      src={src}
      alt={alt}
      width={400}
      height={300}
      loading={eager ? 'eager' : 'lazy'}
      decoding="async"
      className={classNames('h-auto w-full bg-[color-mix(in_oklab,var(--sheet),var(--edge)_18%)]', className)}
    />
  );
}
