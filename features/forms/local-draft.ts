import { useCallback, useEffect, useRef, useState } from 'react';

import { readStored, removeStored, writeStored } from '@/features/transport';

/** What is typed but not yet with the server, kept on this device under a person, a shop and a subject. */
export interface LocalDraft<Values> {
  values: Values;
  /** The version of the record that the values were typed over; null for a new one. */
  version: number | null;
}

export function draftKey(personId: string, shopId: string, subject: string): string {
  return `ringtrue:draft:${personId}:${shopId}:${subject}`;
}

export function readDraft<Values>(
  key: string,
  isValues: (value: unknown) => value is Values,
): LocalDraft<Values> | null {
  const stored = readStored(key);
  if (typeof stored !== 'object' || stored === null) return null;
  const { values, version } = stored as Partial<LocalDraft<unknown>>;
  if (!isValues(values)) return null;
  return { values, version: typeof version === 'number' ? version : null };
}

const writeDraft = <Values>(key: string, draft: LocalDraft<Values>): boolean =>
  writeStored(key, draft);

export const removeDraft = removeStored;

interface KeptDraft {
  /** Takes the draft off the device, for good. */
  forget: () => void;
  /** False until something is written, and where the browser refuses to keep it. */
  kept: boolean;
}

/**
 * Keeps a form's values on the device while they are typed, until `keep` turns false or the draft is removed.
 * Written on each change: a tab may be closed at any keystroke.
 */
export function useLocalDraft<Values>(
  key: string,
  draft: LocalDraft<Values>,
  keep: boolean,
): KeptDraft {
  const forgotten = useRef(false);
  const [kept, setKept] = useState(false);
  useEffect(() => {
    if (keep && !forgotten.current) setKept(writeDraft(key, draft));
  }, [key, draft, keep]);
  const forget = useCallback(() => {
    forgotten.current = true;
    removeDraft(key);
  }, [key]);
  return { forget, kept };
}
