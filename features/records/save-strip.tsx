import { useImperativeHandle, useMemo, useState, type Ref } from 'react';
import { StyleSheet, View } from 'react-native';

import { useLocalDraft } from '@/features/forms';
import { Button } from '@/features/ui/button';
import { Small } from '@/features/ui/text';
import { colors, measure, space, stroke } from '@/features/ui/tokens';

export interface Keeper {
  /** Takes the draft off the device, for good. */
  forget: () => void;
}

interface SaveStripProps<Values> {
  label: string;
  busy: boolean;
  onSave: () => void;
  draftKey: string;
  draft: { values: Values; version: number | null };
  /** True once something was typed. */
  changed: boolean;
  keeper: Ref<Keeper>;
}

/** The form's one main action, within thumb's reach; until it is pressed the device keeps what is typed. */
export function SaveStrip<Values>({
  label,
  busy,
  onSave,
  keeper,
  ...typed
}: SaveStripProps<Values>) {
  const { values, version } = typed.draft;
  const [begun, setBegun] = useState(typed.changed);
  // What was typed and taken back is written too, or the device would keep what was taken back.
  if (typed.changed && !begun) setBegun(true);
  const draft = useMemo(() => ({ values, version }), [values, version]);
  const { forget, kept } = useLocalDraft(typed.draftKey, draft, begun);
  useImperativeHandle(keeper, () => ({ forget }), [forget]);
  return (
    <View role="region" aria-label="Save" style={styles.strip}>
      <View style={styles.inner}>
        <Button kind="primary" wide label={label} busy={busy} onPress={onSave} />
        {begun ? (
          <Small align="center">
            {kept
              ? 'Kept on this device until it is saved.'
              : 'This browser keeps nothing: save before you leave this page.'}
          </Small>
        ) : null}
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
