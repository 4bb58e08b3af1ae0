import type { PlanInput } from '../domain/setups';
import { firstFrequency, quillStiffness, quillTaper, taperFindings, wheelMassKg } from './quill';
import { postStiffness, stiffnessAtWheel, workStiffness } from './stiffness';
import type { Surface } from './surface';
import type { Figure, Finding, Plan } from './types';

/** Stiffness of the quill alone, and of everything that gives way at the wheel. */
export interface PlanStiffness {
  own: Figure;
  atWheel: Figure;
}

/**
 * Quill, post and work of a setup, as stiff as they are together.
 *
 * @param input - the setup.
 * @param surface - the ground surface.
 * @returns N/mm; null inside while a part is unknown.
 */
export function stiffnessOf(input: PlanInput, surface: Surface): PlanStiffness {
  const own = quillStiffness(input.quill);
  const atWheel = stiffnessAtWheel({
    quill: own,
    post: postStiffness(
      input.grinder?.postStiffnessNPerMm ?? null,
      input.rules.assumedPostStiffnessNPerMm,
    ),
    work: workStiffness(input.work, surface),
  });
  return { own, atWheel };
}

/**
 * How the quill behaves in this plan, and what that says of the bore.
 *
 * @param input - the setup.
 * @param from - stiffness, rough lag, and the normal force while finishing.
 * @returns the quill's figures, and a note when its taper takes a good part of the tolerance.
 * @source derived-beam
 * @example planQuill(planInput, { stiffness: stiffnessOf(planInput, surfaceOf(planInput)), lag: stated('lag', [0.002, 'mm']), finishForce: stated('force', [5, 'N']) }).findings // []
 */
export function planQuill(
  { quill, wheelData: wheel, work }: PlanInput,
  from: { stiffness: PlanStiffness; lag: Figure; finishForce: Figure },
): { quill: Plan['quill']; findings: Finding[] } {
  const taper = quillTaper(quill, from.finishForce.value, wheel?.widthMm ?? null);
  return {
    quill: {
      stiffness: from.stiffness.own,
      stiffnessAtWheel: from.stiffness.atWheel,
      lag: from.lag,
      firstFrequency: firstFrequency(quill, wheel === null ? null : wheelMassKg(wheel)),
      taper,
    },
    findings: taperFindings(taper, work.toleranceMm),
  };
}
