import { FigureRow, figureText } from '@/features/plan';
import { Button } from '@/features/ui/button';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { Segmented } from '@/features/ui/segmented';
import { SIDES, TAPER_GIVEN, TAPER_METHODS } from '@/shared/domain/setups';
import type { TaperPlan } from '@/shared/rules';

import { usePlanner } from '../planner-context';
import { SIDE_WORDS, TAPER_GIVEN_WORDS, TAPER_METHOD_WORDS } from '../words';
import { PlannerQuantity, QuantityRow } from './planner-fields';

const CENTRE_DEG = '60';

/** The cone as its drawing gives it, and the slide that makes it. */
export function TaperFields() {
  const { values, plan, setInput } = usePlanner();
  const { work } = values.inputs;
  const wrong = (code: string) => plan.findings.some((finding) => finding.code === code);
  const swapped = wrong('taper-ends-swapped')
    ? { error: 'The small end is not smaller than the big end.' }
    : {};
  const pointed = wrong('cone-past-its-point')
    ? { error: 'A cone this long would run past its own point.' }
    : {};
  return (
    <>
      <Segmented
        name="work.taperSide"
        label="The taper is"
        options={SIDES.map((value) => ({ value, label: SIDE_WORDS[value] }))}
        value={work.taperSide}
        onChange={(next) => setInput('work.taperSide', next)}
      />
      <Segmented
        name="work.taperMethod"
        label="Made with"
        options={TAPER_METHODS.map((value) => ({ value, label: TAPER_METHOD_WORDS[value] }))}
        value={work.taperMethod}
        onChange={(next) => setInput('work.taperMethod', next)}
      />
      <QuantityRow>
        <PlannerQuantity path="work.diameterMm" />
        <PlannerQuantity path="work.lengthMm" {...pointed} />
      </QuantityRow>
      <Segmented
        name="work.taperGiven"
        label="The drawing gives"
        options={TAPER_GIVEN.map((value) => ({ value, label: TAPER_GIVEN_WORDS[value] }))}
        value={work.taperGiven}
        onChange={(next) => setInput('work.taperGiven', next)}
      />
      {work.taperGiven === 'angle' ? (
        <>
          <PlannerQuantity path="work.includedAngleDeg" />
          {work.includedAngleDeg === null ? <LatheCentre /> : null}
        </>
      ) : work.taperGiven === 'small end' ? (
        <PlannerQuantity path="work.smallDiameterMm" {...swapped} />
      ) : (
        <PlannerQuantity path="work.taperPerLength" />
      )}
    </>
  );
}

/** Most cones ground on a lathe are its own centres. */
function LatheCentre() {
  const { setText } = usePlanner();
  return (
    <Button
      kind="quiet"
      label="A lathe centre: 60°"
      onPress={() => setText('work.includedAngleDeg', CENTRE_DEG)}
    />
  );
}

/** How the slide is set over. */
export function TaperFigures() {
  const { plan, values } = usePlanner();
  const { taper } = plan;
  if (taper === null) return null;
  return (
    <>
      <List label="How the slide is set over">
        {taper.compound ? <CompoundRows compound={taper.compound} /> : null}
        {taper.setover ? <FigureRow label="Set the tailstock over" figure={taper.setover} /> : null}
      </List>
      <Fold label="The cone" value={`${figureText(taper.halfAngle, values.units)} to the axis`}>
        <List label="The cone">
          <FigureRow label="Half angle" detail="from the spindle axis" figure={taper.halfAngle} />
          <FigureRow label="Included angle" figure={taper.includedAngle} />
          <FigureRow label="Taper" figure={taper.perLength} />
          <FigureRow label="Small end" figure={taper.smallDiameter} />
          <FigureRow label="Along the side" figure={taper.slantLength} />
          <FigureRow
            label="Depth for each infeed"
            detail="square to the surface"
            figure={taper.depthPerInfeed}
          />
        </List>
      </Fold>
    </>
  );
}

function CompoundRows({ compound }: { compound: NonNullable<TaperPlan['compound']> }) {
  const { zero } = compound;
  return (
    <>
      {zero !== 'spindle-axis' ? (
        <FigureRow
          label="Set the compound to"
          detail="on a scale with its zero across the bed"
          figure={compound.fromCrossSlide}
        />
      ) : null}
      {zero !== 'cross-slide' ? (
        <FigureRow
          label="Set the compound to"
          detail="on a scale with its zero along the bed"
          figure={compound.fromSpindleAxis}
        />
      ) : null}
      <FigureRow label="Travel of the compound" figure={compound.travel} />
      <FigureRow
        label="Turns of the crank a second"
        figure={compound.crankRate}
        options={{ digits: 1 }}
      />
      <FigureRow label="Work speed for one turn a second" figure={compound.handFedSpeed} />
    </>
  );
}
