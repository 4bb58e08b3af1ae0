import { useId } from 'react';
import type { CSSProperties, ReactNode } from 'react';
import { Modal, ScrollView, StyleSheet, View } from 'react-native';

import { IconButton } from './button';
import { Heading } from './text';
import { colors, radius, space, stroke } from './tokens';
import { useLayout, useReducedMotion } from './use-layout';

interface SheetProps {
  open: boolean;
  onClose: () => void;
  /** Names the sheet; also its heading. */
  title: string;
  children: ReactNode;
  /** Stays at the bottom, within thumb's reach: the main action. */
  footer?: ReactNode;
  /** On a wide screen: a panel at the right edge, or a box in the middle for short questions. */
  shape?: 'panel' | 'box';
}

/** From the bottom on a phone, at the right on a wide screen. Holds the focus, closes with Escape. */
export function Sheet({ open, onClose, title, children, footer, shape = 'panel' }: SheetProps) {
  const { wide } = useLayout();
  const still = useReducedMotion();
  const titleId = useId();
  return (
    <Modal
      visible={open}
      transparent
      animationType={still ? 'none' : wide ? 'fade' : 'slide'}
      onRequestClose={onClose}
      aria-labelledby={titleId}
    >
      <View style={[styles.space, wide && (shape === 'panel' ? styles.atRight : styles.inMiddle)]}>
        <div aria-hidden onClick={onClose} style={SCRIM} />
        <View
          style={[
            styles.sheet,
            wide ? (shape === 'panel' ? styles.panel : styles.box) : styles.bottom,
          ]}
        >
          <View style={styles.head}>
            <Heading id={titleId} flex={1}>
              {title}
            </Heading>
            <IconButton label="Close" icon="close" onPress={onClose} />
          </View>
          <ScrollView style={styles.scroll} contentContainerStyle={styles.content}>
            {children}
          </ScrollView>
          {footer ? <View style={styles.footer}>{footer}</View> : null}
        </View>
      </View>
    </Modal>
  );
}

/** Closes by touch; the keyboard has Escape and the close button. */
const SCRIM: CSSProperties = { position: 'absolute', inset: 0, backgroundColor: colors.scrim };

const styles = StyleSheet.create({
  space: { flex: 1, justifyContent: 'flex-end' },
  atRight: { flexDirection: 'row' },
  inMiddle: { justifyContent: 'center', alignItems: 'center', padding: space[6] },
  sheet: { backgroundColor: colors.sheet },
  bottom: {
    maxHeight: '88%',
    borderTopWidth: stroke.index,
    borderTopColor: colors.markOnEnamel,
  },
  panel: {
    width: 480,
    height: '100%',
    borderLeftWidth: stroke.index,
    borderLeftColor: colors.markOnEnamel,
  },
  box: { width: '100%', maxWidth: 520, maxHeight: '88%', borderRadius: radius.control },
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    paddingLeft: space[4],
    paddingRight: space[1],
    paddingVertical: space[1],
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
  },
  scroll: { flexGrow: 0, flexShrink: 1 },
  content: { padding: space[4], gap: space[3] },
  footer: {
    padding: space[4],
    gap: space[2],
    borderTopWidth: stroke.hairline,
    borderTopColor: colors.rule,
  },
});
