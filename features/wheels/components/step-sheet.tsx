import { Formik, useFormikContext, type FormikHelpers } from 'formik';
import { useMemo, useState } from 'react';

import {
  draftKey,
  fieldErrorsOf,
  FormErrors,
  FormProblem,
  readDraft,
  removeDraft,
  TextField,
  useLocalDraft,
} from '@/features/forms';
import { DateField, FormFold, shopDay } from '@/features/records';
import { useShop } from '@/features/session';

import { isRefusal, newId } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { FieldScopeProvider } from '@/features/ui/field-ids';
import { Notice } from '@/features/ui/notice';
import { Sheet } from '@/features/ui/sheet';
import type { RecordedEntry, WheelLife } from '@/shared/contracts/wheel-entries';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import type { Signer } from '@/shared/domain/wheel-life';

import { useRecordEntry } from '../queries';
import {
  isBegun,
  isStepValues,
  newStep,
  STEP_FIELDS,
  stepInUnits,
  stepPath,
  stepSchema,
  toEntryRequest,
  toStep,
  type FormKind,
  type StepValues,
} from '../step-form';
import { STEP_LABELS } from '../words';
import { StepFields } from './step-fields';

interface StepSheetProps {
  life: WheelLife;
  kind: FormKind;
  /** What a signature or a correction is about. */
  entryId?: string | null;
  /** Whose signature it would wait for. */
  needs?: Signer | null;
  onClose: () => void;
  onRecorded: (recorded: RecordedEntry) => void;
}

const SEND_LABELS: Partial<Record<FormKind, string>> = {
  countersigned: 'I sign for this',
  correction: 'Take it back',
  'taken off': 'It is off',
  returned: 'Return it',
  scrapped: 'Scrap it',
};

const WAITS: Record<Signer, string> = {
  appointed:
    'It is work for an appointed person. Recorded by you it waits for such a person’s signature, and until then the wheel must not run.',
  skilled: 'It counts once a lead or a machinist has signed for it.',
};

/** The short form of one step. What is typed stays on the device until the server has it. */
export function StepSheet(props: StepSheetProps) {
  const { life, kind, entryId = null, needs = null, onClose, onRecorded } = props;
  const { shop, person, units } = useShop();
  const { wheel } = life;
  const key = draftKey(
    person.personId,
    shop.id,
    ['wheel-step', wheel.id, kind, entryId].filter(Boolean).join(':'),
  );
  const save = useRecordEntry(shop.id, wheel.id);
  const [initial] = useState(() =>
    stepInUnits(readDraft(key, isStepValues)?.values ?? newStep(units), units),
  );
  const send = async (values: StepValues, form: FormikHelpers<StepValues>): Promise<void> => {
    const step = toStep(kind, values, { entryId, spindles: life.spindles });
    const at = { version: wheel.version, today: shopDay(shop.timeZone) };
    try {
      const recorded = await save.mutateAsync(toEntryRequest(step, values, at));
      removeDraft(key);
      onRecorded(recorded);
    } catch (error) {
      const refused = fieldErrorsOf(error, stepPath(kind)) ?? {};
      form.setErrors(
        Object.fromEntries(Object.entries(refused).filter(([name]) => name in STEP_FIELDS)),
      );
      // What was sent under this id is stored: what is sent after this is another entry.
      if (isRefusal(error, 'id-reused')) void form.setFieldValue('id', newId());
    }
  };
  return (
    <FieldScopeProvider scope="step">
      <Formik<StepValues>
        initialValues={initial}
        validationSchema={stepSchema(kind, units)}
        validateOnChange={false}
        onSubmit={send}
      >
        {({ submitForm, isSubmitting }) => (
          <Sheet
            open
            onClose={onClose}
            title={`${STEP_LABELS[kind]}: ${wheel.tag}`}
            footer={
              <Button
                kind={kind === 'scrapped' ? 'dangerFilled' : 'primary'}
                size="machine"
                wide
                label={SEND_LABELS[kind] ?? 'Record it'}
                busy={isSubmitting}
                onPress={() => void submitForm()}
              />
            }
          >
            <KeptStep storageKey={key} stored={save.isSuccess} />
            <FormErrors />
            <StepProblem error={save.error} />
            {needs === null ? null : <Notice>{WAITS[needs]}</Notice>}
            <StepFields kind={kind} life={life} entryId={entryId} />
            {kind === 'countersigned' || kind === 'correction' ? null : <WhenFields />}
          </Sheet>
        )}
      </Formik>
    </FieldScopeProvider>
  );
}

/** Keeps the form on the device while something is typed in it. */
function KeptStep({ storageKey, stored }: { storageKey: string; stored: boolean }) {
  const { values } = useFormikContext<StepValues>();
  const draft = useMemo(() => ({ values, version: null }), [values]);
  useLocalDraft(storageKey, draft, isBegun(values) && !stored);
  return null;
}

function StepProblem({ error }: { error: unknown }) {
  if (isRefusal(error, 'stale-version'))
    return (
      <Notice kind="error">
        Somebody recorded another step of this wheel in the meantime. What you typed still stands
        here: look at the wheel behind this, and send it again if it still holds.
      </Notice>
    );
  if (isRefusal(error, 'id-reused'))
    return (
      <Notice kind="error">
        An earlier try of this was recorded, as it was typed then. It stands in the life of the
        wheel; correct it there where it is wrong.
      </Notice>
    );
  return <FormProblem error={error} />;
}

function WhenFields() {
  const { values } = useFormikContext<StepValues>();
  return (
    <FormFold
      label="Day, note"
      value={[values.happenedOn.trim() || 'today', values.note.trim() && 'with a note']
        .filter(Boolean)
        .join(', ')}
      names={['happenedOn', 'note']}
    >
      <DateField name="happenedOn" label="On which day" hint="Leave empty for today." />
      <TextField name="note" label="Note" lines={2} maxLength={TEXT_LIMITS.note} />
    </FormFold>
  );
}
