import {
  collectTexts,
  EMPTY_ENTRY,
  EMPTY_LIST,
  entryInUnits,
  knownOrNull,
  listInUnits,
  mapEntries,
  readDate,
  recallTexts,
  storedEntry,
  storedList,
  UNKNOWN,
  type Entries,
  type EntryChange,
  type RecordValues,
  type TypedList,
} from '@/features/records';
import { newId } from '@/features/transport';
import type { CreateGrinderRequest, Grinder } from '@/shared/contracts/machines';
import type { BeltStep, Guard, Rotation } from '@/shared/domain/machines';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';

import {
  GRINDER_FIELDS,
  GRINDER_LISTS,
  MEASURED_FIELDS,
  STEP_FIELDS,
  type GrinderField,
  type MeasuredField,
  type StepField,
} from './fields';
import { changedQuill, quillRequest, quillValuesOf, type QuillValues } from './quill-values';

interface MeasuredValues extends Entries<MeasuredField> {
  measuredOn: string;
  instrument: string;
}

export interface StepValues extends Entries<StepField> {
  id: string;
  name: string;
  measured: MeasuredValues;
}

export interface GrinderValues extends RecordValues, Entries<GrinderField> {
  name: string;
  beltSteps: StepValues[];
  guard: Guard;
  wheelRotation: Rotation | typeof UNKNOWN;
  shimsMm: TypedList;
  quills: QuillValues[];
}

const LETTER_A = 65;

/** The next step is named by the next letter and has the belt of the one before. */
export function newStep(steps: readonly StepValues[]): StepValues {
  return {
    id: newId(),
    name: String.fromCharCode(LETTER_A + (steps.length % 26)),
    drivingPulleyMm: EMPTY_ENTRY,
    drivenPulleyMm: EMPTY_ENTRY,
    beltThicknessMm: steps.at(-1)?.beltThicknessMm ?? EMPTY_ENTRY,
    measured: { rpm: EMPTY_ENTRY, measuredOn: '', instrument: '' },
  };
}

export const newGrinder = (units: UnitSystem): GrinderValues => ({
  id: newId(),
  units,
  name: '',
  motorNoLoadRpm: EMPTY_ENTRY,
  motorPowerW: EMPTY_ENTRY,
  spindleMaximumRpm: EMPTY_ENTRY,
  postStiffnessNPerMm: EMPTY_ENTRY,
  beltSteps: [newStep([])],
  guard: 'none',
  wheelRotation: UNKNOWN,
  shimsMm: EMPTY_LIST,
  quills: [],
});

function stepValuesOf(step: BeltStep, units: UnitSystem): StepValues {
  const stored = (field: StepField) => storedEntry(step[field], STEP_FIELDS[field], units);
  const { measured } = step;
  return {
    id: step.id,
    name: step.name,
    drivingPulleyMm: stored('drivingPulleyMm'),
    drivenPulleyMm: stored('drivenPulleyMm'),
    beltThicknessMm: stored('beltThicknessMm'),
    measured: {
      rpm: storedEntry(measured?.rpm ?? null, MEASURED_FIELDS.rpm, units),
      measuredOn: measured?.measuredOn ?? '',
      instrument: measured?.instrument ?? '',
    },
  };
}

export function grinderValuesOf(grinder: Grinder, units: UnitSystem): GrinderValues {
  const { id, name, data, quills, typed } = grinder;
  const stored = (field: GrinderField) => storedEntry(data[field], GRINDER_FIELDS[field], units);
  const values: GrinderValues = {
    id,
    units,
    name,
    motorNoLoadRpm: stored('motorNoLoadRpm'),
    motorPowerW: stored('motorPowerW'),
    spindleMaximumRpm: stored('spindleMaximumRpm'),
    postStiffnessNPerMm: stored('postStiffnessNPerMm'),
    beltSteps: data.beltSteps.map((step) => stepValuesOf(step, units)),
    guard: data.guard,
    wheelRotation: data.wheelRotation ?? UNKNOWN,
    shimsMm: storedList(data.shimsMm, GRINDER_LISTS.shimsMm, units),
    quills: quills.map((quill) => quillValuesOf(quill, units)),
  };
  return changed(values, recallTexts(typed, units));
}

