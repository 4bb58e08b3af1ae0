import { Pressable, StyleSheet, Text, View } from 'react-native';

import { FieldFrame } from './field-frame';
import { describedBy, useFieldIds } from './field-ids';
import { colors, radius, space, stroke, target, type } from './tokens';
import { useLayout } from './use-layout';
import { useRadioGroup } from './use-radio-group';
import { web } from './web';

interface SegmentedProps<Value extends string> {
  name: string;
  /** Names the group. */
  label: string;
  options: readonly { value: Value; label: string }[];
  /** Null while nothing is chosen. */
  value: Value | null;
  onChange: (value: Value) => void;
  hint?: string;
  error?: string;
}

/** Two to four short choices side by side, one of them chosen. */
export function Segmented<Value extends string>({
  name,
  label,
  options,
  value,
  onChange,
  hint,
  error,
}: SegmentedProps<Value>) {
  const ids = useFieldIds(name);
  const radioProps = useRadioGroup(options, value, onChange);
  const stacked = useLayout().textScale >= LARGE_TEXT;
  return (
    <FieldFrame ids={ids} label={label} hint={hint} error={error} labelsInput={false}>
      <View
        id={ids.input}
        role="radiogroup"
        aria-labelledby={ids.label}
        style={[styles.group, stacked && styles.stacked, error ? styles.wrong : null]}
        {...web({ tabIndex: -1, 'aria-describedby': describedBy(ids, hint, error) })}
      >
        {options.map((option, index) => {
          const chosen = option.value === value;
          return (
            <Pressable
              key={option.value}
              {...radioProps(index)}
              style={({ pressed }) => [
                styles.segment,
                index === 0 ? styles.first : styles.divided,
                index === options.length - 1 && styles.last,
                pressed && styles.pressed,
                chosen && styles.chosen,
              ]}
            >
              <Text
                style={[
                  type.button,
                  styles.word,
                  { color: chosen ? colors.onChosen : colors.action },
                ]}
              >
                {option.label}
              </Text>
            </Pressable>
          );
        })}
      </View>
    </FieldFrame>
  );
}

/** From here on words side by side would break in the middle. */
const LARGE_TEXT = 1.5;
const INNER = radius.control - stroke.control;

const styles = StyleSheet.create({
  group: {
    flexDirection: 'row',
    borderWidth: stroke.control,
    borderColor: colors.action,
    borderRadius: radius.control,
    backgroundColor: colors.page,
  },
  stacked: { flexDirection: 'column' },
  wrong: { borderColor: colors.stop },
  segment: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minHeight: target.base,
    justifyContent: 'center',
    paddingHorizontal: space[2],
    paddingVertical: space[1],
  },
  first: { borderTopLeftRadius: INNER, borderBottomLeftRadius: INNER },
  last: { borderTopRightRadius: INNER, borderBottomRightRadius: INNER },
  divided: { borderLeftWidth: stroke.hairline, borderLeftColor: colors.action },
  pressed: { backgroundColor: colors.hover },
  chosen: { backgroundColor: colors.chosen },
  word: { textAlign: 'center' },
});
