import type { Sent } from '@/components/forms/send';
import type { Design as Part } from '@/generators/url-state';
import type { Design } from '@/lib/access/designs';

export type Saving =
  | { readonly status: 'saved' | 'unsaved' | 'saving'; readonly at: string }
  | { readonly status: 'conflict'; readonly at: string }
  | { readonly status: 'failed'; readonly at: string; readonly message: string };

type Answer = Pick<Design, 'revision' | 'changedAt'>;

interface Port<A extends Answer> {
  /** saves a part on top of a revision; `apart`: what stood before it stays in the history */
  readonly save: (revision: number, part: Part, apart: boolean) => Promise<Sent<A>>;
  /** what stands on the server */
  readonly load: () => Promise<Sent<A>>;
  readonly tell: (saving: Saving) => void;
}

/**
 * Saves one design as it changes: one save at a time, the latest part wins. A conflict stops the saving until one of
 * the two is chosen; a save that failed is tried again with the next change, or when asked.
 */
export function createSaver<A extends Answer>(start: Answer, { save, load, tell }: Port<A>) {
  let { revision, changedAt: at } = start;
  let waiting: Part | null = null;
  let busy = false;
  let stopped = false;
  let apart = false;

  function settle(sent: Sent<A>, part: Part): void {
    if (sent.ok) {
      ({ revision, changedAt: at } = sent.value);
      apart = false;
      tell({ status: waiting ? 'unsaved' : 'saved', at });
      return;
    }
    waiting ??= part;
    stopped = sent.status === 409;
    tell(stopped ? { status: 'conflict', at } : { status: 'failed', at, message: sent.message });
  }

  async function run(): Promise<void> {
    while (waiting && !busy && !stopped) {
      const part: Part = waiting;
      waiting = null;
      busy = true;
      tell({ status: 'saving', at });
      const sent = await save(revision, part, apart);
      busy = false;
      settle(sent, part);
      if (!sent.ok) return;
    }
  }

  return {
    /** A change that is to be saved at the next `flush`. */
    note(part: Part): void {
      waiting = part;
      if (!stopped && !busy) tell({ status: 'unsaved', at });
    },
    flush: run,
    get unsaved(): boolean {
      return waiting !== null || busy;
    },
    /** Saves what stands here over what was saved elsewhere. */
    async keepMine(): Promise<void> {
      const theirs = await load();
      if (!theirs.ok) return tell({ status: 'failed', at, message: theirs.message });
      ({ revision } = theirs.value);
      stopped = false;
      apart = true;
      return run();
    },
    /** Takes what was saved elsewhere and forgets what stands here; null where it cannot be had. */
    async takeTheirs(): Promise<A | null> {
      const theirs = await load();
      if (!theirs.ok) {
        tell({ status: 'failed', at, message: theirs.message });
        return null;
      }
      ({ revision, changedAt: at } = theirs.value);
      waiting = null;
      stopped = false;
      tell({ status: 'saved', at });
      return theirs.value;
    },
  };
}

export type Saver = ReturnType<typeof createSaver<Design>>;
