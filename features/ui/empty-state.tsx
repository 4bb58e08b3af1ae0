import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Icon } from './icon';
import type { IconName } from './icon-paths';
import { Body, Heading } from './text';
import { colors, measure, space, stroke } from './tokens';

interface EmptyStateProps {
  /** "No wheels yet". */
  title: string;
  /** What the list is for. */
  children: string;
  /** The first action. */
  action?: ReactNode;
  icon?: IconName;
}

/** Stands where a list will stand: says what it is for and offers the first action. */
export function EmptyState({ title, children, action, icon }: EmptyStateProps) {
  return (
    <View style={styles.empty}>
      {icon ? <Icon name={icon} size={40} color="textSoft" /> : null}
      <Heading>{title}</Heading>
      <Body tone="textSoft">{children}</Body>
      {action ? <View style={styles.action}>{action}</View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  empty: {
    padding: space[6],
    gap: space[2],
    maxWidth: measure.form,
    borderLeftWidth: stroke.index,
    borderLeftColor: colors.rule,
  },
  action: { flexDirection: 'row', flexWrap: 'wrap', gap: space[2], paddingTop: space[2] },
});
