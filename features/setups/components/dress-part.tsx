import { FigureRow } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { List } from '@/features/ui/list-row';
import { Engraved, Small } from '@/features/ui/text';
import type { DressStage } from '@/shared/rules';

import { usePlanner } from '../planner-context';
import { PlannerQuantity, QuantityRow } from './planner-fields';

/** How the wheel is trued and dressed, rough and fine. */
export function DressPart() {
  const { plan } = usePlanner();
  const { dressing } = plan;
  return (
    <Stack>
      <QuantityRow>
        <PlannerQuantity path="dress.tipRadiusMm" remark="optional" />
        <PlannerQuantity path="dress.diamondCarats" suggested={dressing?.diamond ?? null} />
      </QuantityRow>
      <Engraved>Before roughing</Engraved>
      <QuantityRow>
        <PlannerQuantity path="dress.roughDepthMm" suggested={dressing?.rough.depth ?? null} />
        <PlannerQuantity path="dress.roughPasses" remark="optional" />
        <PlannerQuantity path="dress.roughOverlap" remark="optional" />
      </QuantityRow>
      {dressing ? <StageFigures name="Rough dressing" stage={dressing.rough} /> : null}
      <Engraved>Before finishing</Engraved>
      <QuantityRow>
        <PlannerQuantity path="dress.finishDepthMm" suggested={dressing?.finish.depth ?? null} />
        <PlannerQuantity path="dress.finishPasses" remark="optional" />
        <PlannerQuantity path="dress.finishOverlap" remark="optional" />
      </QuantityRow>
      {dressing ? (
        <StageFigures name="Fine dressing" stage={dressing.finish} />
      ) : (
        <Small>The lead follows from wheel and belt step; choose them first.</Small>
      )}
      <Small>
        Diamond on centre height or a little to the trailing side, dragging 10 to 15 degrees, lathe
        spindle locked. True after every mounting; take the dresser out before grinding.
      </Small>
    </Stack>
  );
}

function StageFigures({ name, stage }: { name: string; stage: DressStage }) {
  return (
    <List label={name}>
      <FigureRow
        label="Lead"
        detail={`${stage.passes} ${stage.passes === 1 ? 'pass' : 'passes'}, overlap ${stage.overlap}`}
        figure={stage.lead}
      />
      <FigureRow label="Time across the wheel" figure={stage.secondsAcross} />
      <FigureRow label="The wheel loses, on diameter" figure={stage.wheelLoss} />
    </List>
  );
}
