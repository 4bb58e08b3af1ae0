import type { GrinderData } from '../domain/machines';
import { finding } from './findings';
import { quantity } from './figures';
import { limitRpm } from './limits';
import { stepSpeeds, wheelSpeed } from './speed';
import type { BeltStepPlan, Figure, Finding, SpeedLimit } from './types';

/** Wheel speeds that texts recommend, m/s, and the one below which a wheel hardly grinds. */
const USUAL_SPEED = { low: 20, high: 33, poor: 12 };

export interface BeltSteps {
  rows: BeltStepPlan[];
  suggested: string | null;
}

/**
 * Every belt step with its speed, and whether it stays within the limits.
 *
 * @param grinder - motor speed and belt steps.
 * @param diameterMm - wheel diameter now, mm; null while unknown.
 * @param limits - the limits in force, lowest first, and whether the wheel's own are among them.
 * @returns the rows in the order recorded, and the fastest one that breaks no limit.
 * @source osha-1910-215-d1
 * @example planBeltSteps(grinder, 25, { all: [{ kind: 'marked rpm', rpm: stated('marked', [16000, 'rpm']) }], wheelKnown: true }).suggested // 'b'
 */
export function planBeltSteps(
  grinder: GrinderData | null,
  diameterMm: number | null,
  limits: { all: SpeedLimit[]; wheelKnown: boolean },
): BeltSteps {
  if (grinder === null) return { rows: [], suggested: null };
  const lowest = limits.all[0];
  let suggested: BeltStepPlan | null = null;
  const rows = stepSpeeds(grinder).map(({ step, rpm, expectedRpm }) => {
    const speed = wheelSpeed(diameterMm, rpm.value);
    const row: BeltStepPlan = {
      id: step.id,
      name: step.name,
      rpm,
      expectedRpm,
      wheelSpeed: speed,
      allowed: isAllowed(rpm.value, lowest, limits.wheelKnown),
      actsSoft: speed.value !== null && speed.value < USUAL_SPEED.low,
    };
    const best = suggested?.rpm.value ?? 0;
    if (row.allowed === true && rpm.value !== null && rpm.value > best) suggested = row;
    return row;
  });
  return { rows, suggested: chosenId(suggested) };
}

/** True and false where that is known; null while the wheel, and so its limit, is not. */
function isAllowed(
  rpm: number | null,
  lowest: SpeedLimit | undefined,
  wheelKnown: boolean,
): boolean | null {
  if (rpm === null) return null;
  if (lowest !== undefined && rpm > limitRpm(lowest)) return false;
  return wheelKnown ? true : null;
}

/**
 * Findings about the chosen step, and about a grinder that has no step slow enough.
 *
 * @param steps - the rows of planBeltSteps.
 * @param chosen - the chosen row; null while none is.
 * @param governing - the lowest limit known.
 * @returns a Stop for each.
 */
export function beltStepFindings(
  { rows }: BeltSteps,
  chosen: BeltStepPlan | null,
  governing: SpeedLimit | undefined,
): Finding[] {
  const found: Finding[] = [];
  if (governing === undefined) return found;
  const figures = { limit: quantity(limitRpm(governing), 'rpm') };
  const names = { governs: governing.kind };
  if (chosen !== null && chosen.allowed === false && chosen.rpm.value !== null)
    found.push(
      finding('step-too-fast', {
        figures: { ...figures, rpm: quantity(chosen.rpm.value, 'rpm') },
        names: { ...names, step: chosen.name },
      }),
    );
  if (rows.length > 0 && rows.every(({ allowed }) => allowed === false))
    found.push(finding('every-step-too-fast', { figures, names }));
  return found;
}

/**
 * What the wheel's own speed is like for grinding; never a limit.
 *
 * @param speed - wheel speed, m/s.
 * @returns a note, or a Check where the wheel hardly grinds.
 */
export function wheelSpeedFindings(speed: Figure): Finding[] {
  if (speed.value === null) return [];
  const figures = {
    speed: quantity(speed.value, 'm/s'),
    low: quantity(USUAL_SPEED.low, 'm/s'),
    high: quantity(USUAL_SPEED.high, 'm/s'),
  };
  if (speed.value < USUAL_SPEED.low)
    return [
      finding('wheel-speed-low', {
        level: speed.value < USUAL_SPEED.poor ? 'check' : 'note',
        figures,
      }),
    ];
  return speed.value > USUAL_SPEED.high ? [finding('wheel-speed-high', { figures })] : [];
}

function chosenId(row: BeltStepPlan | null): string | null {
  return row?.id ?? null;
}
