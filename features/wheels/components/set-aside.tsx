import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';

import { FormProblem } from '@/features/forms';
import { shopDay } from '@/features/records';
import { useShop } from '@/features/session';
import { newId } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Field } from '@/features/ui/field';
import { Fold } from '@/features/ui/fold';
import { Notice } from '@/features/ui/notice';
import { Sheet } from '@/features/ui/sheet';
import { Body } from '@/features/ui/text';
import type { Wheel } from '@/shared/contracts/wheels';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { useRecordEntry, wheelQueries } from '../queries';
import { stoppedWords } from '../setup-words';
import { reasonOf } from '../step-form';

/** What wheels are most often set aside for; each is one press. */
const COMMON_REASONS = [
  'Cracked or chipped',
  'Dull ring',
  'Dropped or knocked',
  'Shakes when it runs',
  'Marking cannot be read',
] as const;

const MISSING = 'Enter why: what was seen or heard, in a few words.';

/** Anybody may set a wheel aside, in two presses; it then stops every setup that uses it. */
export function SetAside({ wheel }: { wheel: Wheel }) {
  const { may } = useShop();
  const [open, setOpen] = useState(false);
  const { state } = wheel.data;
  const isOut = state === 'set aside' || state === 'scrapped';
  if (!may('wheel:set-aside') || (isOut && !open)) return null;
  return (
    <>
      {isOut ? null : (
        <Button
          kind="danger"
          label="Set aside"
          spoken={`Set ${wheel.tag} aside`}
          onPress={() => setOpen(true)}
        />
      )}
      {open ? <SetAsideSheet wheel={wheel} onClose={() => setOpen(false)} /> : null}
    </>
  );
}

/** Asks why, and says what came of it. */
export function SetAsideSheet({ wheel, onClose }: { wheel: Wheel; onClose: () => void }) {
  const { shop } = useShop();
  const save = useRecordEntry(shop.id, wheel.id);
  const [id] = useState(newId);
  const [typed, setTyped] = useState('');
  const [error, setError] = useState<string>();
  const setAside = (reason: string) => {
    if (!reasonOf(reason)) {
      setError(MISSING);
      return;
    }
    setError(undefined);
    save.mutate({
      id,
      version: null,
      happenedOn: shopDay(shop.timeZone),
      note: null,
      step: { kind: 'set aside', reason: reasonOf(reason) },
    });
  };
  if (save.isSuccess) return <Done wheel={save.data.wheel} onClose={onClose} />;
  return (
    <Sheet open onClose={onClose} title={`Set ${wheel.tag} aside: why?`} shape="box">
      <Body>
        Every setup that uses this wheel stops at once. Only a lead returns it to the rack.
      </Body>
      <FormProblem error={save.error} />
      <Stack gap={2}>
        {COMMON_REASONS.map((reason) => (
          <Button
            key={reason}
            kind="danger"
            size="machine"
            wide
            label={reason}
            busy={
              save.isPending &&
              save.variables.step.kind === 'set aside' &&
              save.variables.step.reason === reason
            }
            disabled={save.isPending}
            onPress={() => setAside(reason)}
          />
        ))}
      </Stack>
      <Fold label="Another reason">
        <Field
          name="setAsideReason"
          label="Reason"
          hint="Shown wherever the wheel is."
          value={typed}
          onChangeText={setTyped}
          error={error}
          lines={3}
          maxLength={TEXT_LIMITS.note}
          required
        />
        <Button
          kind="dangerFilled"
          wide
          label="Set aside"
          busy={save.isPending}
          onPress={() => setAside(typed)}
        />
      </Fold>
    </Sheet>
  );
}

/** What came of it, counted anew by the server. */
function Done({ wheel, onClose }: { wheel: Wheel; onClose: () => void }) {
  const { shop } = useShop();
  const { data } = useQuery(wheelQueries.life(shop.id, wheel.id));
  const reason = wheel.data.setAsideReason ?? '';
  const setups = data?.wheel.data.state === 'set aside' ? data.setups : null;
  return (
    <Sheet
      open
      onClose={onClose}
      title={`${wheel.tag} is set aside`}
      shape="box"
      footer={<Button kind="primary" wide label="Done" onPress={onClose} />}
    >
      <Notice kind="done">
        {`${reason}. ${setups ? stoppedWords(setups) : 'Every setup that uses it stops.'}`}
      </Notice>
      <Body>
        Put it where nobody takes it by mistake, and hang the reason on it. A lead returns it after
        a fresh close look.
      </Body>
    </Sheet>
  );
}
