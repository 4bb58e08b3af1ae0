import type { Grinder } from '@/shared/contracts/machines';
import type { ShopRules } from '@/shared/domain/shop-rules';
import type { WheelData } from '@/shared/domain/wheels';
import { planBeltSteps } from '@/shared/rules/belt-steps';
import type { FindingCode } from '@/shared/rules/findings';
import { speedLimits } from '@/shared/rules/limits';
import type { BeltStepPlan } from '@/shared/rules/types';
import { wheelFindings } from '@/shared/rules/wheel-checks';
import { formatQuantity } from '@/shared/units/format';

const DOES_NOT_FIT: readonly FindingCode[] = [
  'hole-too-small',
  'hole-too-large',
  'mandrel-too-thick',
  'mandrel-too-thin',
];

interface Use {
  wheel: WheelData;
  /** ISO date of the shop. */
  today: string;
  rules: ShopRules;
}

/** Which quills and belt steps of a grinder take the wheel, in a sentence each. */
export function runsOn({ data, quills }: Grinder, { wheel, today, rules }: Use): string[] {
  const fitting = quills.filter(
    (quill) =>
      !wheelFindings({ wheel, quill: quill.data, organicBond: null, typed: false, today }).some(
        ({ code }) => DOES_NOT_FIT.includes(code),
      ),
  );
  if (fitting.length === 0) return ['no quill or arbor here that it fits'];
  const all = speedLimits({ wheel, quill: null, grinder: data, rules });
  const { rows } = planBeltSteps(data, wheel.diameterNowMm, { all, wheelKnown: true });
  return [stepWords(rows), `on ${fitting.map(({ name }) => name).join(', ')}`];
}

function stepWords(rows: readonly BeltStepPlan[]): string {
  const names = (steps: readonly BeltStepPlan[]) => steps.map(({ name }) => name).join(', ');
  const allowed = rows.filter((row) => row.allowed === true);
  const locked = rows.filter((row) => row.allowed !== true);
  if (allowed.length === 0) return 'too fast on every belt step';
  if (locked.length === 0) return `on every belt step: ${names(allowed)}`;
  const tooFast = locked.map(
    ({ name, rpm }) =>
      `${name} (${formatQuantity({ value: rpm.value ?? NaN, unit: 'rpm' }, 'mm')})`,
  );
  return `belt steps ${names(allowed)}; not ${tooFast.join(', ')}`;
}
