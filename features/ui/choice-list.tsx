import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { colors, space, stroke, target } from './tokens';
import { useRadioGroup } from './use-radio-group';
import { web } from './web';

/** The ring of a radio, with its disc when chosen. Decoration: the row carries the role. */
function RadioMark({ chosen, locked = false }: { chosen: boolean; locked?: boolean }) {
  return (
    <View style={[styles.ring, locked && styles.ringLocked]}>
      {chosen ? <View style={[styles.disc, locked && styles.discLocked]} /> : null}
    </View>
  );
}

export interface ChoiceOption<Value extends string> {
  value: Value;
  /** Can be reached and read, not chosen. */
  locked?: boolean;
  /** The row's content, without its radio. It is also what is spoken, unless `spoken` is given. */
  face: ReactNode;
  spoken?: string;
}

interface ChoiceListProps<Value extends string> {
  /** Names the group; or labelledBy, the id of words that name it. */
  label?: string;
  labelledBy?: string;
  describedBy?: string;
  id?: string;
  options: readonly ChoiceOption<Value>[];
  value: Value | null;
  onChange: (value: Value) => void;
  /** The choice is shown and cannot be changed. */
  readOnly?: boolean;
}

/** Rows to choose one from: ring, content, and the brass mark at the chosen one. */
export function ChoiceList<Value extends string>({
  label,
  labelledBy,
  describedBy,
  id,
  options,
  value,
  onChange,
  readOnly = false,
}: ChoiceListProps<Value>) {
  const radioProps = useRadioGroup(
    options.map((option) => ({ value: option.value, locked: readOnly || option.locked })),
    value,
    onChange,
  );
  return (
    <View
      id={id}
      role="radiogroup"
      aria-label={label}
      aria-labelledby={labelledBy}
      style={styles.group}
      {...web({ tabIndex: -1, 'aria-describedby': describedBy })}
    >
      {options.map((option, index) => {
        const chosen = option.value === value;
        return (
          <Pressable
            key={option.value}
            {...radioProps(index)}
            aria-label={option.spoken}
            style={({ pressed }) => [
              styles.row,
              index > 0 && styles.ruled,
              (chosen || (pressed && !option.locked && !readOnly)) && styles.rowChosen,
              (option.locked || readOnly) && styles.rowLocked,
            ]}
          >
            <View style={[styles.mark, chosen && styles.markOn]} />
            <View style={styles.radio}>
              <RadioMark chosen={chosen} locked={option.locked} />
            </View>
            <View style={styles.face}>{option.face}</View>
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  ring: {
    width: 22,
    height: 22,
    borderRadius: 11,
    borderWidth: stroke.heavy,
    borderColor: colors.text,
    backgroundColor: colors.field,
    alignItems: 'center',
    justifyContent: 'center',
  },
  ringLocked: { borderColor: colors.stop },
  disc: { width: 12, height: 12, borderRadius: 6, backgroundColor: colors.text },
  discLocked: { backgroundColor: colors.stop },
  group: {
    borderTopWidth: stroke.hairline,
    borderBottomWidth: stroke.hairline,
    borderColor: colors.rule,
    backgroundColor: colors.sheet,
  },
  row: {
    flexDirection: 'row',
    minHeight: target.base + space[2],
    paddingLeft: space[4],
    paddingRight: space[3],
    gap: space[3],
  },
  ruled: { borderTopWidth: stroke.hairline, borderTopColor: colors.rule },
  rowChosen: { backgroundColor: colors.field },
  rowLocked: { cursor: 'auto' },
  mark: { position: 'absolute', left: 0, top: 0, bottom: 0, width: stroke.index },
  markOn: { backgroundColor: colors.mark },
  radio: { justifyContent: 'center' },
  face: {
    flexDirection: 'row',
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
    gap: space[3],
  },
});
