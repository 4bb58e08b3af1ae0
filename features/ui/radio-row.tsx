import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { ChoiceList } from './choice-list';
import { FieldFrame } from './field-frame';
import { describedBy, useFieldIds } from './field-ids';
import { Label, Small, Strong } from './text';
import { space } from './tokens';

export interface RadioRowOption<Value extends string> {
  value: Value;
  label: string;
  /** A second line: sizes, where it hangs. */
  detail?: string;
  /** Why it cannot be chosen; such a row can still be read. */
  lockedBecause?: string;
  /** Stands at the right edge, and is not spoken: say it in the detail too. */
  aside?: ReactNode;
}

interface RadioRowsProps<Value extends string> {
  name: string;
  label: string;
  options: readonly RadioRowOption<Value>[];
  value: Value | null;
  onChange: (value: Value) => void;
  hint?: string;
  error?: string;
}

/** Choices as full rows with room for a reason, one of them chosen. */
export function RadioRows<Value extends string>({
  name,
  label,
  options,
  value,
  onChange,
  hint,
  error,
}: RadioRowsProps<Value>) {
  const ids = useFieldIds(name);
  return (
    <FieldFrame ids={ids} label={label} hint={hint} error={error} labelsInput={false}>
      <ChoiceList
        id={ids.input}
        labelledBy={ids.label}
        describedBy={describedBy(ids, hint, error)}
        value={value}
        onChange={onChange}
        options={options.map((option) => ({
          value: option.value,
          locked: Boolean(option.lockedBecause),
          spoken: [option.label, option.detail, option.lockedBecause].filter(Boolean).join(', '),
          face: <RadioFace option={option} chosen={option.value === value} />,
        }))}
      />
    </FieldFrame>
  );
}

interface RadioFaceProps {
  option: RadioRowOption<string>;
  chosen: boolean;
}

function RadioFace({ option, chosen }: RadioFaceProps) {
  const Name = chosen ? Strong : Label;
  return (
    <>
      <View style={styles.words}>
        <Name>{option.label}</Name>
        {option.detail ? <Small>{option.detail}</Small> : null}
        {option.lockedBecause ? <Small tone="stop">{option.lockedBecause}</Small> : null}
      </View>
      {option.aside ? <View style={styles.aside}>{option.aside}</View> : null}
    </>
  );
}

const styles = StyleSheet.create({
  words: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
    justifyContent: 'center',
    paddingVertical: space[2],
  },
  aside: { justifyContent: 'center' },
});
