import type { Metadata, Viewport } from 'next';
import type { ReactNode } from 'react';
import { HeaderAccount } from '@/components/account/header-account';
import { PageFrame } from '@/components/layout/page-frame';
import { clubName } from '@/lib/access/club';
import { currentViewer } from '@/lib/auth/session';
import { heading, mono, text } from './fonts';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Bendwell', template: '%s · Bendwell' },
  description: 'Design printed straps, clips, screw caps and hinges that bend without breaking.',
};

export const viewport: Viewport = {
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#e6eeeb' },
    { media: '(prefers-color-scheme: dark)', color: '#0d1a1b' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const viewer = await currentViewer();
  return (
    <html
      lang="en"
      className={`${heading.variable} ${text.variable} ${mono.variable}`}
      suppressHydrationWarning
    >
      <head>
        <script src="/theme.js" />
      </head>
      <body>
        <PageFrame account={<HeaderAccount viewer={viewer} club={clubName()} />}>{children}</PageFrame>
      </body>
    </html>
  );
}
