import { problemWords, useEndSession } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Notice } from '@/features/ui/notice';
import { Table } from '@/features/ui/table';
import { Body } from '@/features/ui/text';
import type { Setup } from '@/shared/contracts/setups';

import { differences } from '../differences';
import { inUnits, valuesOf, type SetupValues } from '../form';
import type { SaveState } from '../use-autosave';

interface SaveProblemProps {
  state: SaveState;
  values: SetupValues;
  onRetry: () => void;
  onResolve: (theirs: Setup, keep: 'mine' | 'theirs') => void;
}

/** Why the draft is not with the server, and the way on. What was typed stands on the page all the while. */
export function SaveProblem({ state, values, onRetry, onResolve }: SaveProblemProps) {
  const signIn = useEndSession();
  if (state.kind === 'failed') {
    const signedOut =
      state.problem.kind === 'refused' && state.problem.details.code === 'unauthenticated';
    return (
      <Notice
        kind="error"
        action={
          signedOut ? (
            <Button label="Sign in" onPress={signIn} />
          ) : (
            <Button label="Try again" onPress={onRetry} />
          )
        }
      >
        {signedOut
          ? 'You are signed out. What you typed is kept on this device; sign in and it is saved.'
          : problemWords(state.problem)}
      </Notice>
    );
  }
  if (state.kind !== 'conflict') return null;
  const { theirs } = state;
  return (
    <Stack gap={2}>
      <Notice kind="error">
        {`${theirs.updatedBy.name} changed this setup while you were typing. Both versions:`}
      </Notice>
      <Table
        caption="What differs"
        columns={[
          { id: 'field', label: 'Field', cell: (row) => row.label },
          { id: 'mine', label: 'Yours', cell: (row) => row.mine, numeric: true },
          { id: 'theirs', label: 'Theirs', cell: (row) => row.theirs, numeric: true },
        ]}
        rows={differences(values, inUnits(valuesOf(theirs), values.units))}
        rowKey={(row) => row.path}
      />
      <Body>Whichever you choose, the other stays in the shop’s audit record.</Body>
      <Button label="Keep mine" onPress={() => onResolve(theirs, 'mine')} />
      <Button label="Take theirs" onPress={() => onResolve(theirs, 'theirs')} />
    </Stack>
  );
}
