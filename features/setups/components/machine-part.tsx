import { useShop } from '@/features/session';
import { FigureRow } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Checkbox } from '@/features/ui/checkbox';
import { Fold } from '@/features/ui/fold';
import { ButtonLink } from '@/features/ui/link';
import { List } from '@/features/ui/list-row';
import { Segmented } from '@/features/ui/segmented';
import { Select } from '@/features/ui/select';
import { Small } from '@/features/ui/text';
import { formatQuantity } from '@/shared/units/format';
import type { UnitSystem } from '@/shared/domain/people';
import type { QuillData } from '@/shared/domain/machines';
import { kindOf } from '@/shared/rules';

import { usePlanner } from '../planner-context';
import { CentreHeight } from './centre-height';
import { SetupPictureFold } from './setup-picture';

/** Which lathe, which grinder, which quill, and what stands around the wheel. */
export function MachinePart() {
  const { shop, may } = useShop();
  const { values, setInput, setInputs, plan, lathes, grinders } = usePlanner();
  const { machine } = values.inputs;
  const grinder = grinders.find(({ id }) => id === machine.grinderId);
  const add = (kind: 'lathes' | 'grinders', label: string) =>
    may('machine:edit') ? (
      <ButtonLink
        label={label}
        icon="add"
        href={
          kind === 'lathes'
            ? { pathname: '/shops/[shopId]/machines/lathes/new', params: { shopId: shop.id } }
            : { pathname: '/shops/[shopId]/machines/grinders/new', params: { shopId: shop.id } }
        }
      />
    ) : null;
  return (
    <Stack>
      <Select
        name="machine.latheId"
        label="Lathe"
        empty="Choose a lathe"
        options={lathes.map(({ id, name, data }) => ({
          value: id,
          label: name,
          detail: `${data.spindleSpeedsRpm.length} speeds, dial reads ${data.crossSlideReads}`,
        }))}
        value={machine.latheId}
        onChange={(next) => setInput('machine.latheId', next)}
        footer={add('lathes', 'Add a lathe')}
      />
      <Select
        name="machine.grinderId"
        label="Tool-post grinder"
        empty="Choose a grinder"
        options={grinders.map(({ id, name, data }) => ({
          value: id,
          label: name,
          detail: `${data.beltSteps.length} belt steps, ${data.motorNoLoadRpm} rpm motor`,
        }))}
        value={machine.grinderId}
        onChange={(next) =>
          setInputs({
            ...values.inputs,
            machine: {
              ...machine,
              grinderId: next,
              ...(next === machine.grinderId ? {} : { quillId: null, beltStepId: null }),
            },
          })
        }
        footer={add('grinders', 'Add a grinder')}
      />
      {grinder ? (
        <Select
          name="machine.quillId"
          label="Quill or arbor"
          empty="Choose a quill or an arbor"
          options={grinder.quills.map(({ id, name, data }) => ({
            value: id,
            label: name,
            detail: quillWords(data, values.units),
          }))}
          value={machine.quillId}
          onChange={(next) => setInput('machine.quillId', next)}
        />
      ) : (
        <Small>Quills and belt steps come with the grinder.</Small>
      )}
      <Checkbox
        name="machine.shieldFitted"
        label="A fixed shield stands around the open wheel"
        hint={
          kindOf(values.inputs) === 'outside'
            ? 'A shield does not take the place of the grinder’s own guard.'
            : 'Signed for before the wheel starts; the wheel starts and stops behind it.'
        }
        checked={machine.shieldFitted}
        onChange={(next) => setInput('machine.shieldFitted', next)}
      />
      <Fold label="Directions" value={plan.work.rotation.note}>
        <Segmented
          name="machine.workRotation"
          label="The work turns, seen from the tailstock"
          options={[
            { value: 'anticlockwise', label: 'anticlockwise' },
            { value: 'clockwise', label: 'clockwise' },
          ]}
          value={machine.workRotation ?? plan.work.rotation.work}
          onChange={(next) => setInput('machine.workRotation', next)}
        />
      </Fold>
      <CentreHeight />
      <SetupPictureFold />
      <Fold label="Quill" value="stiffness and bending">
        <List label="Quill figures">
          <FigureRow label="Stiffness of the quill" figure={plan.quill.stiffness} />
          <FigureRow label="Stiffness at the wheel" figure={plan.quill.stiffnessAtWheel} />
          <FigureRow label="First bending frequency" figure={plan.quill.firstFrequency} />
          <FigureRow label="Taper that its bend leaves" figure={plan.quill.taper} />
        </List>
      </Fold>
    </Stack>
  );
}

function quillWords({ segments, material }: QuillData, units: UnitSystem): string {
  const sizes = segments.map(({ diameterMm, lengthMm }) =>
    [
      formatQuantity({ value: diameterMm, unit: 'mm' }, units, { withUnit: false }),
      formatQuantity({ value: lengthMm, unit: 'mm' }, units),
    ].join(' × '),
  );
  return `${material}, ${sizes.join(' then ')}`;
}
