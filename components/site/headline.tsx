import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';

/** What the site is for, beside the part that shows it. */
export function Headline({ sampleHref }: { sampleHref: string }) {
  return (
    <div className="pt-8 lg:py-14">
      <h1 className="font-extrabold text-[clamp(2.6rem,5.2vw,4.9rem)] leading-[0.98] tracking-[-0.035em]">
        How far will it bend before it breaks?
      </h1>
      <p className="mt-6 max-w-[34rem] text-lg">
        Pull the catch and see. Bendwell works this out before you print: straps, clips, screw caps and hinges
        for models, where you watch the strain while you choose the plastic and set the dimensions, and leave
        with a file your slicer takes.
      </p>
      <div className="mt-7 flex flex-wrap gap-3">
        <Link href="/design" className={buttonClass('ink')}>
          Choose a part
        </Link>
        <Link href={sampleHref} className={buttonClass('line')}>
          Change this hook
        </Link>
      </div>
      <p className="mt-3 text-muted text-sm">
        No account needed, and without one nothing is stored on the server.
      </p>
    </div>
  );
}
