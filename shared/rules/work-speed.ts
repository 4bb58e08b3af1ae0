import type { LatheData } from '../domain/machines';
import type { Material } from '../domain/materials';
import type { ShopRules } from '../domain/shop-rules';
import { finding } from './findings';
import { figure, quantity, stated, term } from './figures';
import { rpmForSurfaceSpeed } from './speed';
import type { Figure, Finding, LatheStep } from './types';
import { positive } from './sizes';
import { workRow } from './work-table';

/** Outside these ratios of wheel speed to work speed the plan is worth a Check. */
const POOR = { low: 20, high: 200 };

export interface WorkSpeed {
  target: Figure;
  latheRpm: Figure;
  workSpeed: Figure;
  ratio: Figure;
  steps: LatheStep[];
}

/**
 * The work speed to aim at: the handbook's for the material, but never more metres a minute than the wheel
 * makes metres a second, which keeps the wheel at least 60 times as fast as the work.
 *
 * @param material - the work's material; null while unknown.
 * @param wheelMPerS - wheel speed, m/s; null takes the table alone.
 * @returns m/min, unrounded.
 * @source mh31-1318
 * @example targetWorkSpeed('tool-hardened', 12).value // 12 m/min
 */
export function targetWorkSpeed(material: Material | null, wheelMPerS: number | null): Figure {
  const row = material === null ? null : workRow(material);
  const table = term('v_table', 'work speed of the table', [
    row?.workSpeedMPerMin ?? null,
    'm/min',
  ]);
  const source = row?.source ?? 'mh31-1318';
  return wheelMPerS === null
    ? figure({ unit: 'm/min', formula: '{v_table}', source, terms: [table], compute: (v) => v })
    : figure({
        unit: 'm/min',
        formula: 'the smaller of {v_table} and {v_s} (its number, as m/min)',
        source,
        terms: [table, term('v_s', 'wheel speed', [wheelMPerS, 'm/s'])],
        compute: Math.min,
        note: 'The second keeps the wheel at least 60 times as fast as the work.',
      });
}

/**
 * The lathe step whose rpm lies nearest a wanted one, counted in ratios: 100 is as far from 50 as from 200.
 *
 * @param stepsRpm - the lathe's steps, rpm, in any order.
 * @param wantedRpm - rpm, over 0.
 * @returns one of the steps; null when there is none.
 * @source derived-geometry
 * @example nearestStep([45, 90, 180], 120) // 90
 */
export function nearestStep(stepsRpm: readonly number[], wantedRpm: number | null): number | null {
  if (wantedRpm === null || wantedRpm <= 0) return null;
  let best: number | null = null;
  for (const rpm of stepsRpm) {
    if (positive(rpm) === null) continue;
    if (best === null || distance(rpm, wantedRpm) < distance(best, wantedRpm)) best = rpm;
  }
  return best;
}

/** Work speed of a turning surface, m/min, from its diameter in mm and rpm. */
function workSpeed(diameterMm: number | null, rpm: number | null): Figure {
  return figure({
    unit: 'm/min',
    formula: '{v_w} = π {d} {n_w} / 1000',
    source: 'groover-24',
    terms: [
      term('d', 'diameter of the ground surface', [diameterMm, 'mm']),
      term('n_w', 'lathe speed', [rpm, 'rpm']),
    ],
    compute: (d, n) => (Math.PI * d * n) / 1000,
  });
}

/** How many times as fast as the work the wheel runs. */
function speedRatio(wheelMPerS: number | null, workMPerMin: number | null): Figure {
  return figure({
    unit: '1',
    formula: '{q} = 60 {v_s} / {v_w}',
    source: 'memory-speed-ratio',
    terms: [
      term('v_s', 'wheel speed', [wheelMPerS, 'm/s']),
      term('v_w', 'work speed', [workMPerMin, 'm/min']),
    ],
    compute: (wheel, work) => (60 * wheel) / work,
  });
}

