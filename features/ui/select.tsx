import { useState } from 'react';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { FieldFrame } from './field-frame';
import { describedBy, useFieldIds } from './field-ids';
import { Icon } from './icon';
import { RadioRows } from './radio-row';
import type { RadioRowOption } from './radio-row';
import { Sheet } from './sheet';
import { Body, Small } from './text';
import { colors, radius, space, stroke, target } from './tokens';
import { web } from './web';

interface SelectProps<Value extends string> {
  name: string;
  label: string;
  options: readonly RadioRowOption<Value>[];
  value: Value | null;
  onChange: (value: Value) => void;
  /** Shown while nothing is chosen: "Choose a lathe". */
  empty?: string;
  /** A fact about the choice, at the right edge of the button: "9 speeds". */
  aside?: string;
  hint?: string;
  error?: string;
  /** At the foot of the list: "Add a lathe". */
  footer?: ReactNode;
}

/** One choice from a list too long to stand open. The button shows the choice and opens the list. */
export function Select<Value extends string>({
  name,
  label,
  options,
  value,
  onChange,
  empty = 'Choose',
  aside,
  hint,
  error,
  footer,
}: SelectProps<Value>) {
  const ids = useFieldIds(name);
  const [open, setOpen] = useState(false);
  const chosen = options.find((option) => option.value === value);
  const valueId = `${ids.input}-value`;
  return (
    <FieldFrame ids={ids} label={label} hint={hint} error={error} labelsInput={false}>
      <Pressable
        id={ids.input}
        role="button"
        aria-labelledby={`${ids.label} ${valueId}`}
        aria-expanded={open}
        onPress={() => setOpen(true)}
        style={({ pressed }) => [
          styles.box,
          error ? styles.wrong : null,
          pressed && styles.pressed,
        ]}
        {...web({
          'aria-haspopup': 'dialog',
          'aria-describedby': describedBy(ids, hint, error),
        })}
      >
        <View id={valueId} style={styles.value}>
          <Body tone={chosen ? 'text' : 'textSoft'}>{chosen?.label ?? empty}</Body>
        </View>
        {aside ? <Small>{aside}</Small> : null}
        <Icon name="down" size={20} color="textSoft" />
      </Pressable>
      <Sheet open={open} onClose={() => setOpen(false)} title={label} footer={footer}>
        <RadioRows
          name={`${name}-list`}
          label={options.length === 0 ? 'Nothing to choose from yet' : empty}
          options={options}
          value={value}
          onChange={(next) => {
            onChange(next);
            setOpen(false);
          }}
        />
      </Sheet>
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  box: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    minHeight: target.base,
    paddingHorizontal: space[3],
    paddingVertical: space[2],
    backgroundColor: colors.field,
    borderWidth: stroke.control,
    borderColor: colors.outline,
    borderRadius: radius.control,
  },
  wrong: { borderColor: colors.stop, borderWidth: stroke.heavy },
  pressed: { backgroundColor: colors.hover },
  value: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
});
