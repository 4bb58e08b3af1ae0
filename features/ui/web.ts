import type { KeyboardEvent } from 'react';

/** Properties that react-native-web hands to the page and React Native's types leave out. */
interface WebProps {
  onKeyDown?: (event: KeyboardEvent) => void;
  tabIndex?: 0 | -1;
  /** Becomes data attributes, for the few styles that need a selector. */
  dataSet?: Record<string, string>;
  'aria-controls'?: string;
  'aria-current'?: 'page' | 'step' | 'true';
  'aria-describedby'?: string;
  'aria-haspopup'?: 'dialog' | 'listbox' | 'menu';
  'aria-invalid'?: boolean;
  'aria-required'?: boolean;
  'aria-pressed'?: boolean;
  'aria-posinset'?: number;
  'aria-setsize'?: number;
  'aria-valuetext'?: string;
}

/** Spread into a component: `<View {...web({ onKeyDown })} />`. */
export const web = (props: WebProps): object => props;

/** Moves the focus to an element of the page, and the page to the element. */
export function focusById(id: string): boolean {
  const element = typeof document === 'undefined' ? null : document.getElementById(id);
  if (!element) return false;
  element.focus({ preventScroll: true });
  element.scrollIntoView?.({ block: 'center' });
  return document.activeElement === element;
}
