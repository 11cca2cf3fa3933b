'use client';

import { heading, mono, text } from './fonts';
import './globals.css';
import { DeadEnd } from '@/components/layout/dead-end';
import { Button } from '@/components/ui/button';

export default function GlobalErrorPage({ reset }: { error: Error; reset: () => void }) {
  return (
    <html lang="en" className={`${heading.variable} ${text.variable} ${mono.variable}`}>
      <body>
        <DeadEnd mark="!" title="The page could not be drawn">
          <p>The fault is ours. Trying again often helps; what you designed is kept in this browser.</p>
          <Button look="ink" onClick={reset}>
            Try again
          </Button>
        </DeadEnd>
      </body>
    </html>
  );
}
