import type { PlanInput } from '../domain/setups';
import { clearanceFindings } from './clearance';
import { guardFindings } from './guard';
import { rotationFindings, type Turning } from './rotation';
import { shoulderFindings, stockFindings } from './stock';
import { notNegative } from './sizes';
import { kindOf, type Surface } from './surface';
import type { Figure, Finding } from './types';
import { unitFindings } from './unit-doubt';
import { wheelFindings } from './wheel-checks';
import { isOrganic, markingOf } from './bond';
import { markFindings } from './recommended-marks';

/**
 * Wheel, guard, directions, room, clean-up and units: all that is judged from the inputs and the overrun.
 *
 * @param input - the setup.
 * @param known - the ground surface, the overrun, and how wheel and work turn.
 * @returns all findings of these subjects.
 */
export function inputFindings(
  input: PlanInput,
  { surface, overrun, turning }: { surface: Surface; overrun: Figure; turning: Turning },
): Finding[] {
  const { work, grinder, quill, wheelData: wheel } = input;
  const kind = kindOf(input);
  const overrunMm = overrun.value;
  const open = kind === 'bore' && work.throughBore !== false;
  return [
    ...(wheel === null ? [] : ownFindings(input, wheel)),
    ...guardFindings({
      kind,
      grinder,
      shieldFitted: input.machine.shieldFitted,
      overrunMm,
      widthMm: wheel?.widthMm ?? null,
    }),
    ...rotationFindings(turning),
    ...(surface.side === 'outside'
      ? []
      : clearanceFindings({
          boreMm: surface.leastDiameterMm ?? surface.diameterMm,
          lengthMm: surface.lengthMm,
          overrunMm,
          clearDepthMm: open ? null : notNegative(work.clearDepthMm),
          wheel,
          quill,
        })),
    ...stockFindings(input),
    ...shoulderFindings(surface),
    ...unitFindings(input),
  ];
}

function ownFindings(input: PlanInput, wheel: NonNullable<PlanInput['wheelData']>): Finding[] {
  return [
    ...wheelFindings({
      wheel,
      quill: input.quill,
      organicBond: isOrganic(markingOf(wheel.marking)),
      typed: input.wheel.typed !== null,
      today: input.today,
    }),
    ...markFindings(wheel.marking, input.work.material),
  ];
}
