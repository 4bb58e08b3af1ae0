import { useState } from 'react';

import { FormProblem } from '@/features/forms';
import { useShop } from '@/features/session';
import { isRefusal, newId } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Sheet } from '@/features/ui/sheet';
import { Body } from '@/features/ui/text';
import type { SetupSummary } from '@/shared/contracts/setups';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { useDuplicateSetup, useRetireSetup } from '../queries';

interface SetupListMenuProps {
  setup: SetupSummary;
  onClose: () => void;
}

const copyName = (name: string) => {
  const suffix = ', copy';
  return `${name.slice(0, TEXT_LIMITS.name - suffix.length)}${suffix}`;
};

/** What can be done with a setup from the list. */
export function SetupListMenu({ setup, onClose }: SetupListMenuProps) {
  const { shop } = useShop();
  const duplicate = useDuplicateSetup(shop.id);
  const retire = useRetireSetup(shop.id);
  const [copyId] = useState(newId);
  const [sure, setSure] = useState(false);
  const retired = setup.state === 'retired';
  const { id, version } = setup;
  return (
    <Sheet open onClose={onClose} title={setup.name} shape="box">
      <Stack>
        <FormProblem error={duplicate.error} />
        {isRefusal(retire.error, 'stale-version') ? (
          <Body>Somebody edited this setup in the meantime. Close this and look at it first.</Body>
        ) : (
          <FormProblem error={retire.error} />
        )}
        <Button
          label="Make a copy"
          icon="copy"
          wide
          busy={duplicate.isPending}
          onPress={() =>
            duplicate.mutate(
              { from: id, body: { id: copyId, name: copyName(setup.name) } },
              { onSuccess: onClose },
            )
          }
        />
        {retired ? null : sure ? (
          <>
            <Body>
              A retired setup stays readable and cannot be edited or run again. A copy of it can.
            </Body>
            <Button
              kind="dangerFilled"
              label="Retire it"
              wide
              busy={retire.isPending}
              onPress={() => retire.mutate({ id, version }, { onSuccess: onClose })}
            />
          </>
        ) : (
          <Button kind="danger" label="Retire" wide onPress={() => setSure(true)} />
        )}
      </Stack>
    </Sheet>
  );
}
