import { useId } from 'react';
import type { KeyboardEvent } from 'react';

import { focusById, web } from './web';

export interface RadioOption<Value extends string> {
  value: Value;
  /** Can be reached and read, not chosen. */
  locked?: boolean;
}

const STEPS: Record<string, number> = { ArrowDown: 1, ArrowRight: 1, ArrowUp: -1, ArrowLeft: -1 };

/**
 * Keyboard and spoken roles of a group of radio rows: one stop for the tab key, arrows move and choose.
 * A locked row takes the focus, so that its reason can be read, and stays unchosen.
 */
export function useRadioGroup<Value extends string>(
  options: readonly RadioOption<Value>[],
  chosen: Value | null,
  onChoose: (value: Value) => void,
) {
  const group = useId();
  const idOf = (index: number) => `${group}-${index}`;
  const chosenIndex = options.findIndex((option) => option.value === chosen);
  const tabStop = chosenIndex >= 0 ? chosenIndex : options.findIndex((option) => !option.locked);

  const chooseAt = (index: number) => {
    const option = options[index];
    if (option && !option.locked && option.value !== chosen) onChoose(option.value);
  };

  return (index: number) => ({
    id: idOf(index),
    role: 'radio' as const,
    'aria-checked': index === chosenIndex,
    // The primitive says aria-disabled for it; keys still arrive.
    disabled: options[index]?.locked ?? false,
    onPress: () => chooseAt(index),
    ...web({
      tabIndex: index === Math.max(tabStop, 0) ? 0 : -1,
      onKeyDown: (event: KeyboardEvent) => {
        const step = STEPS[event.key];
        if (event.key === ' ') {
          event.preventDefault();
          chooseAt(index);
        } else if (step !== undefined) {
          event.preventDefault();
          const next = (index + step + options.length) % options.length;
          chooseAt(next);
          focusById(idOf(next));
        }
      },
    }),
  });
}
