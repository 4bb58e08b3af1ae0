import { FigureRow } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { Small } from '@/features/ui/text';
import type { HeightPlan } from '@/shared/rules';
import { formatQuantity } from '@/shared/units/format';

import { usePlanner } from '../planner-context';
import { PlannerQuantity } from './planner-fields';

/** How high the wheel stands, what that does to the infeed, and the shims that mend it. */
export function CentreHeight() {
  const { values, plan } = usePlanner();
  const { belowCentreMm } = values.inputs.machine;
  const { height } = plan;
  return (
    <Fold label="Centre height" value={heightWords(belowCentreMm)}>
      <Stack>
        <PlannerQuantity path="machine.belowCentreMm" remark="optional" />
        {height && belowCentreMm !== 0 ? (
          <>
            <List label="Centre height">
              <FigureRow label="Share of the infeed that cuts" figure={height.gain} />
            </List>
            {belowCentreMm !== null && belowCentreMm > 0 ? <Shims height={height} /> : null}
          </>
        ) : null}
      </Stack>
    </Fold>
  );
}

function heightWords(belowMm: number | null): string {
  if (belowMm === null) return 'not measured';
  if (belowMm === 0) return 'on centre';
  return belowMm > 0 ? 'below centre' : 'above centre';
}

function Shims({ height: { shimsMm } }: { height: HeightPlan }) {
  const { values, input } = usePlanner();
  const kept = input.grinder?.shimsMm.length ?? 0;
  const stack = shimsMm?.map((value) => formatQuantity({ value, unit: 'mm' }, values.units));
  return (
    <Small>
      {stack
        ? stack.length === 0
          ? 'Near enough: no shim is needed.'
          : `Shims from those kept with the grinder: ${stack.join(' + ')}.`
        : kept === 0
          ? 'Record the shims kept with the grinder, and the fewest that fit are named here.'
          : 'None of the shims kept with the grinder come within 0.05 mm of it.'}
    </Small>
  );
}
