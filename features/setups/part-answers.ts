import type { SetupPart } from '@/shared/domain/setups';
import type { UnitSystem } from '@/shared/domain/people';
import { figureText } from '@/features/plan';
import type { Plan, PlanInput } from '@/shared/rules';
import { formatQuantity } from '@/shared/units/format';

/** What each part says under its name: its own answer, never "done". */
export function partAnswers(
  plan: Plan,
  input: PlanInput,
  units: UnitSystem,
): Record<SetupPart, string> {
  const missing = (part: SetupPart) => plan.needs.filter((need) => need.part === part).length;
  const or = (part: SetupPart, answer: string | null) =>
    answer ?? (missing(part) > 0 ? `needs ${missing(part)}` : '–');
  const { speed, stock, passes, dressing } = plan;
  const step = speed.steps.find(({ id }) => id === speed.chosen);
  return {
    work: or('work', stock.value === null ? null : figureText(stock, units, { rounding: 'up' })),
    machine: or('machine', quillAnswer(input, units)),
    wheel: or(
      'wheel',
      step && speed.wheelSpeed.value !== null
        ? `${step.name}, ${figureText(speed.wheelSpeed, units)}`
        : null,
    ),
    cut: or('cut', passes.length > 0 ? `${passes.length} passes` : null),
    dress: or('dress', dressing ? `${dressing.rough.passes} + ${dressing.finish.passes}` : null),
  };
}

/** The quill as a drawing gives it: diameter × overhang. */
function quillAnswer({ quill }: PlanInput, units: UnitSystem): string | null {
  const thinnest = quill?.segments[0];
  if (!quill || !thinnest) return null;
  const size = (value: number) => formatQuantity({ value, unit: 'mm' }, units, { withUnit: false });
  const overhang = quill.segments.reduce((sum, { lengthMm }) => sum + lengthMm, 0);
  return `${size(thinnest.diameterMm)} × ${size(overhang)}`;
}
