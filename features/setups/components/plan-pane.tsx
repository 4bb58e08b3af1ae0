import { FigureReadout, figureText, FindingList } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { ReadoutRow } from '@/features/ui/readout';
import { Subheading } from '@/features/ui/text';
import { VerdictBadge } from '@/features/ui/verdict';
import type { SetupPart } from '@/shared/domain/setups';

import { usePlanner } from '../planner-context';
import { verdictCount } from '../verdict-count';
import { CautionList } from './caution-list';
import { Needs } from './findings-sheet';
import { OrderOfWork } from './order-of-work';
import { InfeedPasses } from './pictures/infeed-passes';
import { JawContactPicture } from './pictures/jaw-contact';
import { SetupPicturePane } from './setup-picture';

/** The plan beside the form on a wide screen. */
export function PlanPane({ onPart }: { onPart: (part: SetupPart) => void }) {
  const { plan, values } = usePlanner();
  const { speed, work, traverse, stock, time } = plan;
  const step = speed.steps.find(({ id }) => id === speed.chosen);
  const { jawBoreMm, padWidthMm } = values.inputs.work;
  return (
    <Stack>
      <VerdictBadge verdict={plan.verdict} count={verdictCount(plan)} />
      <Needs onPart={onPart} />
      <FindingList findings={plan.findings} sourced />
      <ReadoutRow ruled>
        <FigureReadout
          label="Spindle step"
          figure={speed.spindleRpm}
          value={step ? step.name : null}
          unit={figureText(speed.spindleRpm, values.units)}
        />
        <FigureReadout label="Wheel speed" figure={speed.wheelSpeed} />
        <FigureReadout label="Work" figure={work.latheRpm} />
        <FigureReadout
          label="Traverse, rough"
          figure={traverse.roughRate}
          options={{ digits: 0 }}
        />
        <FigureReadout label="Stock, on radius" figure={stock} options={{ rounding: 'up' }} />
        <FigureReadout label="Time" figure={time.total} options={{ digits: 0, rounding: 'up' }} />
      </ReadoutRow>
      {plan.jaws && jawBoreMm !== null && padWidthMm !== null ? (
        <>
          <Subheading>Where each jaw starts to touch</Subheading>
          <JawContactPicture
            plan={plan.jaws}
            boreMm={jawBoreMm}
            padWidthMm={padWidthMm}
            units={values.units}
          />
        </>
      ) : null}
      {plan.passes.length > 0 ? (
        <>
          <Subheading>Infeed, pass by pass</Subheading>
          <InfeedPasses passes={plan.passes} units={values.units} />
        </>
      ) : null}
      <SetupPicturePane />
      <Fold label="Order of the work" value="from survey to the last measurement">
        <OrderOfWork />
      </Fold>
      <Fold
        label="Cautions for this plan"
        value={`${plan.cautions.length} to read before starting`}
      >
        <CautionList />
      </Fold>
    </Stack>
  );
}
