import type { Grinder } from '@/shared/contracts/machines';
import type { WheelLife } from '@/shared/contracts/wheel-entries';
import type { UnitSystem } from '@/shared/domain/people';
import { limitRpm } from '@/shared/rules/limits';
import { signatureRefusal } from '@/shared/rules/wheel-signatures';
import { spindleUse } from '@/shared/rules/wheel-spindles';
import { stepChoices, type StepCase } from '@/shared/rules/wheel-steps';
import type { StepRefusal } from '@/shared/rules/wheel-step-words';

import { refusalView } from './wheel-cases';

interface Around {
  grinders: readonly Grinder[];
  units: UnitSystem;
}

/** What a wheel's page shows beside its entries: its standing, what may be done now, and where it may run. */
export function lifeView(
  given: StepCase,
  { grinders, units }: Around,
): Pick<WheelLife, 'standing' | 'steps' | 'spindles'> {
  const { standing, actor } = given;
  const view = (refusal: StepRefusal | null) =>
    refusal === null ? null : refusalView(refusal, units);
  const { onSpindle, lastTrialRun, longestTrialRunMinutes, latestOn, dressings, mountings } =
    standing;
  return {
    standing: {
      onSpindle,
      lastTrialRun,
      longestTrialRunMinutes,
      latestOn,
      dressings,
      mountings,
      waiting: standing.waiting.map((waiting) => ({
        ...waiting,
        refusal: view(signatureRefusal(waiting, actor)),
      })),
    },
    steps: stepChoices(given).map(({ refusal, ...choice }) => ({
      ...choice,
      refusal: view(refusal),
    })),
    spindles: grinders.flatMap((grinder) =>
      grinder.quills.map((quill) => {
        const use = spindleUse(
          { ...given.wheel, ...standing },
          { grinder: grinder.data, quill: quill.data },
          given.rules,
        );
        return {
          grinderId: grinder.id,
          grinderName: grinder.name,
          quillId: quill.id,
          quillName: quill.name,
          refusal: view(use.refusal),
          limitRpm: limitRpm(use.governing),
          limitOf: use.governing.kind,
          steps: use.steps.map(({ id, name, rpm, wheelSpeed, allowed }) => ({
            id,
            name,
            rpm: rpm.value ?? 0,
            wheelSpeedMPerS: wheelSpeed.value ?? 0,
            allowed: allowed === true,
          })),
          suggestedStepId: use.suggested,
        };
      }),
    ),
  };
}
