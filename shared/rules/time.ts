import type { PassStrokes } from '../domain/setups';
import { figure, term, termOf } from './figures';
import type { Schedule } from './schedule';
import type { DressStage, Figure, Plan } from './types';

const SECONDS = 60;

/**
 * Strokes of the carriage in one pass.
 *
 * @param strokes - as chosen; null takes both strokes.
 * @returns 1 or 2.
 */
export function strokesPerPass(strokes: PassStrokes | null): number {
  return strokes === 'one stroke' ? 1 : 2;
}

/**
 * Seconds of one pass, from the seconds of one stroke and the strokes in a pass.
 *
 * @param stroke - seconds of one stroke.
 * @param strokes - strokes in a pass.
 * @returns seconds.
 */
export function secondsPerPass(stroke: Figure, strokes: number): Figure {
  return figure({
    unit: 's',
    formula: '{n} {t}',
    source: 'derived-time',
    terms: [term('n', 'strokes in a pass', [strokes, '1']), termOf('t', 'one stroke', stroke)],
    compute: (count, seconds) => count * seconds,
  });
}

/**
 * How long the wheel is at work: every pass at its stage's traverse, and every dressing pass. Measuring and
 * setting come on top.
 *
 * @param spec - the schedule (null while unknown), seconds of a pass in each stage, and both dressings (null
 * while unknown).
 * @returns minutes, unrounded.
 * @source derived-time
 * @example planTime({ schedule: planCutOutcome(basis, plan.work.latheRpm).schedule, passSeconds: { rough: stated('pass', [20, 's']), finish: stated('pass', [40, 's']) }, dressing: plan.dressing }).total.value // 8.8 min
 */
export function planTime(spec: {
  schedule: Schedule | null;
  passSeconds: { rough: Figure; finish: Figure };
  dressing: { rough: DressStage; finish: DressStage } | null;
}): Plan['time'] {
  const { schedule, passSeconds, dressing } = spec;
  const counts = schedule?.counts;
  const rough = counts === undefined ? null : counts.rough + counts['rough spark-out'];
  const finish = counts === undefined ? null : counts.finish + counts['finish spark-out'];
  const grinding = figure({
    unit: 'min',
    formula: '({i_r} {t_r} + {i_f} {t_f}) / 60',
    source: 'derived-time',
    terms: [
      term('i_r', 'rough passes with spark-outs', [rough, 'passes']),
      termOf('t_r', 'each', passSeconds.rough),
      term('i_f', 'finish passes with spark-outs', [finish, 'passes']),
      termOf('t_f', 'each', passSeconds.finish),
    ],
    compute: minutes,
    note: 'Measuring and setting come on top.',
  });
  const dressingTime = figure({
    unit: 'min',
    formula: '({p_r} {t_r} + {p_f} {t_f}) / 60',
    source: 'derived-time',
    terms: [
      term('p_r', 'dressing passes, rough', [dressing?.rough.passes ?? null, 'passes']),
      term('t_r', 'each', [dressing?.rough.secondsAcross.value ?? null, 's']),
      term('p_f', 'dressing passes, fine', [dressing?.finish.passes ?? null, 'passes']),
      term('t_f', 'each', [dressing?.finish.secondsAcross.value ?? null, 's']),
    ],
    compute: minutes,
  });
  return {
    grinding,
    dressing: dressingTime,
    total: figure({
      unit: 'min',
      formula: '{t_grinding} + {t_dressing}',
      source: 'derived-time',
      terms: [
        term('t_grinding', 'grinding', [grinding.value, 'min']),
        term('t_dressing', 'dressing', [dressingTime.value, 'min']),
      ],
      compute: (a, b) => a + b,
      note: 'The wheel at work; measuring and setting come on top.',
    }),
  };
}

function minutes(roughs: number, roughSeconds: number, fines: number, fineSeconds: number): number {
  return (roughs * roughSeconds + fines * fineSeconds) / SECONDS;
}
