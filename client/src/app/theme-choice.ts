import { useSyncExternalStore } from 'react';

export type ThemeChoice = 'system' | 'light' | 'dark';

const key = 'weighhouse.theme';
const dark = matchMedia('(prefers-color-scheme: dark)');
// Paper is white: a dark page would print light text on it.
const paper = matchMedia('print');
const listeners = new Set<() => void>();

function choice(): ThemeChoice {
  const stored = localStorage.getItem(key);
  return stored === 'light' || stored === 'dark' ? stored : 'system';
}

function appearance(): 'light' | 'dark' {
  if (paper.matches) return 'light';
  const chosen = choice();
  if (chosen !== 'system') return chosen;
  return dark.matches ? 'dark' : 'light';
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  dark.addEventListener('change', listener);
  paper.addEventListener('change', listener);
  return () => {
    listeners.delete(listener);
    dark.removeEventListener('change', listener);
    paper.removeEventListener('change', listener);
  };
}

export function chooseTheme(chosen: ThemeChoice): void {
  localStorage.setItem(key, chosen);
  for (const listener of listeners) listener();
}

export const useThemeChoice = () => useSyncExternalStore(subscribe, choice);
export const useAppearance = () => useSyncExternalStore(subscribe, appearance);

/**
 * Paper is white, and a dark page would print light text on it. Past React, because the paper is laid out as soon as
 * the event's listeners return.
 */
const swapOnPaper = (from: string, to: string) => {
  for (const theme of document.querySelectorAll(`.radix-themes.${from}`)) theme.classList.replace(from, to);
};
window.addEventListener('beforeprint', () => {
  swapOnPaper('dark', 'light');
});
window.addEventListener('afterprint', () => {
  if (appearance() === 'dark') swapOnPaper('light', 'dark');
});
