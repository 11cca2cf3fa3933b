import type { Metadata } from 'next';
import type { ReactNode } from 'react';
import { heading, mono, text } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Bendwell', template: '%s · Bendwell' },
  description: 'Design printed straps, clips, screw caps and hinges that bend without breaking.',
};

export default function RootLayout({ children }: { children: ReactNode }) {
  return (
    <html lang="en" className={`${heading.variable} ${text.variable} ${mono.variable}`}>
      <body>{children}</body>
    </html>
  );
}
