import { useCallback, useEffect, useSyncExternalStore } from 'react';

/** Paper is the book's daylight; bench light is the dark of the microscope room. */
export type Theme = 'paper' | 'bench light';

/** The book keeps one choice and the bench another, because the bench opens in bench light. */
export type ThemePlace = 'book' | 'bench';

const keys: Record<ThemePlace, string> = { book: 'hb-theme', bench: 'hb-theme-bench' };
const firstChoice: Record<ThemePlace, Theme> = { book: 'paper', bench: 'bench light' };
const listeners = new Set<() => void>();
const hearsBook = new Set<(theme: Theme) => void>();
let place: ThemePlace = 'book';

/** The theme kept for a place on this machine; the place's first choice where none is kept or storage is closed. */
export function readTheme(of: ThemePlace): Theme {
  try {
    const kept = localStorage.getItem(keys[of]);
    return kept === 'paper' || kept === 'bench light' ? kept : firstChoice[of];
  } catch {
    return firstChoice[of];
  }
}

/** Puts the kept theme on the root element. Call once before the first render. */
export function applyTheme(): void {
  document.documentElement.classList.toggle('bench-light', readTheme(place) === 'bench light');
}

function keepTheme(theme: Theme): void {
  try {
    localStorage.setItem(keys[place], theme);
  } catch {
    // A closed storage only means that the choice lasts as long as the page.
  }
  document.documentElement.classList.toggle('bench-light', theme === 'bench light');
  listeners.forEach((tell) => tell());
}

/** Takes the theme that the person keeps for the book, at the sign-in on whatever machine. */
export function takeBookTheme(theme: Theme): void {
  try {
    localStorage.setItem(keys.book, theme);
  } catch {
    // A closed storage only means that the choice lasts as long as the page.
  }
  if (place === 'book') document.documentElement.classList.toggle('bench-light', theme === 'bench light');
  listeners.forEach((tell) => tell());
}

/** Hears what the person chooses for the book, to keep it with their settings. @returns how to stop hearing */
export function onBookThemeChosen(hear: (theme: Theme) => void): () => void {
  hearsBook.add(hear);
  return () => hearsBook.delete(hear);
}

function enter(next: ThemePlace): void {
  place = next;
  applyTheme();
  listeners.forEach((tell) => tell());
}

function listen(tell: () => void): () => void {
  listeners.add(tell);
  return () => listeners.delete(tell);
}

const themeShown = (): Theme => (document.documentElement.classList.contains('bench-light') ? 'bench light' : 'paper');

/** The theme shown, and a setter that keeps the choice for the place and reports it (to the person's settings). */
export function useTheme(onChosen?: (theme: Theme) => void): { theme: Theme; setTheme: (theme: Theme) => void } {
  const theme = useSyncExternalStore(listen, themeShown);
  const setTheme = useCallback(
    (next: Theme) => {
      keepTheme(next);
      onChosen?.(next);
      if (place === 'book') hearsBook.forEach((hear) => hear(next));
    },
    [onChosen],
  );
  return { theme, setTheme };
}

/** Keeps the bench's own theme on the root while the bench is open, and gives the book's back on leaving. */
export function useBenchPlace(): void {
  useEffect(() => {
    enter('bench');
    return () => enter('book');
  }, []);
}
