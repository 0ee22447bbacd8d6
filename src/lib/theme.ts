import { useSyncExternalStore } from 'react';

export type Theme = 'light' | 'dark';
const KEY = 'millpond.theme';
const listeners = new Set<() => void>();
const media = window.matchMedia('(prefers-color-scheme: dark)');

function stored(): Theme | null {
  const value = localStorage.getItem(KEY);
  return value === 'light' || value === 'dark' ? value : null;
}

/** The theme in force: the person's choice, else the system's. */
export function currentTheme(): Theme {
  return stored() ?? (media.matches ? 'dark' : 'light');
}

export function applyTheme(): void {
  document.documentElement.dataset.theme = currentTheme();
  for (const listener of listeners) listener();
}

export function setTheme(theme: Theme): void {
  localStorage.setItem(KEY, theme);
  applyTheme();
}

media.addEventListener('change', applyTheme);

export function useTheme(): Theme {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, currentTheme);
}
