import { useState } from 'react';

import { Button } from '@/features/ui/button';
import { RadioRows } from '@/features/ui/radio-row';
import { Sheet } from '@/features/ui/sheet';
import { Body } from '@/features/ui/text';

import type { Part } from './parts';

type Side = 'mine' | 'theirs';

export interface Versions<Values> {
  /** What both started from; null when that is not known any more. */
  base: Values | null;
  mine: Values;
  theirs: Values;
}

const differing = <Values,>(parts: readonly Part<Values>[], { mine, theirs }: Versions<Values>) =>
  parts.filter((part) => part.words(mine) !== part.words(theirs));

/** What only the other side changed is theirs; everything else stays as it was typed here. */
function startingSide<Values>(part: Part<Values>, { base, mine }: Versions<Values>): Side {
  return base !== null && part.words(base) === part.words(mine) ? 'theirs' : 'mine';
}

/** The person's values, with the facts taken from the other side that they chose. */
export function mergedValues<Values>(
  parts: readonly Part<Values>[],
  versions: Versions<Values>,
  sides: Readonly<Record<string, Side>>,
): Values {
  return differing(parts, versions)
    .filter((part) => (sides[part.key] ?? startingSide(part, versions)) === 'theirs')
    .reduce((values, part) => part.take(values, versions.theirs), versions.mine);
}

interface ConflictSheetProps<Values> {
  /** "this wheel" */
  subject: string;
  parts: readonly Part<Values>[];
  versions: Versions<Values>;
  onSave: (merged: Values) => void;
  onClose: () => void;
}

/** Somebody else saved in the meantime: both versions of each fact that differs, to choose from. */
export function ConflictSheet<Values>({
  subject,
  parts,
  versions,
  onSave,
  onClose,
}: ConflictSheetProps<Values>) {
  const [sides, setSides] = useState<Record<string, Side>>({});
  return (
    <Sheet
      open
      onClose={onClose}
      title="Changed in the meantime"
      footer={
        <Button
          kind="primary"
          wide
          label="Save what is chosen"
          onPress={() => onSave(mergedValues(parts, versions, sides))}
        />
      }
    >
      <Body>{`Somebody else saved ${subject} while you were typing. Choose what holds.`}</Body>
      {differing(parts, versions).map((part) => (
        <RadioRows
          key={part.key}
          name={`conflict-${part.key}`}
          label={part.label}
          value={sides[part.key] ?? startingSide(part, versions)}
          onChange={(side) => setSides({ ...sides, [part.key]: side })}
          options={[
            { value: 'mine', label: part.words(versions.mine), detail: 'yours' },
            { value: 'theirs', label: part.words(versions.theirs), detail: 'theirs' },
          ]}
        />
      ))}
      {differing(parts, versions).length === 0 ? <Body>Both versions say the same.</Body> : null}
    </Sheet>
  );
}
