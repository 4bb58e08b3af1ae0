import type { Operation, PlanInput } from '../domain/setups';
import { leastFlange, takesFlanges } from './mounting';
import { surfaceOf } from './surface';
import type { DressStage, Figure, PassStage, Plan, Quantity } from './types';

/** One step of the work, its `{figures}` to be set into its words. */
export interface WorkStep {
  id: string;
  title: string;
  words: string;
  figures: Record<string, Quantity>;
}

type Words = string | ((input: PlanInput, plan: Plan) => string);

interface Step {
  id: string;
  title: string;
  words: Words;
  /** Left out of the steps of other work. */
  when?: (input: PlanInput) => boolean;
  /** The figures its words name. */
  figures: (plan: Plan, input: PlanInput) => Record<string, Figure | number | null>;
}

const none = () => ({});

const HOLDING: Record<Operation, string> = {
  jaws: 'Close the jaws on the preload in the direction they will work, at {bore}. Note diameter and torque.',
  bore: 'Set the bore true in the chuck, and read its run-out at both ends.',
  outside: 'Set the work up as planned, and read its run-out at both ends.',
  taper: 'Set the work up as planned, and read its run-out at both ends.',
};

const SURVEY: Record<Operation, string> = {
  jaws: 'Read run-out and high spot on a bar at two distances. About {stock} on radius is to come off.',
  bore: 'Read size and run-out at both ends. {stock} on radius is to come off.',
  outside: 'Read size and run-out at both ends. {stock} on radius is to come off.',
  taper: 'Read size and run-out at both ends. {stock} at the cross-slide is to come off.',
};

const STEPS: readonly Step[] = [
  {
    id: 'survey',
    title: 'Survey',
    words: ({ operation }) => SURVEY[operation],
    figures: ({ stock }) => ({ stock }),
  },
  {
    id: 'holding',
    title: 'Hold',
    words: ({ operation }) => HOLDING[operation],
    figures: (_, { work }) => ({ bore: work.jawBoreMm }),
  },
  {
    id: 'set-over',
    title: 'Set over',
    when: ({ operation }) => operation === 'taper',
    words: setOverWords,
    figures: ({ taper }) => ({
      half: taper?.halfAngle ?? null,
      across: taper?.compound?.fromCrossSlide ?? null,
      along: taper?.compound?.fromSpindleAxis ?? null,
      setover: taper?.setover ?? null,
    }),
  },
  {
    id: 'wheel',
    title: 'Wheel',
    words: (input) =>
      flanged(input)
        ? 'Machine isolated: look at the wheel and ring it, mount it between flanges of {flange} or more with new blotters, and set the belt to {rpm}.'
        : 'Machine isolated: look at the wheel and ring it, mount it, and set the belt to {rpm}.',
    figures: ({ speed }, { wheelData }) => ({
      rpm: speed.spindleRpm,
      flange: leastFlange(wheelData?.diameterNewMm ?? null),
    }),
  },
  {
    id: 'clearance',
    title: 'Clearance',
    words:
      'Power off: move {travel} by hand, {overrun} past each end, and turn the work over once.',
    figures: ({ traverse }) => ({ travel: traverse.travel, overrun: traverse.overrun }),
  },
  {
    id: 'trial-run',
    title: 'Trial run',
    words: 'Stand clear. Run the guarded wheel {minutes} after a wheel change, {daily} each day.',
    figures: (_, { rules }) => ({
      minutes: rules.trialRunMinutes,
      daily: rules.dailyTrialRunMinutes,
    }),
  },
  {
    id: 'dress',
    title: 'Dress',
    words: ({ operation, work }) =>
      operation === 'taper' && work.taperMethod === 'compound'
        ? 'With the compound at the taper, so that the face lies along the cone: {passes} of {depth}, each in {seconds} across the wheel. Then take the dresser out.'
        : '{passes} of {depth}, each in {seconds} across the wheel. Then take the dresser out.',
    figures: ({ dressing }) => dressFigures(dressing?.rough),
  },
  {
    id: 'touch-off',
    title: 'Touch off',
    words:
      'Work at {rpm}: bring the wheel to the high spot until it just sparks, and set the dial to zero.',
    figures: ({ work }) => ({ rpm: work.latheRpm }),
  },
  {
    id: 'rough',
    title: 'Rough',
    words: '{passes} of {infeed}, at {rate} along the work.',
    figures: (plan) => ({
      passes: count(plan, 'rough'),
      infeed: plan.infeed.rough,
      rate: plan.traverse.roughRate,
    }),
  },
  {
    id: 'spark-out',
    title: 'Spark out',
    words: '{passes} without infeed.',
    figures: (plan) => ({ passes: count(plan, 'rough spark-out') }),
  },
  {
    id: 'measure',
    title: 'Measure',
    words: ({ operation }) =>
      operation === 'taper'
        ? 'Withdraw, stop wheel and work, let the work cool, and try it with blue in its gauge.'
        : 'Withdraw, stop wheel and work, let the work cool, and measure both ends.',
    figures: none,
  },
  {
    id: 'finish-dress',
    title: 'Dress fine',
    words: '{passes} of {depth}, each in {seconds} across the wheel.',
    figures: ({ dressing }) => dressFigures(dressing?.finish),
  },
  {
    id: 'touch-off-again',
    title: 'Touch off again',
    words: "Dressing moved the wheel's face: touch off again, and set the dial to zero.",
    figures: none,
  },
  {
    id: 'finish',
    title: 'Finish',
    words: (_, plan) =>
      count(plan, 'finish spark-out') === 0
        ? '{passes} of {infeed}, at {rate}.'
        : '{passes} of {infeed}, at {rate}, then {sparks} without infeed.',
    figures: (plan) => ({
      passes: count(plan, 'finish'),
      infeed: plan.infeed.finish,
      rate: plan.traverse.finishRate,
      sparks: count(plan, 'finish spark-out'),
    }),
  },
  {
    id: 'measure-finish',
    title: 'Measure',
    words:
      'Withdraw, stop, let the work cool, and measure both ends. The last step is taken on the gauge.',
    figures: none,
  },
];

