import { FigureRow, figureText } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { Segmented } from '@/features/ui/segmented';
import { SHOULDERS } from '@/shared/domain/setups';

import { usePlanner } from '../planner-context';
import { SHOULDER_WORDS } from '../words';
import { PlannerQuantity, QuantityRow } from './planner-fields';

/** What is asked of round work only where it matters. */
export function RoundWorkFolds() {
  const { values, plan, setInput } = usePlanner();
  const { work } = values.inputs;
  return (
    <>
      <Fold label="Shoulders" value={SHOULDER_WORDS[work.shoulders].toLowerCase()}>
        <Segmented
          name="work.shoulders"
          label="A shoulder stops the wheel"
          options={SHOULDERS.map((value) => ({ value, label: SHOULDER_WORDS[value] }))}
          value={work.shoulders}
          onChange={(next) => setInput('work.shoulders', next)}
        />
      </Fold>
      <Fold
        label="Measured warm"
        value={
          work.warmerK === null
            ? 'let it cool first'
            : `shrinks ${figureText(plan.measuring.shrinkage, values.units)}`
        }
      >
        <Stack>
          <PlannerQuantity path="work.warmerK" remark="optional" />
          <List label="Cooling">
            <FigureRow label="Still shrinks, on diameter" figure={plan.measuring.shrinkage} />
          </List>
        </Stack>
      </Fold>
      {work.holding === 'centres' ? <UnlikeEnds /> : null}
    </>
  );
}

/** A shaft that came out larger at one end: the tailstock is moved by what this says. */
function UnlikeEnds() {
  const { values, plan } = usePlanner();
  const move = plan.measuring.tailstockMove;
  const way = (move.value ?? 0) >= 0 ? 'towards the wheel' : 'away from the wheel';
  const shown = { ...move, value: move.value === null ? null : Math.abs(move.value) };
  return (
    <Fold
      label="Ends came out unlike"
      value={
        move.value === null
          ? 'after a trial cut'
          : `tailstock ${figureText(shown, values.units)} ${way}`
      }
    >
      <Stack>
        <QuantityRow>
          <PlannerQuantity path="work.headEndMm" remark="optional" />
          <PlannerQuantity path="work.tailEndMm" remark="optional" />
          <PlannerQuantity path="work.endsApartMm" remark="optional" />
        </QuantityRow>
        <List label="Tailstock">
          <FigureRow label="Move the tailstock" detail={way} figure={shown} />
        </List>
      </Stack>
    </Fold>
  );
}
