import type { Verdict } from '../domain/setups';
import type { WheelData } from '../domain/wheels';
import { unknown } from './cut-figures';
import { wheelSpeedFindings } from './belt-steps';
import { quantity, stated } from './figures';
import { finding } from './findings';
import { limitRpm, wheelLimits } from './limits';
import { wheelSpeed, worstRpm } from './speed';
import { positive } from './sizes';
import type { Figure, Finding, Need, SpeedLimit } from './types';
import { verdictOf } from './verdict';

export interface QuickCheckInput {
  /** Diameter when new, mm: what a marked m/s is converted with. */
  wheelDiameterMm: number | null;
  marking: { rpm: number | null } | { speedMPerS: number | null };
  spindle:
    | { rpm: number | null }
    | {
        motorRpm: number | null;
        drivingPulleyMm: number | null;
        drivenPulleyMm: number | null;
      };
}

export interface QuickCheck {
  verdict: Verdict;
  needs: Need[];
  findings: Finding[];
  rpm: Figure;
  surfaceSpeed: Figure;
  limit: Figure;
}

/**
 * Whether a wheel may turn as fast as a spindle does, from three numbers alone.
 *
 * With pulleys the highest rpm they can give is held against the limit. It knows nothing of quill, guard or
 * the wheel's soundness.
 *
 * @param input - wheel diameter when new in mm, its marking in rpm or m/s, and the spindle's rpm or motor rpm
 * and pulley diameters in mm.
 * @returns rpm, rim speed, limit in whole rpm rounded down, and the verdict.
 * @source osha-1910-215-d1
 * @example quickCheck({ wheelDiameterMm: 65, marking: { speedMPerS: 4300 / 60 }, spindle: { rpm: 23000 } }).verdict // 'stop'
 */
export function quickCheck(input: QuickCheckInput): QuickCheck {
  const diameterMm = positive(input.wheelDiameterMm);
  const rpm = spindleRpm(input.spindle);
  const limit = markedLimit(input.marking, diameterMm);
  const surfaceSpeed = wheelSpeed(diameterMm, rpm.value);
  const findings = [
    ...(limit === null ? [] : tooFast(rpm, limit)),
    ...wheelSpeedFindings(surfaceSpeed),
  ];
  const needs = needsOf(input);
  return {
    verdict: verdictOf(findings, needs),
    needs,
    findings,
    rpm,
    surfaceSpeed,
    limit: limit?.rpm ?? unknown('rpm', 'limit'),
  };
}

function spindleRpm(spindle: QuickCheckInput['spindle']): Figure {
  if ('rpm' in spindle) return stated('spindle speed', [positive(spindle.rpm), 'rpm']);
  const motor = positive(spindle.motorRpm);
  const driving = positive(spindle.drivingPulleyMm);
  const driven = positive(spindle.drivenPulleyMm);
  if (motor === null || driving === null || driven === null) return unknown('rpm', 'spindle speed');
  return worstRpm(motor, {
    drivingPulleyMm: driving,
    drivenPulleyMm: driven,
    beltThicknessMm: 0,
    measured: null,
  });
}

function markedLimit(
  marking: QuickCheckInput['marking'],
  diameterMm: number | null,
): SpeedLimit | null {
  const markedRpm = 'rpm' in marking ? positive(marking.rpm) : null;
  const markedSpeedMPerS = 'speedMPerS' in marking ? positive(marking.speedMPerS) : null;
  if (markedRpm === null && (markedSpeedMPerS === null || diameterMm === null)) return null;
  const wheel: Pick<WheelData, 'markedRpm' | 'markedSpeedMPerS' | 'diameterNewMm' | 'mounted'> = {
    markedRpm,
    markedSpeedMPerS,
    diameterNewMm: diameterMm ?? 0,
    mounted: null,
  };
  return wheelLimits(wheel)[0] ?? null;
}

function tooFast(rpm: Figure, limit: SpeedLimit): Finding[] {
  const most = limitRpm(limit);
  return rpm.value !== null && rpm.value > most
    ? [
        finding('spindle-too-fast', {
          figures: { rpm: quantity(rpm.value, 'rpm'), limit: quantity(most, 'rpm') },
          names: { governs: limit.kind },
        }),
      ]
    : [];
}

function needsOf({ wheelDiameterMm, marking, spindle }: QuickCheckInput): Need[] {
  const markingField = 'rpm' in marking ? 'marking.rpm' : 'marking.speedMPerS';
  const marked = 'rpm' in marking ? marking.rpm : marking.speedMPerS;
  const asked: [field: string, label: string, value: number | null][] = [
    ['wheelDiameterMm', 'wheel diameter', wheelDiameterMm],
    [markingField, 'limit marked on the wheel', marked],
    ...('rpm' in spindle
      ? ([['spindle.rpm', 'spindle speed', spindle.rpm]] satisfies typeof asked)
      : ([
          ['spindle.motorRpm', 'motor speed without load', spindle.motorRpm],
          ['spindle.drivingPulleyMm', 'pulley on the motor', spindle.drivingPulleyMm],
          ['spindle.drivenPulleyMm', 'pulley on the spindle', spindle.drivenPulleyMm],
        ] satisfies typeof asked)),
  ];
  return asked.flatMap(([field, label, value]) =>
    positive(value) === null ? [{ part: 'wheel' as const, field, label }] : [],
  );
}
