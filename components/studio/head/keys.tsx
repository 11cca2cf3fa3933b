import { Keyboard } from 'lucide-react';
import { buttonClass } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { Note } from '@/components/ui/note';

const KEYS: readonly { keys: string; does: string }[] = [
  { keys: '↑ ↓', does: 'one step in a number field' },
  { keys: 'Shift ↑ ↓', does: 'ten steps; Page Up and Page Down too' },
  { keys: '?', does: 'what the field you are in means' },
  { keys: 'Ctrl Z', does: 'undo; Cmd on a Mac' },
  { keys: 'Ctrl Shift Z', does: 'redo; Ctrl Y too' },
  { keys: 'Esc', does: 'close a note' },
  { keys: '← → ↑ ↓', does: 'turn the part, in the picture' },
  { keys: '+ − F', does: 'nearer, farther, fit' },
  { keys: '1 … 7', does: 'standard views' },
];

export function Keys() {
  return (
    <Note
      aria-label="Keys"
      className={classNames(buttonClass('quiet'), 'px-2.5! pointer-coarse:hidden')}
      trigger={<Keyboard aria-hidden="true" size={19} />}
    >
      <h2 className="mb-2 font-bold">Keys</h2>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1.5">
        {KEYS.map(({ keys, does }) => (
          <div key={keys} className="contents">
            <dt>
              <kbd className="whitespace-nowrap rounded-field border border-edge px-1.5 font-mono text-xs">
                {keys}
              </kbd>
            </dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
    </Note>
  );
}
