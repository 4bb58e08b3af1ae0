import { Link, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Strong } from '@/features/ui/text';
import { colors, space, stroke, target } from '@/features/ui/tokens';

interface LinkRowProps {
  /** The row's name. */
  label: string;
  href: Href;
  /** Under the name, on lines of their own: sizes, a verdict, who and when. */
  children?: ReactNode;
  /** Beside the link, a control of its own. */
  beside?: ReactNode;
}

/** A row of a List that leads somewhere, tall enough for more than one fact. */
export function LinkRow({ label, href, children, beside }: LinkRowProps) {
  return (
    <View role="listitem" style={styles.row}>
      <Link href={href} asChild>
        <View style={styles.face}>
          <Strong>{label}</Strong>
          {children}
        </View>
      </Link>
      {beside}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    paddingRight: space[1],
    backgroundColor: colors.sheet,
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
  },
  face: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
    minHeight: target.machine,
    justifyContent: 'center',
    gap: space[1],
    paddingVertical: space[3],
    paddingLeft: space[4],
  },
});
