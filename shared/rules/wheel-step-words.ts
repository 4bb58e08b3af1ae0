import { FINDINGS, findingWords } from './findings';
import type { Finding, Quantity } from './types';

/** Why a step of a wheel's life is refused, where no finding of a plan says it already. */
export const STEP_REFUSALS = {
  role: 'Your role in this shop does not allow this step.',
  'lead-returns': 'Only a lead returns a wheel from set aside.',
  'lead-unscraps': 'Only a lead takes the scrapping of a wheel back.',
  'already-mounted': 'The wheel is mounted already. Take it off first.',
  'not-mounted': 'The wheel is not mounted.',
  'still-mounted': 'The wheel is still on a spindle. Take it off first.',
  'already-set-aside': 'The wheel is set aside already.',
  'not-set-aside': 'The wheel is not set aside.',
  'fresh-look-missing':
    'Since it was set aside nobody has looked at it closely and found it sound. Do that first.',
  'spindle-unknown':
    'It is not known on which spindle the wheel sits. Take it off and mount it again.',
  'no-step-within-limit':
    'Every belt step of this grinder turns faster than {limit}, the limit on this spindle.',
  'trial-run-too-fast': '{rpm} is above {limit}, the limit on this spindle.',
  'trial-run-missing':
    'Since it was mounted the wheel has had no trial run of {minutes} that counts.',
  'trial-run-of-the-day': 'The last trial run was not on this day, or shorter than {minutes}.',
  'below-smallest':
    'Dressing would leave {left}; the smallest usable diameter of this wheel is {smallest}.',
  'into-the-hole': 'A wheel of {left} would be no larger than its {hole} hole.',
  'larger-than-new': 'The wheel was {fresh} when new, and never grows.',
  'in-the-future': 'This day has not come yet.',
  'out-of-order':
    'The latest entry is of {date}. What happened before it can no longer be put in its place.',
  'no-such-entry': 'This entry is not one of the wheel’s.',
  'nothing-to-sign': 'This entry does not wait for a signature, or no longer.',
  'own-entry': 'Nobody signs for an entry of their own.',
  'not-appointed': 'Only a person whom the shop has appointed for this task signs for it.',
  'not-skilled': 'A lead or a machinist signs for it.',
  'received-stays': 'How the wheel was received stays. Inspect it, and give the diameter measured.',
  'return-instead': 'Setting aside is not corrected. A lead returns the wheel after a close look.',
  'test-again':
    'What speaks against a wheel is not corrected. Look at it or ring it again, and record that.',
  'correction-stays': 'A correction is not corrected. Record the step again.',
  'corrected-already': 'This entry is corrected already.',
  'others-entry': 'Only who wrote it, a lead or a machinist corrects an entry.',
  'later-entries': 'A later entry rests on it: {kind}, {date}. Correct that one first.',
} as const;

export type StepRefusalCode = keyof typeof STEP_REFUSALS;

/** Why not: a code of its own, or what a plan would find. */
export type StepRefusal =
  | { code: StepRefusalCode; figures: Record<string, Quantity>; names: Record<string, string> }
  | Finding;

/**
 * A refusal of a step.
 *
 * @param code - which.
 * @param details - figures and names to set into its words.
 * @returns the refusal.
 */
export function refuse(
  code: StepRefusalCode,
  details: Partial<Pick<Finding, 'figures' | 'names'>> = {},
): StepRefusal {
  return { code, figures: {}, names: {}, ...details };
}

/**
 * A refusal in words, its figures and names set in.
 *
 * @param refusal - from refuse, or a finding.
 * @param format - writes a quantity in the reader's unit and digits.
 * @returns one or two sentences.
 * @source none: the words are our own
 * @example stepRefusalWords(refuse('not-mounted'), String) // 'The wheel is not mounted.'
 */
export function stepRefusalWords(
  refusal: StepRefusal,
  format: (quantity: Quantity) => string,
): string {
  if (isFinding(refusal)) return findingWords(refusal, format).title;
  return STEP_REFUSALS[refusal.code].replace(/\{(\w+)\}/g, (_, key: string) => {
    const quantity = refusal.figures[key];
    return quantity === undefined ? (refusal.names[key] ?? '') : format(quantity);
  });
}

function isFinding(refusal: StepRefusal): refusal is Finding {
  return refusal.code in FINDINGS;
}
