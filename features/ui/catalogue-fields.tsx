import { useState } from 'react';

import { Cell, Row, Stack } from './card';
import { Checkbox } from './checkbox';
import { ErrorSummary } from './error-summary';
import { Field } from './field';
import { useFieldIdsOf } from './field-ids';
import { RadioRows } from './radio-row';
import { Segmented } from './segmented';
import { Select } from './select';

const RANGE = 'From 2 to 1 000 mm';

/** The controls of a form in every state. */
export function CatalogueFields() {
  const [diameter, setDiameter] = useState('1 1/4');
  const [secret, setSecret] = useState('');
  const [spindle, setSpindle] = useState<'rpm' | 'pulleys'>('pulleys');
  const [lathe, setLathe] = useState<'one' | 'two' | 'three' | null>(null);
  const [shield, setShield] = useState(false);
  const idsOf = useFieldIdsOf();
  const options = [
    { value: 'one', label: 'Lathe 3', detail: '9 speeds' },
    { value: 'two', label: 'Old lathe', detail: '6 speeds' },
    {
      value: 'three',
      label: 'Post grinder A',
      lockedBecause: 'Hole 10 mm, arbor 12.7: does not fit.',
    },
  ] as const;
  return (
    <Stack>
      <ErrorSummary
        attempt={0}
        errors={[
          { fieldId: idsOf('wide').input, message: 'Wheel diameter must be from 2 to 1 000 mm.' },
          { fieldId: idsOf('lathe').input, message: 'Choose a lathe.' },
        ]}
      />
      <Row>
        <Cell>
          <Field
            name="diameter"
            label="Wheel diameter, new"
            value={diameter}
            onChangeText={setDiameter}
            unit="in"
            spokenUnit="inches"
            inputMode="decimal"
            hint={RANGE}
          />
        </Cell>
        <Cell>
          <Field
            name="wide"
            label="Bore at jaws"
            value="-3"
            onChangeText={() => undefined}
            unit="mm"
            spokenUnit="millimetres"
            hint={RANGE}
            error="Bore at jaws must be from 2 to 1 000 mm."
          />
        </Cell>
      </Row>
      <Field name="secret" label="Password" value={secret} onChangeText={setSecret} secret />
      <Field
        name="note"
        label="Note"
        remark="optional"
        value=""
        onChangeText={() => undefined}
        lines={3}
        placeholder="What the next person should know"
      />
      <Segmented
        name="spindle"
        label="Spindle"
        value={spindle}
        onChange={setSpindle}
        options={[
          { value: 'rpm', label: 'rpm' },
          { value: 'pulleys', label: 'motor and pulleys' },
        ]}
      />
      <Select
        name="lathe"
        label="Lathe"
        options={options}
        value={lathe}
        onChange={setLathe}
        empty="Choose a lathe"
        aside="9 speeds"
      />
      <RadioRows
        name="grinder"
        label="Grinder"
        options={options}
        value={lathe}
        onChange={setLathe}
      />
      <Checkbox
        name="shield"
        label="A fixed shield stands around the open wheel"
        checked={shield}
        onChange={setShield}
      />
    </Stack>
  );
}
