import { FormProblem } from '@/features/forms';
import { useShop, useSignOut } from '@/features/session';
import { Button } from '@/features/ui/button';
import { Row, Stack } from '@/features/ui/card';
import { PaletteSwitch } from '@/features/ui/palette-switch';
import { Segmented } from '@/features/ui/segmented';
import { Body, Small } from '@/features/ui/text';
import { UNIT_SYSTEMS } from '@/shared/domain/people';

import { UNIT_WORDS } from '../form';
import { ROLE_WORDS } from '../words';

/** What each person chooses for themselves on this device. */
export function OwnSettings() {
  const { person, role, units, setUnits } = useShop();
  const signOut = useSignOut();
  return (
    <Stack>
      <Body>{`${person.name}, ${ROLE_WORDS[role].toLowerCase()}. ${person.email}`}</Body>
      <Segmented
        name="ownUnits"
        label="I read and type in"
        hint="Shows what is stored in other units, and changes none of it."
        value={units}
        onChange={setUnits}
        options={UNIT_SYSTEMS.map((value) => ({ value, label: UNIT_WORDS[value] }))}
      />
      <PaletteSwitch />
      <FormProblem error={signOut.error} />
      <Row>
        <Button label="Sign out" busy={signOut.isPending} onPress={() => signOut.mutate()} />
      </Row>
      <Small>
        What you typed and did not save stays on this device for when you sign in again.
      </Small>
    </Stack>
  );
}
