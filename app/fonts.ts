import localFont from 'next/font/local';

export const heading = localFont({
  src: '../node_modules/@fontsource-variable/bricolage-grotesque/files/bricolage-grotesque-latin-wght-normal.woff2',
  variable: '--font-heading',
  weight: '200 800',
});

export const text = localFont({
  src: '../node_modules/@fontsource-variable/instrument-sans/files/instrument-sans-latin-wght-normal.woff2',
  variable: '--font-text',
  weight: '400 700',
});

export const mono = localFont({
  src: [
    {
      path: '../node_modules/@fontsource/spline-sans-mono/files/spline-sans-mono-latin-400-normal.woff2',
      weight: '400',
    },
    {
      path: '../node_modules/@fontsource/spline-sans-mono/files/spline-sans-mono-latin-600-normal.woff2',
      weight: '600',
    },
  ],
  variable: '--font-mono',
});
