'use client';
import { VIEWS, type ViewCommands } from '../drawing/views';

const SHOWN = ['front', 'top', 'right', 'corner'];
const BUTTON =
  'min-h-8 min-w-8 rounded-field px-2 text-[13px] text-ink hover:bg-petrol-soft focus-visible:outline-offset-0';

export function ViewButtons({ commands }: { commands: ViewCommands | null }) {
  return (
    <fieldset className="flex rounded-sheet border border-hair bg-sheet/90 p-0.5">
      <legend className="sr-only">View</legend>
      <button
        type="button"
        className={`${BUTTON} font-semibold`}
        title="Fit in the picture (F)"
        disabled={!commands}
        onClick={() => commands?.fit()}
      >
        Fit
      </button>
      {VIEWS.filter(({ name }) => SHOWN.includes(name)).map(({ name, label, key }) => (
        <button
          key={name}
          type="button"
          className={BUTTON}
          title={`${label} view (${key})`}
          disabled={!commands}
          onClick={() => commands?.look(name)}
        >
          {label}
        </button>
      ))}
    </fieldset>
  );
}
