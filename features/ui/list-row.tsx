import { Link } from 'expo-router';
import type { Href } from 'expo-router';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { Icon } from './icon';
import { Small, Strong } from './text';
import { colors, space, stroke, target } from './tokens';
import { web } from './web';

interface ListRowProps {
  /** The row's name. */
  label: string;
  /** A second line: sizes, state, time. */
  detail?: string;
  /** At the right edge: a verdict, a figure. */
  aside?: ReactNode;
  /** Where the row leads; or use onPress. A row with neither is only read. */
  href?: Href;
  onPress?: () => void;
  /** The row whose detail stands in the other pane. */
  current?: boolean;
}

/** One thing of a list: name, detail, and a fact at the right edge. Stand rows in a List. */
export function ListRow({ label, detail, aside, href, onPress, current = false }: ListRowProps) {
  const pressed = href !== undefined || onPress !== undefined;
  const face = (
    <>
      <View style={[styles.mark, current && styles.markOn]} />
      <View style={styles.words}>
        <Strong>{label}</Strong>
        {detail ? <Small>{detail}</Small> : null}
      </View>
      {aside}
      {pressed ? <Icon name="forward" size={18} color="textSoft" /> : null}
    </>
  );
  const style = [styles.row, current && styles.current];
  const currentProp = web({ 'aria-current': current ? 'true' : undefined });
  return (
    <View role="listitem" style={styles.item}>
      {href !== undefined ? (
        <Link href={href} asChild>
          <Pressable role="link" style={StyleSheet.flatten(style)} {...currentProp}>
            {face}
          </Pressable>
        </Link>
      ) : onPress ? (
        <Pressable role="button" onPress={onPress} style={style} {...currentProp}>
          {face}
        </Pressable>
      ) : (
        <View style={style}>{face}</View>
      )}
    </View>
  );
}

/** Holds rows, and says what they are. */
export function List({ label, children }: { label: string; children: ReactNode }) {
  return (
    <View role="list" aria-label={label} style={styles.list}>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { borderTopWidth: stroke.hairline, borderTopColor: colors.rule },
  item: { borderBottomWidth: stroke.hairline, borderBottomColor: colors.rule },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignContent: 'center',
    alignItems: 'center',
    gap: space[3],
    minHeight: target.machine,
    paddingVertical: space[2],
    paddingHorizontal: space[4],
    backgroundColor: colors.sheet,
  },
  current: { backgroundColor: colors.field },
  mark: { position: 'absolute', left: 0, top: 0, bottom: 0, width: stroke.index },
  markOn: { backgroundColor: colors.mark },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 160, minWidth: 0 },
});
