import type { ReactNode } from 'react';
import { StyleSheet, Text, View } from 'react-native';

import { Icon } from './icon';
import { colors, radius, space, stroke, type } from './tokens';

interface NoticeProps {
  /** What happened, and what to do next. */
  children: ReactNode;
  /** Error interrupts the reader; the others wait for a pause. */
  kind?: 'status' | 'done' | 'error';
  /** A retry, a way out. */
  action?: ReactNode;
}

/** A message in its place: saved, not sent yet, could not be reached. */
export function Notice({ children, kind = 'status', action }: NoticeProps) {
  const color = kind === 'error' ? 'stop' : kind === 'done' ? 'fit' : 'outline';
  return (
    <View
      role={kind === 'error' ? 'alert' : 'status'}
      style={[styles.notice, { borderColor: colors[color] }]}
    >
      <Icon name={kind === 'done' ? 'save' : 'note'} size={22} color={color} />
      <View style={styles.words}>
        <Text style={[type.body, { color: colors.text }]}>{children}</Text>
      </View>
      {action}
    </View>
  );
}

/** Long work under way: what is being done, how far it is, and the way to cancel it. */
export function Progress({
  label,
  share,
  onCancel,
}: {
  label: string;
  /** 0 to 1; leave out when it cannot be known. */
  share?: number;
  onCancel?: ReactNode;
}) {
  const percent =
    share === undefined ? undefined : Math.round(Math.min(Math.max(share, 0), 1) * 100);
  return (
    <View style={styles.progress}>
      <Text style={[type.label, { color: colors.text }]}>
        {percent === undefined ? label : `${label}, ${percent} %`}
      </Text>
      <View
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        style={styles.track}
      >
        <View style={[styles.bar, { width: `${percent ?? 30}%` }]} />
      </View>
      {onCancel}
    </View>
  );
}

const styles = StyleSheet.create({
  notice: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space[3],
    padding: space[3],
    borderWidth: stroke.control,
    borderRadius: radius.control,
    backgroundColor: colors.sheet,
  },
  words: { flexShrink: 1, flexGrow: 1, flexBasis: 160 },
  progress: { gap: space[2] },
  track: {
    height: space[2],
    backgroundColor: colors.well,
    borderWidth: 1,
    borderColor: colors.outline,
  },
  bar: { height: '100%', backgroundColor: colors.bar },
});
