import type { PlanInput, SetupPart, TypedWheel, WorkInputs } from '../domain/setups';
import { kindOf } from './surface';
import type { Need } from './types';

type Asked<T> = readonly [field: keyof T, label: string];

const ROUND_WORK: readonly Asked<WorkInputs>[] = [
  ['stockOnDiameterMm', 'stock on diameter'],
  ['runOutMm', 'run-out of the work'],
];

const JAWS: readonly Asked<WorkInputs>[] = [
  ['material', 'material of the jaws'],
  ['jawCount', 'number of jaws'],
  ['jawBoreMm', 'bore at the jaws'],
  ['lengthMm', 'length of the pads'],
  ['padWidthMm', 'width of a pad'],
  ['nearDistanceMm', 'distance of the reading near the chuck'],
  ['nearRunOutMm', 'run-out near the chuck'],
  ['nearHighSpotDeg', 'high spot near the chuck'],
  ['farDistanceMm', 'distance of the reading further out'],
  ['farRunOutMm', 'run-out further out'],
  ['farHighSpotDeg', 'high spot further out'],
  ['preload', 'how the jaws are preloaded'],
  ['clearDepthMm', 'free depth behind the pads'],
];

const BORE: readonly Asked<WorkInputs>[] = [
  ['material', 'material'],
  ['diameterMm', 'diameter of the bore'],
  ['lengthMm', 'length of the bore'],
  ...ROUND_WORK,
  ['throughBore', 'whether the bore goes through'],
];

const OUTSIDE: readonly Asked<WorkInputs>[] = [
  ['material', 'material'],
  ['diameterMm', 'diameter'],
  ['lengthMm', 'length to grind'],
  ...ROUND_WORK,
  ['holding', 'how the work is held'],
  ['unsupportedLengthMm', 'unsupported length'],
];

const TAPER: readonly Asked<WorkInputs>[] = [
  ['material', 'material'],
  ['diameterMm', 'diameter at the big end'],
  ['lengthMm', 'length of the taper'],
];

const TAPER_GIVEN: Record<WorkInputs['taperGiven'], Asked<WorkInputs>> = {
  angle: ['includedAngleDeg', 'included angle'],
  'small end': ['smallDiameterMm', 'diameter at the small end'],
  taper: ['taperPerLength', 'taper'],
};

/** How round work is held outside; inside, whether the hole goes through. */
const HELD = OUTSIDE.slice(-2);
const HOLE = BORE.slice(-1);

const TYPED_WHEEL: readonly Asked<TypedWheel>[] = [
  ['diameterNewMm', 'wheel diameter when new'],
  ['widthMm', 'wheel width'],
  ['holeMm', 'wheel hole'],
  ['looked', 'close look at the wheel'],
  ['rung', 'ring test of the wheel'],
];

/**
 * Everything a plan still needs, in the order of the parts, by the path of its field and in the shop's words.
 *
 * Machines and wheels that are named but no longer there count as not chosen.
 *
 * @param input - the setup with its machines and wheel filled in.
 * @returns an empty list when nothing is missing.
 * @source none: what is asked follows from the other rules
 * @example needsOf({ ...planInput, work: { ...planInput.work, nearRunOutMm: null } })[0]?.label // 'run-out near the chuck'
 */
export function needsOf(input: PlanInput): Need[] {
  return [...workNeeds(input), ...machineNeeds(input), ...wheelNeeds(input)];
}

function workNeeds({ operation, work }: PlanInput): Need[] {
  const asked = askedOf(operation, work);
  const missing = asked.filter(([field]) => work[field] === null && !answeredBy(work, field));
  const needs = missing.map(([field, label]) => need('work', `work.${field}`, label));
  if (
    kindOf({ operation, work }) === 'bore' &&
    work.throughBore === false &&
    work.clearDepthMm === null
  )
    needs.push(need('work', 'work.clearDepthMm', 'free depth behind the bore'));
  return needs;
}

function askedOf(
  operation: PlanInput['operation'],
  work: WorkInputs,
): readonly Asked<WorkInputs>[] {
  switch (operation) {
    case 'jaws':
      return JAWS;
    case 'bore':
      return BORE;
    case 'outside':
      return OUTSIDE;
    case 'taper':
      return [
        ...TAPER,
        TAPER_GIVEN[work.taperGiven],
        ...ROUND_WORK,
        ...(work.taperSide === 'outside' ? HELD : HOLE),
      ];
  }
}

/** Without run-out there is no high spot to find. */
function answeredBy(work: WorkInputs, field: keyof WorkInputs): boolean {
  return (
    (field === 'nearHighSpotDeg' && work.nearRunOutMm === 0) ||
    (field === 'farHighSpotDeg' && work.farRunOutMm === 0)
  );
}

function machineNeeds({ lathe, grinder, quill, machine }: PlanInput): Need[] {
  const needs: Need[] = [];
  if (lathe === null) needs.push(need('machine', 'machine.latheId', 'lathe'));
  if (grinder === null) needs.push(need('machine', 'machine.grinderId', 'grinder'));
  if (quill === null) needs.push(need('machine', 'machine.quillId', 'quill or arbor'));
  const step = grinder?.beltSteps.some(({ id }) => id === machine.beltStepId) ?? false;
  if (!step) needs.push(need('machine', 'machine.beltStepId', 'belt step'));
  return needs;
}

function wheelNeeds({ wheel, wheelData }: PlanInput): Need[] {
  const { typed } = wheel;
  if (typed === null) return wheelData === null ? [need('wheel', 'wheel.wheelId', 'wheel')] : [];
  const needs = TYPED_WHEEL.filter(([field]) => typed[field] === null).map(([field, label]) =>
    need('wheel', `wheel.typed.${field}`, label),
  );
  if (typed.markedRpm === null && typed.markedSpeedMPerS === null)
    needs.push(need('wheel', 'wheel.typed.markedRpm', 'rpm or speed marked on the wheel'));
  return needs;
}

function need(part: SetupPart, field: string, label: string): Need {
  return { part, field, label };
}
