import { MarkingField } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Select } from '@/features/ui/select';
import { MARKING_PLACES } from '@/shared/domain/wheels';

import { usePlanner } from '../planner-context';
import { MARKING_PLACE_WORDS } from '../words';
import { PlannerQuantity, QuantityRow } from './planner-fields';

/** A wheel for this setup alone, as its marking reads. */
export function TypedWheelFields() {
  const { values, plan, setInput } = usePlanner();
  const { typed } = values.inputs.wheel;
  if (!typed) return null;
  const fills = plan.findings.some(({ code }) => code === 'wheel-fills-bore');
  return (
    <Stack>
      <MarkingField
        name="wheel.typed.marking"
        value={typed.marking ?? ''}
        onChangeText={(text) => setInput('wheel.typed.marking', text === '' ? null : text)}
      />
      <QuantityRow>
        <PlannerQuantity
          path="wheel.typed.diameterNewMm"
          {...(fills
            ? { error: 'The wheel is as wide as the bore, or wider: it cannot go in.' }
            : {})}
        />
        <PlannerQuantity path="wheel.typed.diameterNowMm" remark="optional" />
      </QuantityRow>
      <QuantityRow>
        <PlannerQuantity path="wheel.typed.widthMm" />
        <PlannerQuantity path="wheel.typed.holeMm" />
      </QuantityRow>
      <QuantityRow>
        <PlannerQuantity path="wheel.typed.markedRpm" />
        <PlannerQuantity path="wheel.typed.markedSpeedMPerS" />
      </QuantityRow>
      <Select
        name="wheel.typed.markingReadOn"
        label="Where the speed was read"
        options={MARKING_PLACES.map((place) => ({
          value: place,
          label: MARKING_PLACE_WORDS[place],
        }))}
        value={typed.markingReadOn}
        onChange={(next) => setInput('wheel.typed.markingReadOn', next)}
      />
    </Stack>
  );
}
