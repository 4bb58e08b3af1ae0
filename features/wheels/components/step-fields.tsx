import { useFormikContext } from 'formik';

import { TextField } from '@/features/forms';
import { ChoiceField, EntryField, typedEntry } from '@/features/records';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { RadioRows } from '@/features/ui/radio-row';
import { Body, Small, Strong } from '@/features/ui/text';
import type { WheelLife } from '@/shared/contracts/wheel-entries';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { LOOK_RESULTS, RING_RESULTS } from '@/shared/domain/wheels';
import { diameterAfterDressing } from '@/shared/rules/wheel-life';
import { formatQuantity } from '@/shared/units/format';

import { entryWords } from '../entry-words';
import { spindleLimitWords, stepsWords } from '../spindle-words';
import { STEP_FIELDS, type FormKind, type StepField, type StepValues } from '../step-form';
import { LOOK_WORDS, RING_WORDS } from '../words';
import { RingHowTo } from './ring-how-to';

interface StepFieldsProps {
  kind: FormKind;
  life: WheelLife;
  /** What a signature or a correction is about. */
  entryId: string | null;
}

function Quantity({ name, required }: { name: StepField; required?: boolean }) {
  const { values } = useFormikContext<StepValues>();
  return (
    <EntryField name={name} spec={STEP_FIELDS[name]} units={values.units} required={required} />
  );
}

/** What one step asks for. */
export function StepFields({ kind, life, entryId }: StepFieldsProps) {
  switch (kind) {
    case 'inspected':
      return (
        <>
          <Body>
            Clean and dry the wheel. Turn it in good light and look for cracks, chips and stains, at
            the rim, the faces and the hole.
          </Body>
          <ChoiceField
            name="look"
            label="What the close look showed"
            as="rows"
            options={LOOK_RESULTS.map((value) => ({ value, label: LOOK_WORDS[value] }))}
          />
          <Quantity name="diameterMm" />
        </>
      );
    case 'ring test':
      return (
        <>
          <RingHowTo wheel={life.wheel.data} />
          <ChoiceField
            name="ring"
            label="How it rang"
            as="rows"
            options={RING_RESULTS.map((value) => ({ value, label: RING_WORDS[value] }))}
          />
        </>
      );
    case 'mounted':
      return <MountFields life={life} />;
    case 'trial run':
      return <TrialFields life={life} />;
    case 'dressed':
      return <DressFields life={life} />;
    case 'used':
      return (
        <>
          <Quantity name="usedMinutes" />
          <Quantity name="diameterMm" />
        </>
      );
    case 'taken off':
      return (
        <Body>
          Off the spindle it needs a close look and a ring test again before the next mounting.
        </Body>
      );
    case 'returned':
      return (
        <Body>
          It was set aside. You answer for it that what was against it is put right, and that
          somebody has looked at it closely since.
        </Body>
      );
    case 'scrapped':
      return (
        <>
          <Body>A scrapped wheel never runs again. Break it, so that nobody mounts it.</Body>
          <Reason hint="Why it is done with: worn to the smallest diameter, cracked, expired." />
        </>
      );
    case 'countersigned':
      return <EntryShown life={life} entryId={entryId} />;
    case 'correction':
      return (
        <>
          <EntryShown life={life} entryId={entryId} />
          <Body>
            It stays in the record, struck through, and no longer counts. Record the step again as
            it was, if there was one.
          </Body>
          <Reason hint="What was wrong with it: mistyped, another wheel, did not happen." />
        </>
      );
  }
}

const Reason = ({ hint }: { hint: string }) => (
  <TextField
    name="reason"
    label="Reason"
    hint={hint}
    lines={2}
    maxLength={TEXT_LIMITS.note}
    required
  />
);

