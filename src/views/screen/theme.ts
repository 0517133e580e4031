/** Light, dark or as the system has it: a habit of this reader, kept apart from the project. */
import { useSyncExternalStore } from 'react';

export const THEMES = [
  { id: 'system', label: 'As system' },
  { id: 'light', label: 'Light' },
  { id: 'dark', label: 'Dark' },
] as const;

export type Theme = (typeof THEMES)[number]['id'];

const KEY = 'headwright-theme';
const listeners = new Set<() => void>();

const themeOf = (text: string | null | undefined): Theme => THEMES.find((theme) => theme.id === text)?.id ?? 'system';

/** A browser may refuse its storage; the theme then lasts as long as the page. */
function kept(): Theme {
  try {
    return themeOf(window.localStorage.getItem(KEY));
  } catch {
    return 'system';
  }
}

const current = (): Theme => themeOf(document.documentElement.dataset.theme);

export function setTheme(theme: Theme): void {
  document.documentElement.dataset.theme = theme;
  try {
    window.localStorage.setItem(KEY, theme);
  } catch {
    // The choice still holds for this page.
  }
  for (const changed of listeners) changed();
}

/** Applies the kept theme before the first drawing. */
export function startTheme(): void {
  document.documentElement.dataset.theme = kept();
}

export const useTheme = (): Theme =>
  useSyncExternalStore((changed) => {
    listeners.add(changed);
    return () => listeners.delete(changed);
  }, current);