function changedStep(step: StepValues, change: EntryChange): StepValues {
  const prefix = `beltSteps.${step.id}.`;
  return {
    ...mapEntries(step, STEP_FIELDS, { change, prefix }),
    measured: mapEntries(step.measured, MEASURED_FIELDS, { change, prefix: `${prefix}measured.` }),
  };
}

const changed = (values: GrinderValues, change: EntryChange): GrinderValues => ({
  ...mapEntries(values, GRINDER_FIELDS, { change }),
  beltSteps: values.beltSteps.map((step) => changedStep(step, change)),
  quills: values.quills.map((quill) => changedQuill(quill, change)),
});

export const grinderInUnits = (values: GrinderValues, units: UnitSystem): GrinderValues =>
  values.units === units
    ? values
    : {
        ...changed(values, (entry, spec) => entryInUnits(entry, spec, units)),
        shimsMm: listInUnits(values.shimsMm, GRINDER_LISTS.shimsMm, units),
        units,
      };

/** A belt step as far as it is typed; null while a pulley is missing or cannot be read. */
export function beltStepOf(step: StepValues): BeltStep | null {
  const { drivingPulleyMm, drivenPulleyMm, beltThicknessMm, measured } = step;
  if (drivingPulleyMm.si === null || drivenPulleyMm.si === null || beltThicknessMm.si === null)
    return null;
  const measuredOn = readDate(measured.measuredOn);
  return {
    id: step.id,
    name: step.name.trim(),
    drivingPulleyMm: drivingPulleyMm.si,
    drivenPulleyMm: drivenPulleyMm.si,
    beltThicknessMm: beltThicknessMm.si,
    measured:
      measured.rpm.si === null || measuredOn === null
        ? null
        : { rpm: measured.rpm.si, measuredOn, instrument: measured.instrument.trim() },
  };
}

/** @throws {RangeError} when something is missing; the schema refuses that before. */
function given<Value>(value: Value | null): Value {
  if (value === null) throw new RangeError('A grinder that is not whole cannot be sent.');
  return value;
}

/** @throws {RangeError} when something is missing; the schema refuses that before. */
export function grinderRequest(values: GrinderValues): CreateGrinderRequest {
  return {
    id: values.id,
    name: values.name.trim(),
    data: {
      motorNoLoadRpm: given(values.motorNoLoadRpm.si),
      motorPowerW: given(values.motorPowerW.si),
      spindleMaximumRpm: values.spindleMaximumRpm.si,
      beltSteps: values.beltSteps.map((step) => given(beltStepOf(step))),
      guard: values.guard,
      postStiffnessNPerMm: values.postStiffnessNPerMm.si,
      wheelRotation: knownOrNull(values.wheelRotation),
      shimsMm: values.shimsMm.si ?? [],
    },
    quills: values.quills.map(quillRequest),
    typed: collectTexts(values.units, (change) => changed(values, change)),
  };
}

/** Guards what comes back from the device's storage. */
export function isGrinderValues(value: unknown): value is GrinderValues {
  const shape = value as Partial<GrinderValues> | null;
  return (
    typeof shape === 'object' &&
    shape !== null &&
    typeof shape.id === 'string' &&
    UNIT_SYSTEMS.some((system) => system === shape.units) &&
    typeof shape.name === 'string' &&
    typeof shape.motorNoLoadRpm?.text === 'string' &&
    Array.isArray(shape.beltSteps) &&
    typeof shape.shimsMm?.text === 'string' &&
    Array.isArray(shape.quills)
  );
}
