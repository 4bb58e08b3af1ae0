import type { BeltStep, GrinderData } from '../domain/machines';
import { figure, term } from './figures';
import type { Figure } from './types';

/**
 * How fast the rim of a wheel travels.
 *
 * @param diameterMm - wheel diameter as it is now, mm, over 0.
 * @param rpm - spindle speed, rpm, 0 or more.
 * @returns peripheral speed, m/s, unrounded; null while an argument is.
 * @source groover-24
 * @example wheelSpeed(125, 5000).value // 32.72 m/s
 */
export function wheelSpeed(diameterMm: number | null, rpm: number | null): Figure {
  return figure({
    unit: 'm/s',
    formula: '{v_s} = π {D} {n} / 60 000',
    source: 'groover-24',
    terms: [
      term('D', 'wheel diameter now', [diameterMm, 'mm']),
      term('n', 'spindle speed', [rpm, 'rpm']),
    ],
    compute: (d, n) => (Math.PI * d * n) / 60_000,
  });
}

/**
 * The turns per minute that give a rim or a work surface a wanted speed.
 *
 * @param speedMPerMin - surface speed, m/min, 0 or more.
 * @param diameterMm - diameter of the surface, mm, over 0.
 * @returns rpm, unrounded; null while an argument is.
 * @source jones
 * @example rpmForSurfaceSpeed(18.288, 127) // 45.8 rpm
 */
export function rpmForSurfaceSpeed(
  speedMPerMin: number | null,
  diameterMm: number | null,
): number | null {
  if (speedMPerMin === null || diameterMm === null || diameterMm <= 0) return null;
  return (1000 * speedMPerMin) / (Math.PI * diameterMm);
}

type Pulleys = Pick<BeltStep, 'drivingPulleyMm' | 'drivenPulleyMm' | 'beltThicknessMm'>;

/**
 * The rpm of a belt step as it will most likely turn: measured where that was done, else from the pulleys
 * with the belt's thickness added to both, no slip.
 *
 * @param motorRpm - no-load motor speed, rpm.
 * @param step - pulleys and belt, mm, and the measured speed if any.
 * @returns spindle speed, rpm, unrounded.
 * @source khurmi-33
 * @example expectedRpm(1500, { drivingPulleyMm: 101.6, drivenPulleyMm: 508, beltThicknessMm: 0, measured: null }).value // 300
 */
export function expectedRpm(motorRpm: number, step: Pulleys & Pick<BeltStep, 'measured'>): Figure {
  if (step.measured !== null)
    return figure({
      unit: 'rpm',
      formula: '{n}',
      source: 'entered',
      terms: [term('n', 'spindle speed as measured', [step.measured.rpm, 'rpm'])],
      compute: (n) => n,
      note: `${step.measured.instrument}, ${step.measured.measuredOn}.`,
    });
  return figure({
    unit: 'rpm',
    formula: '{n_2} = {n_1} ({d_1} + {t}) / ({d_2} + {t})',
    source: 'khurmi-33',
    terms: pulleyTerms(motorRpm, step),
    compute: withThickness,
  });
}

/**
 * The highest rpm a belt step can give: what is held against the limits. Slip only slows the spindle, so it
 * is left out, and so is the belt's thickness unless the driven pulley is the larger, where it adds speed.
 *
 * @param motorRpm - no-load motor speed, rpm.
 * @param step - pulleys and belt, mm, and the measured speed, which counts where it is higher.
 * @returns spindle speed, rpm, unrounded.
 * @source derived-worst-rpm
 * @example worstRpm(2800, { drivingPulleyMm: 120, drivenPulleyMm: 30, beltThicknessMm: 2, measured: null }).value // 11200
 */
export function worstRpm(motorRpm: number, step: Pulleys & Pick<BeltStep, 'measured'>): Figure {
  const bare = (step.drivingPulleyMm / step.drivenPulleyMm) * motorRpm;
  if (step.measured !== null && step.measured.rpm > Math.max(bare, thick(motorRpm, step)))
    return expectedRpm(motorRpm, step);
  const slowing = step.drivingPulleyMm >= step.drivenPulleyMm;
  const note = 'No-load motor speed, no slip: the most this step can give.';
  return slowing
    ? figure({
        unit: 'rpm',
        formula: '{n_2} = {n_1} {d_1} / {d_2}',
        source: 'derived-worst-rpm',
        terms: pulleyTerms(motorRpm, step).slice(0, 3),
        compute: (n, driving, driven) => (n * driving) / driven,
        note,
      })
    : figure({
        unit: 'rpm',
        formula: '{n_2} = {n_1} ({d_1} + {t}) / ({d_2} + {t})',
        source: 'derived-worst-rpm',
        terms: pulleyTerms(motorRpm, step),
        compute: withThickness,
        note,
      });
}

/**
 * Spindle figures of every belt step, in the order recorded.
 *
 * @param grinder - motor speed and belt steps.
 * @returns worst and expected rpm of each step.
 */
export function stepSpeeds(grinder: GrinderData) {
  return grinder.beltSteps.map((step) => ({
    step,
    rpm: worstRpm(grinder.motorNoLoadRpm, step),
    expectedRpm: expectedRpm(grinder.motorNoLoadRpm, step),
  }));
}

function pulleyTerms(motorRpm: number, step: Pulleys) {
  return [
    term('n_1', 'motor speed without load', [motorRpm, 'rpm']),
    term('d_1', 'driving pulley', [step.drivingPulleyMm, 'mm']),
    term('d_2', 'driven pulley', [step.drivenPulleyMm, 'mm']),
    term('t', 'belt thickness', [step.beltThicknessMm, 'mm']),
  ];
}

function withThickness(motor: number, driving: number, driven: number, belt: number): number {
  return (motor * (driving + belt)) / (driven + belt);
}

function thick(motorRpm: number, step: Pulleys): number {
  return withThickness(motorRpm, step.drivingPulleyMm, step.drivenPulleyMm, step.beltThicknessMm);
}
