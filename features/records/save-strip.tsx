import { StyleSheet, View } from 'react-native';

import { Button } from '@/features/ui/button';
import { Small } from '@/features/ui/text';
import { colors, measure, space, stroke } from '@/features/ui/tokens';

interface SaveStripProps {
  label: string;
  busy: boolean;
  /** True once something was typed: it is on this device already. */
  kept: boolean;
  onSave: () => void;
}

/** The form's one main action, within thumb's reach. */
export function SaveStrip({ label, busy, kept, onSave }: SaveStripProps) {
  return (
    <View role="region" aria-label="Save" style={styles.strip}>
      <View style={styles.inner}>
        <Button kind="primary" wide label={label} busy={busy} onPress={onSave} />
        {kept ? <Small align="center">Kept on this device until it is saved.</Small> : null}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  strip: {
    backgroundColor: colors.sheet,
    borderTopWidth: stroke.hairline,
    borderTopColor: colors.rule,
    paddingHorizontal: space[4],
    paddingVertical: space[2],
  },
  inner: { width: '100%', maxWidth: measure.form, alignSelf: 'center', gap: space[1] },
});
