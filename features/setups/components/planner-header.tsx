import { Pressable, StyleSheet, Text, View } from 'react-native';

import { IconButton } from '@/features/ui/button';
import { Select } from '@/features/ui/select';
import { Small, Title } from '@/features/ui/text';
import { colors, space, stroke, target, type } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';
import { SETUP_PARTS, type SetupPart } from '@/shared/domain/setups';

import { PART_WORDS } from '../words';

interface PlannerHeaderProps {
  name: string;
  saved: string;
  onBack: () => void;
  onMenu: () => void;
}

/** Name, state of saving, and the way to everything that concerns the setup as a whole. */
export function PlannerTitle({ name, saved, onBack, onMenu }: PlannerHeaderProps) {
  return (
    <View style={styles.title}>
      <IconButton label="Back to the setups" icon="back" color="onEnamel" onPress={onBack} />
      <View style={styles.name}>
        <Title tone="onEnamel" lines={1}>
          {name || 'Without a name'}
        </Title>
        <View role="status" aria-live="polite">
          <Small tone="onEnamelSoft">{saved}</Small>
        </View>
      </View>
      <IconButton label="Name, units, copy" icon="edit" color="onEnamel" onPress={onMenu} />
    </View>
  );
}

interface PartTabsProps {
  part: SetupPart;
  answers: Record<SetupPart, string>;
  onPart: (part: SetupPart) => void;
}

/** The five parts side by side, or as one menu where there is no room for five. */
export function PartTabs({ part, answers, onPart }: PartTabsProps) {
  const { cramped } = useLayout();
  if (cramped)
    return (
      <View style={styles.menu}>
        <Select
          name="part"
          label={`${PART_WORDS[part]}, ${SETUP_PARTS.indexOf(part) + 1} of 5`}
          options={SETUP_PARTS.map((value) => ({
            value,
            label: PART_WORDS[value],
            detail: answers[value],
          }))}
          value={part}
          onChange={onPart}
        />
      </View>
    );
  return (
    <View role="tablist" aria-label="Parts of the setup" style={styles.parts}>
      {SETUP_PARTS.map((value) => {
        const here = value === part;
        return (
          <Pressable
            key={value}
            role="tab"
            aria-selected={here}
            aria-label={`${PART_WORDS[value]}: ${answers[value]}`}
            onPress={() => onPart(value)}
            style={[styles.part, here && styles.here]}
          >
            <Text style={[type.subheading, styles.word]} numberOfLines={1}>
              {PART_WORDS[value]}
            </Text>
            <Text style={[type.small, styles.answer]} numberOfLines={1}>
              {answers[value]}
            </Text>
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  title: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    paddingHorizontal: space[1],
    minHeight: target.base,
  },
  name: { flex: 1, minWidth: 0 },
  menu: { paddingHorizontal: space[4], paddingBottom: space[2], backgroundColor: colors.page },
  parts: { flexDirection: 'row' },
  part: {
    flex: 1,
    minWidth: 0,
    minHeight: target.base,
    alignItems: 'center',
    justifyContent: 'center',
    paddingHorizontal: space[1],
    paddingVertical: space[1],
    borderBottomWidth: stroke.index,
    borderBottomColor: 'transparent',
  },
  here: { backgroundColor: colors.headerWell, borderBottomColor: colors.markOnEnamel },
  word: { color: colors.onEnamel },
  answer: { color: colors.onEnamelSoft },
});
