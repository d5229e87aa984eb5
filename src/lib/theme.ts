import { useSyncExternalStore } from 'react';
import { keep, readKept } from './device-storage.js';

export const THEMES = ['default', 'contrast', 'ink'] as const;
export type Theme = (typeof THEMES)[number];

const KEY = 'theme';
const listeners = new Set<() => void>();
let current: Theme = 'default';

/** Before the first picture: what the person chose on this device, else what their system asks for. */
export function startTheme(): void {
  const kept = readKept(KEY);
  const wantsContrast = typeof matchMedia === 'function' && matchMedia('(prefers-contrast: more)').matches;
  show(isTheme(kept) ? kept : wantsContrast ? 'contrast' : 'default');
}

export function useTheme(): [Theme, (theme: Theme) => void] {
  const theme = useSyncExternalStore(listen, () => current);
  return [theme, chooseTheme];
}

function chooseTheme(theme: Theme): void {
  keep(KEY, theme);
  show(theme);
}

function show(theme: Theme): void {
  current = theme;
  if (theme === 'default') delete document.documentElement.dataset['theme'];
  else document.documentElement.dataset['theme'] = theme;
  listeners.forEach((listener) => {
    listener();
  });
}

function listen(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function isTheme(value: unknown): value is Theme {
  return (THEMES as readonly unknown[]).includes(value);
}
