import { createContext, useContext, useEffect, useMemo, useSyncExternalStore } from 'react';
import type { ReactNode } from 'react';

import { palettes } from './tokens';
import type { PaletteName } from './tokens';

export const PALETTE_CHOICES = ['system', 'day', 'night'] as const;
export type PaletteChoice = (typeof PALETTE_CHOICES)[number];

interface Theme {
  /** What the reader chose. */
  choice: PaletteChoice;
  /** The palette that is on. */
  palette: PaletteName;
  choose: (choice: PaletteChoice) => void;
}

// public/palette.js reads the same key before React starts.
const STORAGE_KEY = 'ringtrue.palette';
const DARK = '(prefers-color-scheme: dark)';
const listeners = new Set<() => void>();

const isChoice = (value: string | null): value is PaletteChoice =>
  PALETTE_CHOICES.some((choice) => choice === value);

/** What was chosen in this tab when the browser refuses to store it. */
let unstored: PaletteChoice = 'system';

function storedChoice(): PaletteChoice {
  try {
    const value = window.localStorage.getItem(STORAGE_KEY);
    return isChoice(value) ? value : unstored;
  } catch {
    return unstored;
  }
}

const darkQuery = () =>
  typeof window !== 'undefined' && typeof window.matchMedia === 'function'
    ? window.matchMedia(DARK)
    : null;

function subscribe(listener: () => void) {
  if (typeof window === 'undefined' || typeof window.addEventListener !== 'function')
    return () => {};
  const query = darkQuery();
  listeners.add(listener);
  query?.addEventListener('change', listener);
  window.addEventListener('storage', listener);
  return () => {
    listeners.delete(listener);
    query?.removeEventListener('change', listener);
    window.removeEventListener('storage', listener);
  };
}

function choose(choice: PaletteChoice) {
  unstored = choice;
  try {
    window.localStorage.setItem(STORAGE_KEY, choice);
  } catch {
    // Private windows may refuse; the choice then lasts as long as the tab.
  }
  listeners.forEach((listener) => listener());
}

function showOnPage(choice: PaletteChoice, palette: PaletteName) {
  if (typeof document === 'undefined') return;
  if (choice === 'system') delete document.documentElement.dataset.palette;
  else document.documentElement.dataset.palette = choice;
  document
    .querySelectorAll('meta[name="theme-color"]')
    .forEach((meta) => meta.setAttribute('content', palettes[palette].header));
}

const ThemeContext = createContext<Theme>({ choice: 'system', palette: 'day', choose });

/** Provides the palette: follows the system until the reader chooses, and remembers the choice. */
export function ThemeProvider({ children }: { children: ReactNode }) {
  const choice = useSyncExternalStore(subscribe, storedChoice, () => 'system' as const);
  const dark = useSyncExternalStore(
    subscribe,
    () => darkQuery()?.matches ?? false,
    () => false,
  );
  const palette = choice === 'system' ? (dark ? 'night' : 'day') : choice;
  useEffect(() => showOnPage(choice, palette), [choice, palette]);
  const theme = useMemo(() => ({ choice, palette, choose }), [choice, palette]);
  return <ThemeContext value={theme}>{children}</ThemeContext>;
}

export const useTheme = () => useContext(ThemeContext);
