import type { PassStrokes } from '../domain/setups';
import { figure, term } from './figures';
import type { Schedule } from './schedule';
import type { DressStage, Figure, Plan } from './types';

const SECONDS = 60;

/** Strokes of the carriage in one pass. */
export function strokesPerPass(strokes: PassStrokes | null): number {
  return strokes === 'one stroke' ? 1 : 2;
}

/**
 * How long the wheel is at work: every pass at its stage's traverse, and every dressing pass. Measuring and
 * setting come on top.
 *
 * @param spec - the schedule (null while unknown), travel of one stroke, traverse of each stage, strokes in a
 * pass, and both dressings (null while unknown).
 * @returns minutes, unrounded.
 * @source derived-time
 * @example planTime({ schedule, travel, rough, finish, strokes: 'both strokes', dressing }).total.value
 */
export function planTime(spec: {
  schedule: Schedule | null;
  travel: Figure;
  rough: Figure;
  finish: Figure;
  strokes: PassStrokes | null;
  dressing: { rough: DressStage; finish: DressStage } | null;
}): Plan['time'] {
  const { schedule, dressing } = spec;
  const counts = schedule?.counts;
  const rough = counts === undefined ? null : counts.rough + counts['rough spark-out'];
  const finish = counts === undefined ? null : counts.finish + counts['finish spark-out'];
  const grinding = figure({
    unit: 'min',
    formula: '{n} {travel} ({i_r} / {v_r} + {i_f} / {v_f})',
    source: 'derived-time',
    terms: [
      term('n', 'strokes in a pass', [strokesPerPass(spec.strokes), '1']),
      term('travel', 'travel of one stroke', [spec.travel.value, 'mm']),
      term('i_r', 'rough passes with spark-outs', [rough, 'passes']),
      term('v_r', 'traverse, rough', [spec.rough.value, 'mm/min']),
      term('i_f', 'finish passes with spark-outs', [finish, 'passes']),
      term('v_f', 'traverse, finish', [spec.finish.value, 'mm/min']),
    ],
    compute: (strokes, mm, roughs, roughRate, finishes, finishRate) =>
      strokes * mm * (roughs / roughRate + finishes / finishRate),
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
    compute: (roughs, rough1, fines, fine1) => (roughs * rough1 + fines * fine1) / SECONDS,
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
