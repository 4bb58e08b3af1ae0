import { useEffect } from 'react';
import { Pressable, StyleSheet, Text, View } from 'react-native';

import { VerdictIcon } from './icon';
import { colors, radius, space, stroke, target, type } from './tokens';
import { focusById, web } from './web';

export interface FieldError {
  /** Id of the field's input: useFieldIdsOf()(name).input. */
  fieldId: string;
  /** The error in words, naming the field. */
  message: string;
}

interface ErrorSummaryProps {
  errors: readonly FieldError[];
  /** Counts the presses of submit: each one brings the focus here again. */
  attempt: number;
  title?: string;
}

const SUMMARY_ID = 'error-summary';

/** What must be put right before a form can be sent. Takes the focus and leads to each field. */
export function ErrorSummary({ errors, attempt, title }: ErrorSummaryProps) {
  const present = errors.length > 0;
  useEffect(() => {
    if (present && attempt > 0) focusById(SUMMARY_ID);
  }, [attempt, present]);
  if (!present) return null;
  const heading =
    title ??
    (errors.length === 1 ? 'One thing to put right' : `${errors.length} things to put right`);
  return (
    <View
      id={SUMMARY_ID}
      role="region"
      aria-label={heading}
      style={styles.summary}
      {...web({ tabIndex: -1 })}
    >
      <View style={styles.head}>
        <VerdictIcon verdict="stop" size={24} />
        <Text role="heading" aria-level={2} style={[type.subheading, styles.heading]}>
          {heading}
        </Text>
      </View>
      <View role="list">
        {errors.map(({ fieldId, message }) => (
          <View key={fieldId} role="listitem">
            <Pressable role="link" onPress={() => focusById(fieldId)} style={styles.link}>
              <Text style={[type.body, styles.message]}>{message}</Text>
            </Pressable>
          </View>
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  summary: {
    padding: space[4],
    gap: space[2],
    borderWidth: stroke.heavy,
    borderColor: colors.stop,
    borderRadius: radius.control,
    backgroundColor: colors.stopTint,
  },
  head: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
  heading: { color: colors.text, flexShrink: 1 },
  link: { minHeight: target.base, justifyContent: 'center' },
  message: { color: colors.text, textDecorationLine: 'underline' },
});
