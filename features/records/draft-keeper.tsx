import { useImperativeHandle, useMemo, useState, type Ref } from 'react';

import { useLocalDraft } from '@/features/forms';

export interface Keeper {
  /** Takes the draft off the device, for good. */
  forget: () => void;
}

interface DraftKeeperProps<Values> {
  handle: Ref<Keeper>;
  draftKey: string;
  draft: { values: Values; version: number | null };
  keep: boolean;
}

/** Writes the values to the device as they change; stands inside Formik, where they are known. */
export function DraftKeeper<Values>({
  handle,
  draftKey: key,
  draft,
  keep,
}: DraftKeeperProps<Values>) {
  const { values, version } = draft;
  const [begun, setBegun] = useState(keep);
  // What was typed and taken back is written too, or the device would keep what was taken back.
  if (keep && !begun) setBegun(true);
  const stored = useMemo(() => ({ values, version }), [values, version]);
  const { forget } = useLocalDraft(key, stored, begun);
  useImperativeHandle(handle, () => ({ forget }), [forget]);
  return null;
}
