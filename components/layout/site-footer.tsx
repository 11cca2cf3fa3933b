import Link from 'next/link';
import { LogoMark } from './logo';

const CAUTIONS: readonly { head: string; text: string }[] = [
  {
    head: 'Not for loads that can hurt',
    text: 'No lifting, climbing, life support or child safety, and nothing that can hurt someone if it lets go.',
  },
  {
    head: 'Estimates, not promises',
    text: 'Every number is an estimate for a first print. Prove it by test on your printer, in your plastic.',
  },
  {
    head: 'Hold twice what matters',
    text: 'Batteries and spinning parts need a second retention besides a printed one.',
  },
  {
    head: 'Food, water, fumes',
    text: 'Food and drinking water depend on the exact resin, additives, nozzle and local rules. Ventilate while printing.',
  },
];

export function SiteFooter() {
  return (
    <footer className="mt-auto break-inside-avoid border-hair border-t bg-paper">
      <div className="frame grid gap-x-10 gap-y-6 py-8 text-sm lg:grid-cols-[13rem_1fr]">
        <div className="flex items-start gap-3 text-muted">
          <LogoMark size={24} />
          <div>
            <p>
              Local codes and licensed practice come first.
              <br />
              All lengths in millimetres.
            </p>
            <Link
              href="/about"
              className="inline-flex min-h-9 items-center underline underline-offset-4 hover:text-ink pointer-coarse:min-h-11 print:hidden"
            >
              What the figures mean
            </Link>
          </div>
        </div>
        <ul className="grid gap-x-8 gap-y-4 sm:grid-cols-2 xl:grid-cols-4">
          {CAUTIONS.map(({ head, text }) => (
            <li key={head}>
              <strong className="block font-semibold">{head}</strong>
              <span className="text-muted">{text}</span>
            </li>
          ))}
        </ul>
      </div>
    </footer>
  );
}