function EntryShown({ life, entryId }: Pick<StepFieldsProps, 'life' | 'entryId'>) {
  const { units } = useShop();
  const entry = life.entries.items.find(({ id }) => id === entryId);
  if (!entry) return null;
  const reader = { units, spindles: life.spindles, entries: life.entries.items };
  return (
    <Stack gap={1}>
      <Strong>{entryWords(entry.step, reader)}</Strong>
      <Small>{`No.\u00a0${entry.number}, written by ${entry.person.name}`}</Small>
    </Stack>
  );
}

function MountFields({ life }: { life: WheelLife }) {
  const { units } = useShop();
  return (
    <>
      <Body>
        The wheel slides on freely, never forced. Flanges alike, blotters new, where it has them.
      </Body>
      {life.spindles.length === 0 ? (
        <Small tone="stop">
          The shop has no grinder with a quill or an arbor on record. Add one under Shop, Machines.
        </Small>
      ) : null}
      <ChoiceField
        name="quillId"
        label="Where it is mounted"
        as="rows"
        options={life.spindles.map((spindle) => ({
          value: spindle.quillId,
          label: `${spindle.quillName}, ${spindle.grinderName}`,
          detail: `${spindleLimitWords(spindle, units)}; ${stepsWords(spindle, units)}`,
          ...(spindle.refusal ? { lockedBecause: spindle.refusal.words } : {}),
        }))}
      />
    </>
  );
}

function TrialFields({ life }: { life: WheelLife }) {
  const { shop, units } = useShop();
  const { values, setFieldValue } = useFormikContext<StepValues>();
  const { trialRunMinutes, dailyTrialRunMinutes } = shop.rules;
  const spindle = life.spindles.find(({ quillId }) => quillId === life.standing.onSpindle?.quillId);
  const rpm = (value: number) =>
    formatQuantity({ value, unit: 'rpm' }, 'mm', { rounding: 'up', withUnit: false }).replaceAll(
      '\u00a0',
      '',
    );
  const chosen = spindle?.steps.find((step) => rpm(step.rpm) === values.spindleRpm.text);
  return (
    <>
      <Body>
        {`Guard closed, everybody out of the plane of the wheel. ${trialRunMinutes} min after a change of wheel, ${dailyTrialRunMinutes} min each day.`}
      </Body>
      <Quantity name="minutes" required />
      {spindle ? (
        <RadioRows
          name="beltStep"
          label="Belt step"
          hint="Puts its speed into the field below."
          value={chosen?.id ?? null}
          onChange={(id) => {
            const step = spindle.steps.find((one) => one.id === id);
            if (step)
              void setFieldValue(
                'spindleRpm',
                typedEntry(rpm(step.rpm), STEP_FIELDS.spindleRpm, units),
              );
          }}
          options={spindle.steps.map((step) => ({
            value: step.id,
            label: `${step.name}, ${formatQuantity({ value: step.rpm, unit: 'rpm' }, units)}`,
            detail: formatQuantity({ value: step.wheelSpeedMPerS, unit: 'm/s' }, units),
            ...(step.allowed
              ? {}
              : { lockedBecause: `Locked out: ${spindleLimitWords(spindle, units)}` }),
          }))}
        />
      ) : null}
      <Quantity name="spindleRpm" required />
    </>
  );
}

function DressFields({ life }: { life: WheelLife }) {
  const { units } = useShop();
  const { values } = useFormikContext<StepValues>();
  const { diameterNowMm, smallestUsableMm } = life.wheel.data;
  const [depthMm, passes] = [values.depthMm.si, values.passes.si];
  const size = (value: number) => formatQuantity({ value, unit: 'mm' }, units);
  const leaves =
    depthMm === null || passes === null
      ? `It is ${size(diameterNowMm)} now.`
      : `${size(diameterNowMm)} now; this leaves ${size(diameterAfterDressing(diameterNowMm, { depthMm, passes }))}.`;
  return (
    <>
      <Quantity name="depthMm" required />
      <Quantity name="passes" required />
      <Strong>
        {smallestUsableMm === null
          ? leaves
          : `${leaves} Smallest usable: ${size(smallestUsableMm)}.`}
      </Strong>
    </>
  );
}
