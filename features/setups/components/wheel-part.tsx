import { FigureRow } from '@/features/plan';
import { Button } from '@/features/ui/button';
import { Card, Cell, Row, Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { Segmented } from '@/features/ui/segmented';
import { Select } from '@/features/ui/select';
import { Small, Strong } from '@/features/ui/text';
import { SetAside } from '@/features/wheels';
import type { SpeedLimit } from '@/shared/rules';
import { LOOK_RESULTS, RING_RESULTS, type WheelData } from '@/shared/domain/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import { formatQuantity } from '@/shared/units/format';
import { useState } from 'react';

import { usePlanner } from '../planner-context';
import { LOOK_WORDS, MARKING_PLACE_WORDS, RING_WORDS } from '../words';
import { StepLimits } from './pictures/step-limits';
import { TypedWheelFields } from './typed-wheel-fields';
import { WheelMarks } from './wheel-marks';
import { WheelPicker } from './wheel-picker';

const LIMIT_WORDS: Record<SpeedLimit['kind'], string> = {
  'marked rpm': 'Marked rpm',
  'marked speed': 'Marked speed, at the new diameter',
  unmarked: 'No marking: the wheel must not run',
  'maker, mounted': "Maker's rpm at this overhang",
  'quill marked': 'Marked on the quill',
  'quill bending': 'Bending of the quill',
  'grinder spindle': "The grinder's spindle",
};

/** Which wheel, on which belt step, and every limit in force. */
export function WheelPart() {
  const { values, plan, setInput } = usePlanner();
  const { wheel } = values.inputs;
  return (
    <Stack>
      <ChosenWheel />
      {wheel.typed ? <TypedWheelFields /> : null}
      <StepLimits
        speed={plan.speed}
        limits={plan.limits}
        units={values.units}
        onChoose={(id) => setInput('machine.beltStepId', id)}
      />
      {plan.limits.all.length > 0 ? (
        <Fold label="All limits" value={`${plan.limits.all.length} in force`}>
          <List label="All limits">
            {plan.limits.all.map(({ kind, rpm }) => (
              <FigureRow
                key={kind}
                label={LIMIT_WORDS[kind]}
                figure={rpm}
                options={{ rounding: 'down' }}
              />
            ))}
          </List>
        </Fold>
      ) : null}
      <WheelMarks />
      <Soundness />
    </Stack>
  );
}

function sizes(data: WheelData, units: UnitSystem): string {
  const size = (value: number) => formatQuantity({ value, unit: 'mm' }, units, { withUnit: false });
  const bore = formatQuantity({ value: data.holeMm, unit: 'mm' }, units);
  return `${size(data.diameterNowMm)} × ${size(data.widthMm)} × ${bore}`;
}

function marked(data: WheelData, units: UnitSystem): string {
  const marks = [
    ...(data.markedRpm === null
      ? []
      : [formatQuantity({ value: data.markedRpm, unit: 'rpm' }, units)]),
    ...(data.markedSpeedMPerS === null
      ? []
      : [formatQuantity({ value: data.markedSpeedMPerS, unit: 'm/s' }, units)]),
  ];
  if (marks.length === 0) return 'no speed marked';
  const place = data.markingReadOn ? ` ${MARKING_PLACE_WORDS[data.markingReadOn]}` : '';
  return `marked ${marks.join(' and ')}${place}`;
}

function ChosenWheel() {
  const { values, wheel, setInput } = usePlanner();
  const [picking, setPicking] = useState(false);
  const { typed, wheelId } = values.inputs.wheel;
  const chosen = wheelId !== null;
  return (
    <Card>
      <Row align="center">
        <Cell least={180}>
          <Strong>
            {typed
              ? 'A wheel typed in'
              : wheel
                ? [wheel.tag, wheel.data.marking].filter(Boolean).join(' · ')
                : chosen
                  ? 'Fetching the wheel'
                  : 'No wheel chosen'}
          </Strong>
          <Small>
            {wheel && !typed
              ? `${sizes(wheel.data, values.units)}, ${marked(wheel.data, values.units)}`
              : typed
                ? 'For this setup alone. Add it to the Rack to keep its record.'
                : 'From the Rack, or typed in.'}
          </Small>
        </Cell>
        <Button
          label={chosen || typed ? 'Change' : 'Choose'}
          spoken={chosen || typed ? 'Change the wheel' : 'Choose the wheel'}
          onPress={() => setPicking(true)}
        />
        {wheel && !typed ? <SetAside wheel={wheel} /> : null}
      </Row>
      <WheelPicker
        open={picking}
        onClose={() => setPicking(false)}
        chosen={wheelId}
        onChoose={(next) => setInput('wheel', { wheelId: next, typed: null })}
        onType={() => setInput('wheel', { wheelId: null, typed: typed ?? EMPTY_TYPED_WHEEL })}
      />
    </Card>
  );
}

const EMPTY_TYPED_WHEEL = {
  marking: null,
  diameterNewMm: null,
  diameterNowMm: null,
  widthMm: null,
  holeMm: null,
  markedRpm: null,
  markedSpeedMPerS: null,
  markingReadOn: null,
  looked: null,
  rung: null,
};

/** The look and the ring test: read from the Rack's record, answered here for a typed wheel. */
function Soundness() {
  const { values, input, setInput } = usePlanner();
  const { typed } = values.inputs.wheel;
  const data = typed ?? input.wheelData;
  if (!data) return null;
  const value = [
    data.looked ? LOOK_WORDS[data.looked] : 'not looked at yet',
    data.rung ? RING_WORDS[data.rung] : 'not rung yet',
  ].join(', ');
  return (
    <Fold label="Checked before mounting" value={value} startOpen={typed !== null}>
      <Stack>
        {typed ? (
          <>
            <Select
              name="wheel.typed.looked"
              label="Looked at closely, in good light"
              options={LOOK_RESULTS.map((result) => ({ value: result, label: LOOK_WORDS[result] }))}
              value={typed.looked}
              onChange={(next) => setInput('wheel.typed.looked', next)}
            />
            <Segmented
              name="wheel.typed.rung"
              label="Ring test"
              options={RING_RESULTS.map((result) => ({ value: result, label: RING_WORDS[result] }))}
              value={typed.rung}
              onChange={(next) => setInput('wheel.typed.rung', next)}
            />
          </>
        ) : (
          <Small>From the wheel’s record on the Rack.</Small>
        )}
        <Small>
          Tap gently about 45 degrees to each side of the top, an inch or two from the edge; turn
          the wheel 45 degrees and tap again. Wheels of 4 in and under hardly sound: for them the
          look decides.
        </Small>
      </Stack>
    </Fold>
  );
}
