import type { KeyboardEvent } from 'react';
import { VIEWS, type ViewCommands } from './drawing/views';

/** Degrees an arrow key turns the part. */
const STEP = 10;
const CLOSER = 1.2;

type Act = (commands: ViewCommands) => void;

const ACTS: Readonly<Record<string, Act>> = {
  ArrowLeft: (commands) => commands.turn(-STEP, 0),
  ArrowRight: (commands) => commands.turn(STEP, 0),
  ArrowUp: (commands) => commands.turn(0, STEP),
  ArrowDown: (commands) => commands.turn(0, -STEP),
  '+': (commands) => commands.zoom(CLOSER),
  '=': (commands) => commands.zoom(CLOSER),
  '-': (commands) => commands.zoom(1 / CLOSER),
  '0': (commands) => commands.fit(),
  f: (commands) => commands.fit(),
  F: (commands) => commands.fit(),
  ...Object.fromEntries(VIEWS.map(({ key, name }) => [key, (commands: ViewCommands) => commands.look(name)])),
};

export function viewKey(event: KeyboardEvent, commands: ViewCommands | null): void {
  if (event.key === 'Escape') (event.currentTarget as HTMLElement).blur();
  if (!commands || event.ctrlKey || event.metaKey || event.altKey) return;
  const act = ACTS[event.key];
  if (!act) return;
  event.preventDefault();
  act(commands);
}
