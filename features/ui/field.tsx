import { useState } from 'react';
import type { ReactNode, Ref } from 'react';
import { StyleSheet, Text, TextInput, View } from 'react-native';
import type { TextInputProps } from 'react-native';

import { Button } from './button';
import { FieldFrame } from './field-frame';
import { describedBy, useFieldIds } from './field-ids';
import { colors, radius, space, stroke, target, type } from './tokens';
import { web } from './web';

export interface FieldProps {
  /** The field's path in its form; makes the ids that an error summary links to. */
  name: string;
  label: string;
  /** What was typed, as typed. */
  value: string;
  onChangeText: (text: string) => void;
  onBlur?: () => void;
  onSubmit?: () => void;
  /** What is wanted, with range and unit, before and after a mistake. */
  hint?: string;
  /** What is wrong, naming the field and the range. */
  error?: string;
  /** Set inside the field at its right edge: "mm". */
  unit?: string;
  /** The unit as spoken: "millimetres". */
  spokenUnit?: string;
  /** A word beside the label: "optional". */
  remark?: string;
  /** Decimal brings up the numbers' keyboard; letters stay possible for "1 1/4 in". */
  inputMode?: TextInputProps['inputMode'];
  autoComplete?: TextInputProps['autoComplete'];
  /** A password: hidden, with a button that shows it. */
  secret?: boolean;
  /** Lines of a note; 1 is a single line. */
  lines?: number;
  maxLength?: number;
  required?: boolean;
  readOnly?: boolean;
  /** Shown in the field while it is empty: the suggested value. */
  placeholder?: string;
  /** A control at the right of the field: "Next 270°". */
  beside?: ReactNode;
  inputRef?: Ref<TextInput>;
}

/** A text or number field. It keeps what is typed, whether or not it can be read. */
export function Field({
  name,
  label,
  value,
  onChangeText,
  onBlur,
  onSubmit,
  hint,
  error,
  unit,
  spokenUnit,
  remark,
  inputMode = 'text',
  autoComplete,
  secret = false,
  lines = 1,
  maxLength,
  required,
  readOnly,
  placeholder,
  beside,
  inputRef,
}: FieldProps) {
  const ids = useFieldIds(name);
  const [shown, setShown] = useState(false);
  const unitId = `${ids.input}-unit`;
  const description = [unit ? unitId : null, describedBy(ids, hint, error)]
    .filter(Boolean)
    .join(' ');
  const plain = secret || inputMode === 'email' || inputMode === 'decimal';
  return (
    <FieldFrame ids={ids} label={label} hint={hint} error={error} remark={remark}>
      <View style={styles.row}>
        <View
          style={[styles.box, error ? styles.wrong : null, readOnly && styles.readOnly]}
          {...web({ dataSet: { field: '' } })}
        >
          <TextInput
            ref={inputRef}
            id={ids.input}
            value={value}
            onChangeText={onChangeText}
            onBlur={onBlur}
            onSubmitEditing={onSubmit}
            inputMode={inputMode}
            autoComplete={autoComplete}
            autoCapitalize={plain ? 'none' : 'sentences'}
            autoCorrect={plain ? false : undefined}
            secureTextEntry={secret && !shown}
            multiline={lines > 1}
            numberOfLines={lines > 1 ? lines : undefined}
            maxLength={maxLength}
            readOnly={readOnly}
            placeholder={placeholder}
            placeholderTextColor={colors.textSoft}
            style={[type.value, styles.input, lines > 1 && styles.note]}
            {...web({
              'aria-describedby': description || undefined,
              'aria-invalid': error ? true : undefined,
              'aria-required': required || undefined,
            })}
          />
          {unit ? (
            <>
              <Text aria-hidden style={[type.value, styles.unit]}>
                {unit}
              </Text>
              <Text id={unitId} style={styles.spoken}>
                {`in ${spokenUnit ?? unit}`}
              </Text>
            </>
          ) : null}
          {secret ? (
            <Button
              kind="quiet"
              label={shown ? 'Hide' : 'Show'}
              spoken={shown ? `Hide the ${label}` : `Show the ${label}`}
              onPress={() => setShown(!shown)}
            />
          ) : null}
        </View>
        {beside}
      </View>
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space[3], alignItems: 'stretch' },
  box: {
    flexDirection: 'row',
    alignItems: 'center',
    flexGrow: 1,
    flexShrink: 1,
    minWidth: 0,
    minHeight: target.base,
    backgroundColor: colors.field,
    borderWidth: stroke.control,
    borderColor: colors.outline,
    borderRadius: radius.control,
  },
  wrong: { borderColor: colors.stop, borderWidth: stroke.heavy },
  readOnly: { backgroundColor: colors.well },
  input: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
    alignSelf: 'stretch',
    color: colors.text,
    paddingHorizontal: space[3],
    paddingVertical: space[2],
    borderRadius: radius.control,
  },
  note: { textAlignVertical: 'top' },
  unit: { color: colors.textSoft, paddingRight: space[3], paddingLeft: space[1] },
  spoken: { display: 'none' },
});
