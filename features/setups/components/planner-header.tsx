import { StyleSheet, View } from 'react-native';

import { IconButton } from '@/features/ui/button';
import { Select } from '@/features/ui/select';
import { TabStrip } from '@/features/ui/tab-strip';
import { Small, Title } from '@/features/ui/text';
import { colors, space, target } from '@/features/ui/tokens';
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
    <TabStrip
      label="Parts of the setup"
      value={part}
      onChange={onPart}
      tabs={SETUP_PARTS.map((value) => ({
        value,
        label: PART_WORDS[value],
        detail: answers[value],
      }))}
    />
  );
}

const styles = StyleSheet.create({
  title: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    paddingHorizontal: space[1],
    paddingTop: space[1],
    minHeight: target.base,
  },
  name: { flex: 1, minWidth: 0 },
  menu: { paddingHorizontal: space[4], paddingBottom: space[2], backgroundColor: colors.page },
});