/**
 * The work from survey to the last measurement, in the order it is done, with the plan's own figures.
 *
 * @param plan - the plan.
 * @param input - what it was made from.
 * @returns the steps; a figure is left out of `figures` while it is unknown.
 * @source practice-schedule
 * @example orderOfWork(plan, planInput)[0]?.title // 'Survey'
 */
export function orderOfWork(plan: Plan, input: PlanInput): WorkStep[] {
  return STEPS.filter(({ when }) => when?.(input) ?? true).map(({ id, title, words, figures }) => ({
    id,
    title,
    words: typeof words === 'string' ? words : words(input, plan),
    figures: quantities(figures(plan, input)),
  }));
}

function setOverWords({ work, lathe }: PlanInput): string {
  if (work.taperMethod === 'tailstock')
    return 'Set the tailstock over by {setover}, and try it with an indicator along the work.';
  const trial = 'Run an indicator along a finished cone, or blue one, before you trust the scale.';
  switch (lathe?.compoundZero ?? null) {
    case 'cross-slide':
      return `Set the compound to {across} on its scale: {half} from the spindle axis. ${trial}`;
    case 'spindle-axis':
      return `Set the compound to {along} on its scale: {half} from the spindle axis. ${trial}`;
    default:
      return `Set the compound {half} from the spindle axis: {across} on a scale with its zero across the bed, {along} with its zero along it. ${trial}`;
  }
}

function quantities(figures: ReturnType<Step['figures']>): Record<string, Quantity> {
  const known: Record<string, Quantity> = {};
  for (const [key, figure] of Object.entries(figures)) {
    if (figure === null) continue;
    const { value, unit } =
      typeof figure === 'number' ? { value: figure, unit: UNITS[key] ?? '1' } : figure;
    if (value !== null) known[key] = { value, unit };
  }
  return known;
}

const UNITS: Partial<Record<string, Quantity['unit']>> = {
  bore: 'mm',
  minutes: 'min',
  daily: 'min',
  passes: 'passes',
  sparks: 'passes',
};

function count(plan: Plan, stage: PassStage): number | null {
  return plan.passes.length === 0
    ? null
    : plan.passes.filter((pass) => pass.stage === stage).length;
}

function dressFigures(stage: DressStage | undefined): ReturnType<Step['figures']> {
  return stage === undefined
    ? {}
    : { passes: stage.passes, depth: stage.depth, seconds: stage.secondsAcross };
}

function flanged(input: PlanInput): boolean {
  return input.wheelData !== null && takesFlanges(input.wheelData, surfaceOf(input).side);
}
