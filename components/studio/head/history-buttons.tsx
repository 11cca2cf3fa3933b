'use client';

import { Redo2, Undo2 } from 'lucide-react';
import { useStore } from 'zustand';
import { Button } from '@/components/ui/button';
import { useSession } from '../session-context';

export function HistoryButtons() {
  const session = useSession();
  const back = useStore(session.history, ({ pastStates }) => pastStates.length > 0);
  const forth = useStore(session.history, ({ futureStates }) => futureStates.length > 0);
  return (
    <div className="flex">
      <Button look="quiet" aria-label="Undo" disabled={!back} onClick={session.undo} className="px-2.5!">
        <Undo2 size={19} />
      </Button>
      <Button look="quiet" aria-label="Redo" disabled={!forth} onClick={session.redo} className="px-2.5!">
        <Redo2 size={19} />
      </Button>
    </div>
  );
}
