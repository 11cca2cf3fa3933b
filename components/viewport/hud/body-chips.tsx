'use client';
import { bodyWords } from '../describe';
import type { BodyStyle } from '../scene-props';

const NEXT: Readonly<Record<BodyStyle, BodyStyle>> = {
  solid: 'see-through',
  'see-through': 'hidden',
  hidden: 'solid',
};
const MARK: Readonly<Record<BodyStyle, string>> = {
  solid: 'bg-current',
  'see-through': 'bg-current/30 border-current',
  hidden: 'border-dashed border-current',
};

interface ChipsProps {
  readonly bodies: readonly { readonly name: string; readonly colour: string }[];
  readonly styles: Readonly<Record<string, BodyStyle>>;
  readonly onStyle: (name: string, style: BodyStyle) => void;
}

/** One button a body: press to see through it, hide it, show it. */
export function BodyChips({ bodies, styles, onStyle }: ChipsProps) {
  return (
    <ul className="flex flex-wrap gap-1.5">
      {bodies.map(({ name, colour }) => {
        const style = styles[name] ?? 'solid';
        return (
          <li key={name}>
            <button
              type="button"
              className="flex min-h-8 items-center gap-1.5 rounded-field border border-hair bg-sheet/90 px-2 text-[13px] text-ink hover:bg-petrol-soft"
              title={`Show the ${bodyWords(name)} ${NEXT[style].replace('-', ' ')}`}
              onClick={() => onStyle(name, NEXT[style])}
            >
              <span aria-hidden="true" style={{ color: colour }} className="flex">
                <span className={`size-3 rounded-[2px] border ${MARK[style]}`} />
              </span>
              {bodyWords(name)}
              <span className="text-muted">{style.replace('-', ' ')}</span>
            </button>
          </li>
        );
      })}
    </ul>
  );
}
