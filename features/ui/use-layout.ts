import { useCallback, useState, useSyncExternalStore } from 'react';
import { useWindowDimensions } from 'react-native';
import type { LayoutChangeEvent } from 'react-native';

import { breakpoint } from './tokens';

function textScale(): number {
  if (typeof document === 'undefined' || typeof getComputedStyle !== 'function') return 1;
  const size = parseFloat(getComputedStyle(document.documentElement).fontSize);
  return Number.isFinite(size) && size > 0 ? size / 16 : 1;
}

interface Layout {
  /** Rail and two panes; false is the phone's layout. */
  wide: boolean;
  /** Too narrow for the reader's text size to show things side by side. */
  cramped: boolean;
  width: number;
  height: number;
  /** The reader's own text size over the usual one: 2 is 200 %. */
  textScale: number;
}

/** How much room there is. Large text counts as a narrower window. */
export function useLayout(): Layout {
  const { width, height } = useWindowDimensions();
  const scale = textScale();
  const room = width / scale;
  return { wide: room >= breakpoint.wide, cramped: room < 360, width, height, textScale: scale };
}

/** The width given to an element, for pictures that draw to it. Null until it is known. */
export function useMeasuredWidth(): [number | null, (event: LayoutChangeEvent) => void] {
  const [width, setWidth] = useState<number | null>(null);
  const onLayout = useCallback(
    (event: LayoutChangeEvent) => setWidth(Math.round(event.nativeEvent.layout.width)),
    [],
  );
  return [width, onLayout];
}

const REDUCED = '(prefers-reduced-motion: reduce)';
const query = () =>
  typeof window !== 'undefined' && typeof window.matchMedia === 'function'
    ? window.matchMedia(REDUCED)
    : null;

/** True when the reader asked their system for less movement. */
export function useReducedMotion(): boolean {
  return useSyncExternalStore(
    (listener) => {
      const media = query();
      media?.addEventListener('change', listener);
      return () => media?.removeEventListener('change', listener);
    },
    () => query()?.matches ?? false,
    () => true,
  );
}
