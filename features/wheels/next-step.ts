import type { WheelLife } from '@/shared/contracts/wheel-entries';
import type { EntryKind } from '@/shared/domain/wheel-life';

export type StepChoice = WheelLife['steps'][number];

/** The step that most likely comes next; null where none of the likely ones is allowed. */
export function likelyStep({ wheel, standing, steps }: WheelLife, trialRunMinutes: number) {
  const { state, looked, rung, mounted } = wheel.data;
  const hasRun =
    standing.lastTrialRun !== null && standing.longestTrialRunMinutes >= trialRunMinutes;
  const order: EntryKind[] =
    state === 'mounted'
      ? [...(hasRun ? (['dressed'] as const) : []), 'trial run', 'dressed', 'taken off']
      : [
          ...(looked === null ? (['inspected'] as const) : []),
          ...(rung === null && mounted === null ? (['ring test'] as const) : []),
          state === 'set aside' ? 'returned' : 'mounted',
        ];
  return (
    order
      .map((kind) => steps.find((step) => step.kind === kind))
      .find((step) => step?.refusal === null) ?? null
  );
}

/** Steps that are refused, gathered by the reason against them. */
export function refusedSteps(steps: readonly StepChoice[]): { kinds: EntryKind[]; why: string }[] {
  const reasons = new Map<string, EntryKind[]>();
  for (const { kind, refusal } of steps) {
    if (refusal !== null) reasons.set(refusal.words, [...(reasons.get(refusal.words) ?? []), kind]);
  }
  return [...reasons].map(([why, kinds]) => ({ why, kinds }));
}
