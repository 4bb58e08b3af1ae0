import type { ReactNode } from 'react';
import { StyleSheet, Text, View } from 'react-native';

import { Icon, VerdictIcon } from './icon';
import { Small } from './text';
import { colors, space, type } from './tokens';

export type FindingLevel = 'stop' | 'check' | 'note';

interface FindingCardProps {
  level: FindingLevel;
  /** What is wrong, with the figures. */
  children: ReactNode;
  /** Headline of the large form: "too fast". */
  headline?: string;
  /** Where the rule comes from. */
  source?: string;
  /** Buttons and links that lead to the way out. */
  actions?: ReactNode;
  /** Spoken at once when it appears; for the one finding that answers what was just typed. */
  live?: boolean;
}

const LEVELS = {
  stop: { word: 'Stop', edge: colors.stop, ground: colors.stopTint },
  check: { word: 'Check', edge: colors.warn, ground: colors.warnTint },
  note: { word: 'Note', edge: colors.outline, ground: colors.sheet },
} as const;

/** A finding as a banner: a coloured edge, the word, the reason, and what to do next. */
export function FindingCard({
  level,
  children,
  headline,
  source,
  actions,
  live,
}: FindingCardProps) {
  const { word, edge, ground } = LEVELS[level];
  return (
    <View
      role={live ? (level === 'stop' ? 'alert' : 'status') : undefined}
      style={[styles.card, { borderLeftColor: edge, backgroundColor: ground }]}
    >
      {headline ? (
        <View style={styles.head}>
          {level === 'note' ? (
            <Icon name="note" size={32} />
          ) : (
            <VerdictIcon verdict={level} size={36} />
          )}
          <Text
            style={[
              type.title,
              styles.grow,
              { color: level === 'stop' ? colors.stop : colors.text },
            ]}
          >
            {`${word}: ${headline}`}
          </Text>
        </View>
      ) : null}
      <Text style={[type.body, { color: colors.text }]}>
        {headline ? null : <Text style={type.strong}>{`${word}: `}</Text>}
        {children}
      </Text>
      {source ? <Small>{source}</Small> : null}
      {actions ? <View style={styles.actions}>{actions}</View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    borderLeftWidth: 8,
    paddingVertical: space[3],
    paddingHorizontal: space[4],
    gap: space[2],
  },
  head: { flexDirection: 'row', alignItems: 'center', gap: space[3] },
  grow: { flexShrink: 1 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space[2] },
});
