'use client';

import { Monitor, Moon, Sun } from 'lucide-react';
import { useSyncExternalStore } from 'react';
import { Segmented } from '@/components/ui/segmented';
import { keptTheme, setTheme, type Theme } from './theme';

const OPTIONS = [
  { value: 'light', label: 'Light', show: <Sun size={16} /> },
  { value: 'dark', label: 'Dark', show: <Moon size={16} /> },
  { value: 'system', label: 'As the system', show: <Monitor size={16} /> },
] as const;

const listeners = new Set<() => void>();

function subscribe(listener: () => void) {
  listeners.add(listener);
  window.addEventListener('storage', listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener('storage', listener);
  };
}

export function ThemeSwitch() {
  const theme = useSyncExternalStore<Theme>(subscribe, keptTheme, () => 'system');
  const choose = (next: Theme) => {
    setTheme(next);
    for (const listener of listeners) listener();
  };
  return <Segmented legend="Palette" value={theme} options={OPTIONS} onChange={choose} />;
}
