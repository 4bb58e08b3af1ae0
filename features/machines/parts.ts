import {
  dayWords,
  keyPart,
  listWords,
  NOT_GIVEN,
  readDate,
  rowParts,
  UNKNOWN,
} from '@/features/records';
import type { Part, TypedEntry, TypedList } from '@/features/records';
import type { QuantitySpec } from '@/features/forms';
import type { UnitSystem } from '@/shared/domain/people';
import { formatQuantity } from '@/shared/units/format';

import { GRINDER_FIELDS, GRINDER_LISTS, LATHE_FIELDS, LATHE_LISTS, QUILL_FIELDS } from './fields';
import type { GrinderField, LatheField, LatheList } from './fields';
import type { GrinderValues, StepValues } from './grinder-values';
import type { LatheValues } from './lathe-values';
import type { QuillValues } from './quill-values';
import {
  COMPOUND_ZERO_WORDS,
  DIAL_WORDS,
  GUARD_WORDS,
  MATERIAL_WORDS,
  NOSE_WORDS,
  ROTATION_WORDS,
  THREAD_WORDS,
} from './words';

function quantityWords(entry: TypedEntry, { unit }: Pick<QuantitySpec, 'unit'>, units: UnitSystem) {
  return entry.si === null
    ? entry.text.trim() || NOT_GIVEN
    : formatQuantity({ value: entry.si, unit }, units);
}

const known = <Value extends string>(
  value: Value | typeof UNKNOWN,
  words: Record<Value, string>,
): string => (value === UNKNOWN ? 'not looked at yet' : words[value]);

const latheField = (name: LatheField): Part<LatheValues> =>
  keyPart(name, LATHE_FIELDS[name].label, (entry: TypedEntry, { units }) =>
    quantityWords(entry, LATHE_FIELDS[name], units),
  );

const latheList = (name: LatheList): Part<LatheValues> =>
  keyPart(name, LATHE_LISTS[name].label, (list: TypedList, { units }) =>
    list.si === null ? list.text.trim() || NOT_GIVEN : listWords(list.si, LATHE_LISTS[name], units),
  );

/** Everything a lathe's form holds, fact by fact. */
export const latheParts: Part<LatheValues>[] = [
  keyPart('name', 'Name', (name) => name.trim() || NOT_GIVEN),
  latheList('spindleSpeedsRpm'),
  latheList('feedsMmPerRev'),
  latheField('crossSlideDivisionMm'),
  keyPart('crossSlideReads', 'Cross-slide dial reads', (reads) => DIAL_WORDS[reads]),
  latheField('crossSlideDivisionsPerTurn'),
  keyPart('compoundZero', 'Compound at zero lies', (zero) => known(zero, COMPOUND_ZERO_WORDS)),
  latheField('compoundDivisionMm'),
  latheField('compoundMmPerTurn'),
  latheField('compoundTravelMm'),
  keyPart('spindleNose', 'Spindle nose', (nose) => known(nose, NOSE_WORDS)),
];

const grinderField = (name: GrinderField): Part<GrinderValues> =>
  keyPart(name, GRINDER_FIELDS[name].label, (entry: TypedEntry, { units }) =>
    quantityWords(entry, GRINDER_FIELDS[name], units),
  );

const length = (entry: TypedEntry, units: UnitSystem) =>
  quantityWords(entry, { unit: 'mm' }, units);

function stepWords(step: StepValues, units: UnitSystem): string {
  const { drivingPulleyMm, drivenPulleyMm, beltThicknessMm, measured } = step;
  const pulleys = `${length(drivingPulleyMm, units)} to ${length(drivenPulleyMm, units)}`;
  const belt = `belt ${length(beltThicknessMm, units)}`;
  if (measured.rpm.text.trim() === '') return `${pulleys}, ${belt}`;
  const date = readDate(measured.measuredOn);
  const rpm = quantityWords(measured.rpm, { unit: 'rpm' }, units);
  const how = [measured.instrument.trim(), date ? dayWords(date) : ''].filter(Boolean).join(', ');
  return `${pulleys}, ${belt}, measured ${rpm} (${how})`;
}

function quillWords(quill: QuillValues, units: UnitSystem): string {
  const sections = quill.segments
    .map(({ lengthMm, diameterMm }) => `${length(diameterMm, units)} × ${length(lengthMm, units)}`)
    .join(', then ');
  const { markedMaximumRpm, measuredStiffnessNPerMm, measuredFrequencyHz } = QUILL_FIELDS;
  const measured = [
    ['marked', quill.markedMaximumRpm, markedMaximumRpm],
    ['stiffness', quill.measuredStiffnessNPerMm, measuredStiffnessNPerMm],
    ['bends at', quill.measuredFrequencyHz, measuredFrequencyHz],
  ] as const;
  return [
    `seat ${length(quill.seatDiameterMm, units)}`,
    `${MATERIAL_WORDS[quill.material].toLowerCase()} ${sections}`,
    `thread ${known(quill.threadHand, THREAD_WORDS).toLowerCase()}`,
    ...measured
      .filter(([, entry]) => entry.si !== null)
      .map(([words, entry, spec]) => `${words} ${quantityWords(entry, spec, units)}`),
  ].join('; ');
}

/** Everything a grinder's form holds: each belt step and each quill of either version is a fact of its own. */
export function grinderParts(versions: readonly GrinderValues[]): Part<GrinderValues>[] {
  const units = versions[0]?.units ?? 'mm';
  return [
    keyPart('name', 'Name', (name) => name.trim() || NOT_GIVEN),
    grinderField('motorNoLoadRpm'),
    grinderField('motorPowerW'),
    grinderField('spindleMaximumRpm'),
    ...rowParts<StepValues, 'beltSteps', GrinderValues>('beltSteps', versions, {
      label: ({ name }) => `Belt step ${name}`,
      words: (step) => stepWords(step, units),
    }),
    keyPart('guard', 'Guard', (guard) => GUARD_WORDS[guard]),
    grinderField('postStiffnessNPerMm'),
    keyPart('wheelRotation', 'Wheel turns, seen from the tailstock', (rotation) =>
      known(rotation, ROTATION_WORDS),
    ),
    keyPart('shimsMm', GRINDER_LISTS.shimsMm.label, (list) =>
      list.si === null
        ? list.text.trim() || NOT_GIVEN
        : listWords(list.si, GRINDER_LISTS.shimsMm, units),
    ),
    ...rowParts<QuillValues, 'quills', GrinderValues>('quills', versions, {
      label: ({ name }) => name || 'Quill',
      words: (quill) => quillWords(quill, units),
    }),
  ];
}
