import type { ComponentProps } from 'react';

type Props = ComponentProps<'img'> & {
  readonly alt: string;
  readonly width: number;
  readonly height: number;
};

/** A picture that is stored or drawn in the size it is shown at, so that nothing is left to an image service. */
export const FinishedImage = ({ alt, ...rest }: Props) => (
  // biome-ignore lint/performance/noImgElement: the framework's image service is switched off in next.config.mjs
  <img alt={alt} loading="lazy" decoding="async" {...rest} />
);
