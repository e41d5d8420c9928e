import { useSyncExternalStore } from 'react';

export type ThemeChoice = 'system' | 'paper' | 'blueprint';
const STORAGE_KEY = 'dextral.theme';
const listeners = new Set<() => void>();

export function themeChoice(): ThemeChoice {
  try {
    const stored = localStorage.getItem(STORAGE_KEY);
    return stored === 'paper' || stored === 'blueprint' ? stored : 'system';
  } catch {
    return 'system';
  }
}

/** Applies a theme at once and remembers it in this browser. */
export function chooseTheme(choice: ThemeChoice): void {
  try {
    if (choice === 'system') localStorage.removeItem(STORAGE_KEY);
    else localStorage.setItem(STORAGE_KEY, choice);
  } catch {
    // Without storage the choice lasts until the page is left.
  }
  const dark = choice === 'blueprint' || (choice === 'system' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset['theme'] = dark ? 'blueprint' : 'paper';
  for (const listener of listeners) listener();
}

export function useThemeChoice(): ThemeChoice {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, themeChoice);
}
