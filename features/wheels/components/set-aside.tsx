import { useState } from 'react';

import { FormProblem } from '@/features/forms';
import { newId } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Field } from '@/features/ui/field';
import { Sheet } from '@/features/ui/sheet';
import { Body } from '@/features/ui/text';
import type { Wheel } from '@/shared/contracts/wheels';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { useRecordEntry } from '../queries';

const MISSING = 'Enter why: what was seen or heard, in a few words.';

interface SetAsideProps {
  shopId: string;
  wheel: Wheel;
  /** ISO date of the shop. */
  today: string;
}

/** Anybody may set a wheel aside; it then stops every setup that uses it. */
export function SetAside({ shopId, wheel, today }: SetAsideProps) {
  const save = useRecordEntry(shopId, wheel.id);
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState('');
  const [error, setError] = useState<string>();
  const { state } = wheel.data;
  if (state === 'set aside' || state === 'scrapped') return null;

  const setAside = () => {
    const why = reason.trim();
    if (!why) {
      setError(MISSING);
      return;
    }
    setError(undefined);
    save.mutate(
      {
        id: newId(),
        version: null,
        happenedOn: today,
        note: null,
        step: { kind: 'set aside', reason: why },
      },
      { onSuccess: () => setOpen(false) },
    );
  };

  return (
    <>
      <Button kind="danger" label="Set aside" onPress={() => setOpen(true)} />
      <Sheet
        open={open}
        onClose={() => setOpen(false)}
        title={`Set ${wheel.tag} aside`}
        shape="box"
        footer={
          <Button
            kind="dangerFilled"
            wide
            label="Set aside"
            busy={save.isPending}
            onPress={setAside}
          />
        }
      >
        <Body>
          Every setup that uses this wheel stops at once. Only a lead returns it to the rack.
        </Body>
        <FormProblem error={save.error} />
        <Field
          name="setAsideReason"
          label="Reason"
          hint="Shown wherever the wheel is: chipped edge, dull ring, fell on the floor."
          value={reason}
          onChangeText={setReason}
          error={error}
          lines={3}
          maxLength={TEXT_LIMITS.note}
          required
        />
      </Sheet>
    </>
  );
}
