import type { ReactNode } from 'react';
import { StyleSheet, Text, View } from 'react-native';

import { VerdictIcon } from './icon';
import type { FieldIds } from './field-ids';
import { Label, Small } from './text';
import { colors, space, type } from './tokens';

interface FieldFrameProps {
  ids: FieldIds;
  label: string;
  hint?: string;
  error?: string;
  /** A word at the right of the label: "optional". */
  remark?: string;
  /** False for groups of radios and boxes, whose label names the group and not one input. */
  labelsInput?: boolean;
  children: ReactNode;
}

/** Label above, control, hint and error below, tied by ids. */
export function FieldFrame({
  ids,
  label,
  hint,
  error,
  remark,
  labelsInput = true,
  children,
}: FieldFrameProps) {
  return (
    <View style={styles.frame}>
      <View style={styles.head}>
        {labelsInput ? (
          <label htmlFor={ids.input} id={ids.label} style={{ flexShrink: 1 }}>
            <Label>{label}</Label>
          </label>
        ) : (
          <Label id={ids.label}>{label}</Label>
        )}
        {remark ? <Small>{remark}</Small> : null}
      </View>
      {children}
      {error ? (
        <View id={ids.error} style={styles.error}>
          <VerdictIcon verdict="stop" size={18} />
          <Text style={[type.label, styles.errorText]}>{error}</Text>
        </View>
      ) : null}
      {hint ? <Small id={ids.hint}>{hint}</Small> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { gap: space[1], minWidth: 0 },
  head: { flexDirection: 'row', justifyContent: 'space-between', gap: space[2] },
  error: { flexDirection: 'row', alignItems: 'flex-start', gap: space[2], paddingTop: 2 },
  errorText: { color: colors.stop, flexShrink: 1 },
});
