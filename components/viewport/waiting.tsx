import { LoaderCircle } from 'lucide-react';
import { FinishedImage } from '@/components/ui/finished-image';

/** What stands in for the picture until it is drawn: the part as the guide shows it, faint, and what is being done. */
export function Waiting({ family, words }: { family: string; words: string }) {
  return (
    <div data-waiting="" className="pointer-events-none absolute inset-0 grid place-items-center">
      <FinishedImage
        src={`/guide/${family}/part.svg`}
        alt=""
        width={480}
        height={360}
        loading="eager"
        className="absolute inset-0 m-auto h-4/5 w-4/5 object-contain opacity-30 grayscale"
      />
      <p
        role="status"
        className="relative flex items-center gap-2.5 rounded-field border border-hair bg-sheet px-3.5 py-2.5 font-semibold text-sm"
      >
        <LoaderCircle aria-hidden="true" size={20} className="animate-spin text-petrol" />
        {words}
      </p>
    </div>
  );
}
