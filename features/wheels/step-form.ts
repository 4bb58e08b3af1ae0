import * as yup from 'yup';

import type { QuantitySpec } from '@/features/forms';
import {
  collectTexts,
  dateText,
  EMPTY_ENTRY,
  entryInUnits,
  entryRules,
  mapEntries,
  readDate,
  UNKNOWN,
  type Entries,
  type TypedEntry,
} from '@/features/records';
import { newId } from '@/features/transport';
import type { RecordEntryRequest, WheelLife } from '@/shared/contracts/wheel-entries';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import type { EntryKind } from '@/shared/domain/wheel-life';
import type { LookResult, RingResult } from '@/shared/domain/wheels';

/** What is recorded by a form; a wheel is received by adding it, and set aside by a press. */
export type FormKind = Exclude<EntryKind, 'received' | 'set aside'>;

export const STEP_FIELDS = {
  diameterMm: {
    label: 'Diameter measured',
    hint: 'Leave empty where it was not measured.',
    unit: 'mm',
    limit: 'wheelDiameterMm',
  },
  minutes: { label: 'Trial run', unit: 'min', limit: 'trialRunMinutes' },
  spindleRpm: { label: 'Spindle speed', unit: 'rpm', limit: 'spindleRpm' },
  depthMm: {
    label: 'Depth of a pass',
    hint: 'How far the diamond was fed in; the wheel loses twice that on diameter.',
    unit: 'mm',
    limit: 'dressDepthMm',
  },
  passes: { label: 'Passes', unit: 'passes', limit: 'dressPasses', whole: true },
  usedMinutes: {
    label: 'Used for',
    hint: 'Leave empty where nobody kept the time.',
    unit: 'min',
    limit: 'usedMinutes',
  },
} as const satisfies Record<string, QuantitySpec>;
export type StepField = keyof typeof STEP_FIELDS;

export interface StepValues extends Entries<StepField> {
  /** Made with the form, so that recording it twice makes one entry. */
  id: string;
  units: UnitSystem;
  look: LookResult | typeof UNKNOWN;
  ring: RingResult | typeof UNKNOWN;
  quillId: string;
  reason: string;
  note: string;
  /** Empty is today. */
  happenedOn: string;
}

export const newStep = (units: UnitSystem): StepValues => ({
  id: newId(),
  units,
  diameterMm: EMPTY_ENTRY,
  minutes: EMPTY_ENTRY,
  spindleRpm: EMPTY_ENTRY,
  depthMm: EMPTY_ENTRY,
  passes: EMPTY_ENTRY,
  usedMinutes: EMPTY_ENTRY,
  look: UNKNOWN,
  ring: UNKNOWN,
  quillId: '',
  reason: '',
  note: '',
  happenedOn: '',
});

export const stepInUnits = (values: StepValues, units: UnitSystem): StepValues =>
  values.units === units
    ? values
    : {
        ...mapEntries(values, STEP_FIELDS, {
          change: (entry, spec) => entryInUnits(entry, spec, units),
        }),
        units,
      };

/** True once something was typed that would be missed. */
export const isBegun = (values: StepValues): boolean => {
  const { look, ring, quillId, reason, note, happenedOn } = values;
  const texts = collectTexts(values.units, (change) => mapEntries(values, STEP_FIELDS, { change }));
  return (
    Object.keys(texts).length > 1 ||
    look !== UNKNOWN ||
    ring !== UNKNOWN ||
    [quillId, reason, note, happenedOn].some((text) => text.trim() !== '')
  );
};

const REQUIRED: Partial<Record<FormKind, readonly StepField[]>> = {
  'trial run': ['minutes', 'spindleRpm'],
  dressed: ['depthMm', 'passes'],
};

const chosen = (message: string) =>
  yup
    .string()
    .default('')
    .test('chosen', message, (value) => Boolean(value) && value !== UNKNOWN);

export function stepSchema(kind: FormKind, units: UnitSystem) {
  const most = TEXT_LIMITS.note;
  const words = yup.string().trim().max(most, `At most ${most} characters.`);
  const wantsReason = kind === 'scrapped' || kind === 'correction';
  return yup.object({
    ...entryRules(STEP_FIELDS, units, REQUIRED[kind] ?? []),
    ...(kind === 'inspected' ? { look: chosen('Choose what the close look showed.') } : {}),
    ...(kind === 'ring test' ? { ring: chosen('Choose how the wheel rang.') } : {}),
    ...(kind === 'mounted' ? { quillId: chosen('Choose where it is mounted.') } : {}),
    reason: wantsReason ? words.required('Enter why, in a few words.') : words,
    note: words,
    happenedOn: dateText('The day'),
  });
}

interface StepSubject {
  /** What a signature or a correction is about. */
  entryId: string | null;
  spindles: WheelLife['spindles'];
}

type Step = RecordEntryRequest['step'];

/** A reason is set into sentences, which bring their own full stop. */
export const reasonOf = (text: string) => text.trim().replace(/\s*\.$/, '');

/**
 * @throws {RangeError} where something is missing; the schema refuses that before.
 */
export function toStep(
  kind: FormKind,
  values: StepValues,
  { entryId, spindles }: StepSubject,
): Step {
  const { look, ring, quillId } = values;
  const reason = reasonOf(values.reason);
  switch (kind) {
    case 'inspected':
      return { kind, look: known(look), diameterMm: values.diameterMm.si };
    case 'ring test':
      return { kind, ring: known(ring) };
    case 'mounted': {
      const spindle = whole(spindles.find((one) => one.quillId === quillId));
      return { kind, grinderId: spindle.grinderId, quillId };
    }
    case 'trial run':
      return { kind, minutes: si(values.minutes), spindleRpm: si(values.spindleRpm) };
    case 'dressed':
      return { kind, depthMm: si(values.depthMm), passes: si(values.passes) };
    case 'used':
      return { kind, minutes: values.usedMinutes.si, diameterMm: values.diameterMm.si };
    case 'taken off':
    case 'returned':
      return { kind };
    case 'scrapped':
      return { kind, reason };
    case 'countersigned':
      return { kind, entryId: whole(entryId) };
    case 'correction':
      return { kind, entryId: whole(entryId), reason };
  }
}

function whole<Value>(value: Value | null | undefined): Value {
  if (value === null || value === undefined) throw new RangeError('A step that is not whole.');
  return value;
}

const si = (entry: TypedEntry): number => whole(entry.si);

const known = <Value extends string>(value: Value | typeof UNKNOWN): Value =>
  whole(value === UNKNOWN ? null : value);

export function toEntryRequest(
  step: Step,
  values: StepValues,
  { version, today }: { version: number; today: string },
): RecordEntryRequest {
  return {
    id: values.id,
    version,
    happenedOn: readDate(values.happenedOn) ?? today,
    note: values.note.trim() || null,
    step,
  };
}

/** Where the server's path of a field stands in this form. */
export const stepPath = (kind: FormKind) => (path: string) => {
  const name = path.replace(/^step\./, '');
  return kind === 'used' && name === 'minutes' ? 'usedMinutes' : name;
};

/** Guards what comes back from the device's storage. */
export function isStepValues(value: unknown): value is StepValues {
  const step = value as Partial<StepValues> | null;
  return (
    typeof step === 'object' &&
    step !== null &&
    typeof step.id === 'string' &&
    UNIT_SYSTEMS.some((system) => system === step.units) &&
    typeof step.depthMm?.text === 'string' &&
    typeof step.usedMinutes?.text === 'string' &&
    typeof step.quillId === 'string' &&
    typeof step.reason === 'string'
  );
}
