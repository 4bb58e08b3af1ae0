import { FigureRow } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Checkbox } from '@/features/ui/checkbox';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { Segmented } from '@/features/ui/segmented';
import { Select } from '@/features/ui/select';
import { Engraved } from '@/features/ui/text';
import { useLayout } from '@/features/ui/use-layout';
import { MATERIALS } from '@/shared/domain/materials';
import { HOLDINGS, OPERATIONS, PRELOADS } from '@/shared/domain/setups';
import { kindOf } from '@/shared/rules';

import { usePlanner } from '../planner-context';
import { HOLDING_WORDS, MATERIAL_WORDS, OPERATION_SHORT, PRELOAD_WORDS } from '../words';
import { FromReadings } from './from-readings';
import { PlannerQuantity, QuantityRow } from './planner-fields';
import { JawContactPicture } from './pictures/jaw-contact';
import { RoundWorkFolds } from './round-work-folds';
import { TaperFields, TaperFigures } from './taper-fields';

/** What is ground, of what, and how it runs now. */
export function WorkPart() {
  const { values, setInput, plan } = usePlanner();
  const { operation, work } = values.inputs;
  return (
    <Stack>
      <Segmented
        name="operation"
        label="Operation"
        options={OPERATIONS.map((value) => ({ value, label: OPERATION_SHORT[value] }))}
        value={operation}
        onChange={(next) => setInput('operation', next)}
      />
      <Select
        name="work.material"
        label="Material"
        empty="Choose the material"
        options={MATERIALS.map((value) => ({ value, label: MATERIAL_WORDS[value] }))}
        value={work.material}
        onChange={(next) => setInput('work.material', next)}
      />
      {operation === 'jaws' ? <JawFields /> : <RoundFields />}
      {operation === 'taper' ? <TaperFigures /> : null}
      <List label="What the work asks for">
        <FigureRow
          label={
            operation === 'taper' ? 'To come off, at the cross-slide' : 'To come off, on radius'
          }
          figure={plan.stock}
          options={{ rounding: 'up' }}
        />
      </List>
    </Stack>
  );
}

function JawFields() {
  const { values, plan, setInput } = usePlanner();
  const { wide } = useLayout();
  const { work } = values.inputs;
  return (
    <>
      <QuantityRow>
        <PlannerQuantity path="work.jawBoreMm" />
        <PlannerQuantity path="work.lengthMm" />
      </QuantityRow>
      <Engraved>Indicator readings</Engraved>
      <QuantityRow>
        <PlannerQuantity path="work.nearDistanceMm" />
        <PlannerQuantity path="work.nearRunOutMm" />
        <PlannerQuantity path="work.nearHighSpotDeg" />
      </QuantityRow>
      <QuantityRow>
        <PlannerQuantity path="work.farDistanceMm" />
        <PlannerQuantity path="work.farRunOutMm" />
        <PlannerQuantity path="work.farHighSpotDeg" />
      </QuantityRow>
      <FromReadings />
      {!wide && plan.jaws && work.jawBoreMm !== null && work.padWidthMm !== null ? (
        <JawContactPicture
          plan={plan.jaws}
          boreMm={work.jawBoreMm}
          padWidthMm={work.padWidthMm}
          units={values.units}
        />
      ) : null}
      <Engraved>The chuck</Engraved>
      <QuantityRow>
        <PlannerQuantity path="work.jawCount" />
        <PlannerQuantity path="work.padWidthMm" />
        <PlannerQuantity path="work.clearDepthMm" />
      </QuantityRow>
      <Select
        name="work.preload"
        label="How the jaws are loaded"
        empty="Choose the preload"
        hint="Loose jaws are never ground: they must be pressed the way they will grip."
        options={PRELOADS.map((value) => ({ value, label: PRELOAD_WORDS[value] }))}
        value={work.preload}
        onChange={(next) => setInput('work.preload', next)}
      />
      <Fold
        label="What the pads tell"
        value={jawFoldValue(work.lastGroundDiameterMm, work.bellMouthMm)}
      >
        <QuantityRow>
          <PlannerQuantity path="work.lastGroundDiameterMm" remark="optional" />
          <PlannerQuantity path="work.bellMouthMm" remark="optional" />
        </QuantityRow>
      </Fold>
    </>
  );
}

const jawFoldValue = (lastGround: number | null, bellMouth: number | null) =>
  [
    lastGround === null ? 'last ground: not known' : 'last ground: known',
    bellMouth === null ? 'wear: not measured' : 'wear: measured',
  ].join(', ');

function RoundFields() {
  const { values, setInput } = usePlanner();
  const { operation, work } = values.inputs;
  const outside = kindOf(values.inputs) === 'outside';
  return (
    <>
      {operation === 'taper' ? (
        <TaperFields />
      ) : (
        <QuantityRow>
          <PlannerQuantity path="work.diameterMm" />
          <PlannerQuantity path="work.lengthMm" />
        </QuantityRow>
      )}
      <QuantityRow>
        <PlannerQuantity path="work.stockOnDiameterMm" />
        <PlannerQuantity path="work.runOutMm" />
      </QuantityRow>
      <FromReadings />
      <PlannerQuantity path="work.toleranceMm" remark="optional" />
      {outside ? (
        <>
          <Select
            name="work.holding"
            label="How it is held"
            empty="Choose the holding"
            options={HOLDINGS.map((value) => ({ value, label: HOLDING_WORDS[value] }))}
            value={work.holding}
            onChange={(next) => setInput('work.holding', next)}
          />
          <QuantityRow>
            <PlannerQuantity path="work.unsupportedLengthMm" />
            <PlannerQuantity path="work.shaftDiameterMm" remark="optional" />
          </QuantityRow>
        </>
      ) : (
        <>
          <Segmented
            name="work.throughBore"
            label="The bore"
            options={[
              { value: 'through', label: 'goes through' },
              { value: 'blind', label: 'is blind' },
            ]}
            value={work.throughBore === null ? null : work.throughBore ? 'through' : 'blind'}
            onChange={(next) => setInput('work.throughBore', next === 'through')}
          />
          <PlannerQuantity path="work.clearDepthMm" />
        </>
      )}
      <Checkbox
        name="work.interrupted"
        label="The surface is interrupted: keyway, spline, cross hole"
        checked={work.interrupted}
        onChange={(next) => setInput('work.interrupted', next)}
      />
      <RoundWorkFolds />
    </>
  );
}