/**
 * Lathe step, work speed and speed ratio for a surface; a typed rpm takes the suggested step's place.
 *
 * @param spec - material, diameter in mm, wheel speed in m/s, the lathe, and the rpm typed in; each may be null.
 * @returns the figures, and every step of the lathe with what it would give.
 * @source mh31-1318
 * @example planWorkSpeed({ material: 'tool-hardened', diameterMm: 40, wheelMPerS: 20, lathe, typedRpm: null }).latheRpm.value // 115 rpm
 */
export function planWorkSpeed(spec: {
  material: Material | null;
  diameterMm: number | null;
  wheelMPerS: number | null;
  lathe: LatheData | null;
  typedRpm: number | null;
}): WorkSpeed {
  const { diameterMm, wheelMPerS, lathe } = spec;
  const target = targetWorkSpeed(spec.material, wheelMPerS);
  const typed = positive(spec.typedRpm);
  const wanted = rpmForSurfaceSpeed(target.value, diameterMm);
  const nearest = nearestStep(lathe?.spindleSpeedsRpm ?? [], wanted);
  const latheRpm =
    typed === null
      ? stated(`lathe step nearest ${describe(wanted)}`, [nearest, 'rpm'], 'mh31-1318')
      : stated('lathe speed, chosen', [typed, 'rpm']);
  const speed = workSpeed(diameterMm, latheRpm.value);
  return {
    target,
    latheRpm,
    workSpeed: speed,
    ratio: speedRatio(wheelMPerS, speed.value),
    steps: latheSteps(lathe, diameterMm, wheelMPerS),
  };
}

function latheSteps(
  lathe: LatheData | null,
  diameterMm: number | null,
  wheelMPerS: number | null,
): LatheStep[] {
  if (lathe === null || diameterMm === null) return [];
  return lathe.spindleSpeedsRpm.flatMap((rpm) => {
    const speed = workSpeed(diameterMm, rpm).value;
    return speed === null
      ? []
      : [{ rpm, workSpeedMPerMin: speed, speedRatio: speedRatio(wheelMPerS, speed).value }];
  });
}

/**
 * What is unusual about the chosen lathe step, with the way out.
 *
 * @param plan - from planWorkSpeed.
 * @param diameterMm - diameter of the ground surface, mm.
 * @param usual - the shop's usual ratios of wheel speed to work speed.
 * @returns notes and Checks.
 */
export function workSpeedFindings(
  plan: WorkSpeed,
  diameterMm: number | null,
  usual: Pick<ShopRules, 'speedRatioLow' | 'speedRatioHigh'>,
): Finding[] {
  const found: Finding[] = [];
  const rpm = plan.latheRpm.value;
  const listed = plan.steps.map((step) => step.rpm);
  if (rpm !== null && listed.length > 0 && !listed.includes(rpm)) {
    const nearest = nearestStep(listed, rpm);
    if (nearest !== null)
      found.push(
        finding('not-a-lathe-step', {
          figures: { rpm: quantity(rpm, 'rpm'), nearest: quantity(nearest, 'rpm') },
        }),
      );
  }
  const ratio = plan.ratio.value;
  const wanted = rpmForSurfaceSpeed(plan.target.value, diameterMm);
  if (ratio === null || wanted === null) return found;
  const figures = {
    ratio: quantity(ratio, '1'),
    low: quantity(usual.speedRatioLow, '1'),
    high: quantity(usual.speedRatioHigh, '1'),
    rpm: quantity(wanted, 'rpm'),
  };
  if (ratio < usual.speedRatioLow)
    found.push(finding('speed-ratio-low', { level: ratio < POOR.low ? 'check' : 'note', figures }));
  if (ratio > usual.speedRatioHigh)
    found.push(
      finding('speed-ratio-high', { level: ratio > POOR.high ? 'check' : 'note', figures }),
    );
  return found;
}

function distance(rpm: number, wanted: number): number {
  return Math.abs(Math.log(rpm / wanted));
}

function describe(wanted: number | null): string {
  return wanted === null ? 'the target' : `${Math.round(wanted)} rpm`;
}
