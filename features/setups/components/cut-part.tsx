import { FigureRow } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { RadioRows } from '@/features/ui/radio-row';
import { Segmented } from '@/features/ui/segmented';
import { Small } from '@/features/ui/text';
import { useLayout } from '@/features/ui/use-layout';
import { PASS_STROKES } from '@/shared/domain/setups';
import type { Plan } from '@/shared/rules';
import { formatQuantity } from '@/shared/units/format';

import { usePlanner } from '../planner-context';
import { STROKE_WORDS } from '../words';
import { InfeedPasses } from './pictures/infeed-passes';
import { LearnedFraction } from './learned-fraction';
import { PlannerQuantity, QuantityRow } from './planner-fields';

const GOVERNOR_WORDS: Record<NonNullable<Plan['infeed']['governedBy']>, string> = {
  table: 'the handbook’s table sets it',
  lag: 'the spring of quill and post sets it',
  power: 'the motor sets it',
  burn: 'heat sets it',
  dial: 'the dial sets it',
  shop: 'the shop’s limit for a tool-post grinder sets it',
  stock: 'a third of the rough stock sets it',
  typed: 'as you typed it',
};

/** Work speed, infeed and traverse: suggested, each can be overruled. */
export function CutPart() {
  const { values, setInput, plan } = usePlanner();
  const { wide } = useLayout();
  const { cut } = values.inputs;
  const { infeed, traverse } = plan;
  return (
    <Stack>
      <QuantityRow>
        <PlannerQuantity path="cut.roughInfeedMm" suggested={infeed.rough} places={4} />
        <PlannerQuantity path="cut.finishInfeedMm" suggested={infeed.finish} places={4} />
      </QuantityRow>
      {infeed.governedBy ? (
        <Small>{`Rough infeed: ${GOVERNOR_WORDS[infeed.governedBy]}.`}</Small>
      ) : null}
      {!wide && plan.passes.length > 0 ? (
        <InfeedPasses passes={plan.passes} units={values.units} />
      ) : null}
      <LatheSteps />
      <Fold
        label="Traverse and overrun"
        value={plan.traverse.plunge ? 'plunge' : 'along the surface'}
      >
        <Stack>
          <QuantityRow>
            <PlannerQuantity path="cut.roughTraverseMmPerRev" suggested={traverse.rough} />
            <PlannerQuantity path="cut.finishTraverseMmPerRev" suggested={traverse.finish} />
          </QuantityRow>
          <PlannerQuantity path="cut.overrunMm" suggested={traverse.overrun} />
          <Segmented
            name="cut.strokes"
            label="One pass is"
            options={PASS_STROKES.map((value) => ({ value, label: STROKE_WORDS[value] }))}
            value={cut.strokes ?? 'both strokes'}
            onChange={(next) => setInput('cut.strokes', next)}
          />
          <List label="Traverse figures">
            <FigureRow label="Rough traverse rate" figure={traverse.roughRate} />
            <FigureRow label="Finish traverse rate" figure={traverse.finishRate} />
            <FigureRow label="Travel of one stroke" figure={traverse.travel} />
            <FigureRow label="Seconds a stroke, by hand" figure={traverse.secondsPerStroke} />
          </List>
        </Stack>
      </Fold>
      <Fold label="Finish and spark-out" value="what is left, and how long to wait">
        <QuantityRow>
          <PlannerQuantity path="cut.finishStockMm" remark="optional" />
          <PlannerQuantity path="cut.sparkOutPasses" remark="optional" />
        </QuantityRow>
      </Fold>
      <Fold label="Dial and wheel wear" value={dialWords(infeed)}>
        <List label="Dial and wheel wear">
          {infeed.compoundAngle ? (
            <FigureRow
              label="Compound for fine infeed"
              detail="from the spindle axis"
              figure={infeed.compoundAngle}
            />
          ) : null}
          {infeed.perTurn ? (
            <FigureRow label="Infeed for each turn, rough" figure={infeed.perTurn.rough} />
          ) : null}
          <FigureRow
            label="The wheel wears, each pass"
            detail="on radius, fed apart from the schedule"
            figure={infeed.wheelWear}
            options={{ digits: 5 }}
          />
        </List>
      </Fold>
      <LearnedFraction />
      <Fold label="Force, power and heat" value="what the cut asks of the machine">
        <List label="Force, power and heat">
          <FigureRow label="Cut fraction, rough" figure={plan.cutFraction.rough} />
          <FigureRow label="Cut fraction, finish" figure={plan.cutFraction.finish} />
          <FigureRow label="Steady lag of the quill" figure={plan.quill.lag} />
          <FigureRow label="Metal removed" figure={plan.power.removalRate} />
          <FigureRow label="Force along the cut" figure={plan.power.tangentialForce} />
          <FigureRow label="Force pressing the quill back" figure={plan.power.normalForce} />
          <FigureRow label="Power" figure={plan.power.power} />
          <FigureRow label="Burning begins above" figure={plan.power.burnThreshold} />
          <FigureRow
            label="Equivalent chip thickness"
            figure={plan.power.chipThickness}
            options={{ digits: 6 }}
          />
          <FigureRow label="Removed for each width of wheel" figure={plan.power.specificRemoval} />
        </List>
      </Fold>
    </Stack>
  );
}

/** Divisions to set at each pass, as they stand on the dial. */
function dialWords({ roughDivisions, finishDivisions }: Plan['infeed']): string {
  const words = [roughDivisions, finishDivisions].map((divisions) =>
    divisions === null ? 'not by dial' : String(Math.round(divisions * 100) / 100),
  );
  return `${words.join(' and ')} divisions`;
}

function LatheSteps() {
  const { values, setInput, plan } = usePlanner();
  const { steps, latheRpm } = plan.work;
  if (steps.length === 0) return <Small>Lathe speeds come with the lathe.</Small>;
  const chosen = values.inputs.cut.latheRpm ?? latheRpm.value;
  const rpmWords = (rpm: number) => formatQuantity({ value: rpm, unit: 'rpm' }, values.units);
  return (
    <Fold label="Lathe speed" value={chosen === null ? 'not known yet' : rpmWords(chosen)}>
      <RadioRows
        name="cut.latheRpm"
        label="Lathe step"
        options={steps.map(({ rpm, workSpeedMPerMin, speedRatio }) => ({
          value: String(rpm),
          label: rpmWords(rpm),
          detail: [
            formatQuantity({ value: workSpeedMPerMin, unit: 'm/min' }, values.units),
            ...(speedRatio === null ? [] : [`speed ratio ${Math.round(speedRatio)}`]),
          ].join(', '),
        }))}
        value={chosen === null ? null : String(chosen)}
        onChange={(next) => setInput('cut.latheRpm', Number(next))}
      />
    </Fold>
  );
}
