import { useId, useState } from 'react';
import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { Icon } from './icon';
import { Body, Label } from './text';
import { colors, space, stroke } from './tokens';
import { web } from './web';

interface FoldProps {
  /** Name of the section. */
  label: string;
  /** What is inside, in short: "looked at, rung". */
  value?: string;
  children: ReactNode;
  /** Open at first. */
  startOpen?: boolean;
  /** For folds whose opening something else decides. */
  open?: boolean;
  onToggle?: (open: boolean) => void;
}

/** A section whose title holds its value; it opens in the flow of the page. */
export function Fold({ label, value, children, startOpen = false, open, onToggle }: FoldProps) {
  const [ownOpen, setOwnOpen] = useState(startOpen);
  const bodyId = useId();
  const shown = open ?? ownOpen;
  const toggle = () => {
    setOwnOpen(!shown);
    onToggle?.(!shown);
  };
  return (
    <View style={styles.fold}>
      <Pressable
        role="button"
        aria-label={value ? `${label}: ${value}` : label}
        aria-expanded={shown}
        onPress={toggle}
        style={({ pressed }) => [styles.title, pressed && styles.pressed]}
        {...web({ 'aria-controls': shown ? bodyId : undefined })}
      >
        <View style={styles.words}>
          <Label>{label}</Label>
          {value ? (
            <View style={styles.value}>
              <Body tone="textSoft" align="right">
                {value}
              </Body>
            </View>
          ) : null}
        </View>
        <Icon name={shown ? 'up' : 'down'} size={20} color="textSoft" />
      </Pressable>
      {shown ? (
        <View id={bodyId} style={styles.body}>
          {children}
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  fold: {
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
    backgroundColor: colors.sheet,
  },
  title: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[3],
    minHeight: 52,
    paddingHorizontal: space[4],
    paddingVertical: space[2],
  },
  pressed: { backgroundColor: colors.hover },
  // The value stands at the right, or under the label where there is no room beside it.
  words: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    columnGap: space[3],
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
  },
  value: { flexGrow: 1, flexShrink: 1, minWidth: 0 },
  body: {
    paddingHorizontal: space[4],
    paddingTop: space[1],
    paddingBottom: space[4],
    gap: space[4],
  },
});
