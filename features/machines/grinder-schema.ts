import * as yup from 'yup';

import { dateText, entryRules, listRule } from '@/features/records';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import type { UnitSystem } from '@/shared/domain/people';

import {
  GRINDER_FIELDS,
  GRINDER_LISTS,
  MEASURED_FIELDS,
  QUILL_FIELDS,
  SEGMENT_FIELDS,
  STEP_FIELDS,
} from './fields';
import type { GrinderValues, StepValues } from './grinder-values';
import { nameRule } from './name-rule';

/** As many as the contract takes. */
export const MOST = { beltSteps: 20, stepName: 10, quills: 30, segments: 8 } as const;

/** No two rows with the same name, in whatever case. */
function distinctNames(key: 'beltSteps' | 'quills', what: string) {
  return yup.string().test('distinct', (name, { options, createError }) => {
    const rows: readonly { name: string }[] = (options.context as GrinderValues)[key];
    const same = (row: { name: string }) => folded(row.name) === folded(name ?? '');
    if (!name?.trim() || rows.filter(same).length < 2) return true;
    return createError({ message: `Another ${what} is named ${name.trim()} as well.` });
  });
}

const folded = (name: string) => name.trim().toLowerCase();

/** An rpm that was measured says when and with what. */
const askedWithRpm = (message: string) =>
  yup.string().test('asked', message, (text, { parent }) => {
    const { rpm } = parent as StepValues['measured'];
    return rpm.text.trim() === '' || Boolean(text?.trim());
  });

const measuredSchema = (units: UnitSystem) =>
  yup.object({
    ...entryRules(MEASURED_FIELDS, units),
    measuredOn: dateText('Measured on').concat(
      askedWithRpm('Enter the day on which the rpm was measured.'),
    ),
    instrument: askedWithRpm('Enter what the rpm was measured with.').max(
      TEXT_LIMITS.name,
      `At most ${TEXT_LIMITS.name} characters.`,
    ),
  });

const stepSchema = (units: UnitSystem) =>
  yup.object({
    name: nameRule('Enter the name of the belt step: a letter or a number.', MOST.stepName).concat(
      distinctNames('beltSteps', 'belt step'),
    ),
    ...entryRules(STEP_FIELDS, units, ['drivingPulleyMm', 'drivenPulleyMm', 'beltThicknessMm']),
    measured: measuredSchema(units),
  });

const quillSchema = (units: UnitSystem) =>
  yup.object({
    name: nameRule('Enter the name of the quill or arbor.').concat(
      distinctNames('quills', 'quill or arbor'),
    ),
    ...entryRules(QUILL_FIELDS, units, ['seatDiameterMm']),
    segments: yup
      .array(yup.object(entryRules(SEGMENT_FIELDS, units, ['lengthMm', 'diameterMm'])))
      .min(1, 'A quill has at least one section.')
      .max(MOST.segments, `A quill has at most ${MOST.segments} sections.`),
  });

export const grinderSchema = ({ units }: GrinderValues) =>
  yup.object({
    name: nameRule('Enter the name by which the shop knows the grinder.'),
    ...entryRules(GRINDER_FIELDS, units, ['motorNoLoadRpm', 'motorPowerW']),
    shimsMm: listRule(GRINDER_LISTS.shimsMm, units),
    beltSteps: yup
      .array(stepSchema(units))
      .min(1, 'Add at least one belt step.')
      .max(MOST.beltSteps, `A grinder has at most ${MOST.beltSteps} belt steps.`),
    quills: yup
      .array(quillSchema(units))
      .max(MOST.quills, `A grinder has at most ${MOST.quills} quills and arbors.`),
  });
