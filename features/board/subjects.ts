import type { CautionIcon } from '@/features/ui/caution-icon';
import { CAUTION_SUBJECTS, type Caution, type CautionSubject } from '@/shared/rules/caution';
import { CAUTIONS, type CautionId } from '@/shared/rules/cautions';
import type { ComponentProps } from 'react';

type Sign = ComponentProps<typeof CautionIcon>['subject'];

/** The sign over each subject; what comes first of all stands above the signs. */
export const SUBJECT_SIGNS: Record<Exclude<CautionSubject, 'First of all'>, Sign> = {
  'Wheel soundness': 'ring',
  Speed: 'clear',
  'Mounting and flanges': 'mount',
  'Guards and clearance': 'guard',
  Rotation: 'rotation',
  Dressing: 'isolate',
  Grinding: 'holding',
  'Dust and mist': 'dust',
  Fire: 'sparks',
  'Hands and clothing': 'hands',
  'The lathe': 'ways',
};

export interface PostedCaution extends Caution {
  id: CautionId;
}

// Object.keys forgets the key type.
const IDS = Object.keys(CAUTIONS) as CautionId[];

/** The cautions of one subject, in the order in which they are read. */
export const cautionsOn = (subject: CautionSubject): PostedCaution[] =>
  IDS.map((id) => ({ id, ...(CAUTIONS[id] satisfies Caution as Caution) })).filter(
    (caution) => caution.subject === subject,
  );

/** Every subject but the first, which is no sign's. */
export const SIGNED_SUBJECTS = CAUTION_SUBJECTS.filter((subject) => subject !== 'First of all');

/** For which work a caution holds; empty where it always does. */
export function belongsWords({ operations, materials, mounted }: Caution): string {
  const words = [
    ...(operations ?? []).map((operation) => OPERATION_PLURALS[operation]),
    ...(materials ? ['aluminium, magnesium and titanium'] : []),
    ...(mounted === true ? ['mounted wheels'] : []),
    ...(mounted === false ? ['all but mounted wheels'] : []),
  ];
  return words.length === 0 ? '' : `For ${words.join(' and ')}.`;
}

const OPERATION_PLURALS = {
  jaws: 'chuck jaws',
  bore: 'bores',
  outside: 'outside work',
} as const;
