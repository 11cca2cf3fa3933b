import Link from 'next/link';
import type { ReactNode } from 'react';
import { LogoMark } from './logo';
import { NavLinks } from './nav-links';
import { ThemeSwitch } from './theme-switch';

/** The head of every page. `account` is what stands at its right end. */
export function SiteHeader({ account }: { account?: ReactNode }) {
  return (
    <header className="border-hair border-b bg-paper print:hidden">
      <div className="frame flex flex-wrap items-center gap-x-6 py-2">
        <Link
          href="/"
          className="flex min-h-11 items-center gap-2.5 font-bold font-heading text-xl tracking-tight"
        >
          <LogoMark />
          Bendwell
        </Link>
        <nav aria-label="Main" className="order-last -ml-2 basis-full sm:order-none sm:ml-0 sm:basis-auto">
          <NavLinks />
        </nav>
        <div className="ml-auto flex items-center gap-3">
          <ThemeSwitch />
          {account}
        </div>
      </div>
    </header>
  );
}
