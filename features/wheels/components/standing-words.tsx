import { StyleSheet, View } from 'react-native';

import { VerdictIcon } from '@/features/ui/icon';
import { Body, Strong } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';

import type { Standing } from '../standing';

/** Where a wheel stands, in word and, where it must not run, in shape. */
export function StandingWords({ usable, words }: Standing) {
  if (usable) return <Body>{words}</Body>;
  return (
    <View style={styles.row}>
      <VerdictIcon verdict="stop" size={20} />
      <View style={styles.words}>
        <Strong tone="stop">{words}</Strong>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
  words: { flexShrink: 1 },
});
