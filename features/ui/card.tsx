import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { colors, radius, space, stroke } from './tokens';

interface CardProps {
  children: ReactNode;
  /** Engraved is the black frame of a marking plate. */
  kind?: 'plain' | 'engraved' | 'well';
}

/** A plate that holds things that belong together. */
export function Card({ children, kind = 'plain' }: CardProps) {
  return <View style={[styles.card, styles[kind]]}>{children}</View>;
}

/** Lays controls side by side while each keeps its least width, else under each other. */
export function Row({
  children,
  gap = 3,
  align = 'stretch',
}: {
  children: ReactNode;
  gap?: keyof typeof space;
  align?: 'stretch' | 'center' | 'flex-end' | 'flex-start';
}) {
  return <View style={[styles.row, { gap: space[gap], alignItems: align }]}>{children}</View>;
}

/** A place in a Row that grows to fill it. */
export function Cell({ children, least = 136 }: { children: ReactNode; least?: number }) {
  return <View style={[styles.cell, { flexBasis: least }]}>{children}</View>;
}

/** Things under each other, evenly spaced. */
export function Stack({ children, gap = 4 }: { children: ReactNode; gap?: keyof typeof space }) {
  return <View style={{ gap: space[gap] }}>{children}</View>;
}

const styles = StyleSheet.create({
  card: { padding: space[4], gap: space[2], borderRadius: radius.control },
  plain: {
    backgroundColor: colors.sheet,
    borderWidth: stroke.hairline,
    borderColor: colors.rule,
  },
  engraved: {
    backgroundColor: colors.field,
    borderWidth: stroke.heavy,
    borderColor: colors.text,
  },
  well: { backgroundColor: colors.well },
  row: { flexDirection: 'row', flexWrap: 'wrap' },
  cell: { flexGrow: 1, flexShrink: 1, minWidth: 0 },
});
