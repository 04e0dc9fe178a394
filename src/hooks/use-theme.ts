import { useCallback, useSyncExternalStore } from 'react';

export type Theme = 'light' | 'dark';

const KEY = 'counterpoise-theme';
const DARK_PREFERRED = '(prefers-color-scheme: dark)';
const listeners = new Set<() => void>();

function currentTheme(): Theme {
  const chosen = document.documentElement.dataset['theme'];
  if (chosen === 'light' || chosen === 'dark') return chosen;
  return window.matchMedia(DARK_PREFERRED).matches ? 'dark' : 'light';
}

function subscribe(listener: () => void): () => void {
  const system = window.matchMedia(DARK_PREFERRED);
  listeners.add(listener);
  system.addEventListener('change', listener);
  return () => {
    listeners.delete(listener);
    system.removeEventListener('change', listener);
  };
}

function keepTheme(theme: Theme): void {
  document.documentElement.dataset['theme'] = theme;
  try {
    localStorage.setItem(KEY, theme);
  } catch {
    // Without storage the choice holds for this page only.
  }
  listeners.forEach((listener) => listener());
}

/** The theme on screen (the system's until the reader chooses) and the switch that keeps a choice. */
export function useTheme(): { theme: Theme; switchTheme: () => void } {
  const theme = useSyncExternalStore(subscribe, currentTheme);
  const switchTheme = useCallback(() => keepTheme(currentTheme() === 'dark' ? 'light' : 'dark'), []);
  return { theme, switchTheme };
}
