import { CAUTION_SUBJECTS, type Caution, type CautionSubject } from '@/shared/rules/caution';
import { CAUTIONS, type CautionId } from '@/shared/rules/cautions';

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

/** Every subject but the first, which stands above the others. */
export const FURTHER_SUBJECTS = CAUTION_SUBJECTS.filter((subject) => subject !== 'First of all');

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
  taper: 'tapers',
} as const;
