import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';

import { draftKey, readDraft, type LocalDraft } from '@/features/forms';
import { useShop } from '@/features/session';
import { isRefusal, problemOf, problemWords } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { Notice } from '@/features/ui/notice';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import type { Setup } from '@/shared/contracts/setups';
import { OPERATIONS } from '@/shared/domain/setups';

import { completeValues, isSetupValues, newValues, valuesOf, type SetupValues } from './form';
import { Planner, type PlannerStart } from './planner';
import { setupQueries } from './queries';

/**
 * One setup by its address. What was typed and not sent comes back from the device; `?operation=` starts a new one
 * under the address's id.
 */
export function SetupScreen() {
  const { setupId, operation: asked } = useLocalSearchParams<{
    setupId: string;
    operation?: string;
  }>();
  const { shop, person, units } = useShop();
  const key = draftKey(person.personId, shop.id, `setup:${setupId}`);
  const [draft] = useState(() => {
    const kept = readDraft(key, isSetupValues);
    return kept && { ...kept, values: completeValues(kept.values) };
  });
  const setup = useQuery({
    ...setupQueries.detail(shop.id, setupId),
    // An open form is never replaced under the hands that type in it.
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
  const operation = OPERATIONS.find((known) => known === asked);
  const backTo = { pathname: '/shops/[shopId]/setups', params: { shopId: shop.id } } as const;

  if (setup.data) return <Opened setupId={setupId} start={startOf(setup.data, draft)} />;
  if (setup.isPending)
    return (
      <Screen title="Setup" backTo={backTo}>
        <Skeleton label="Loading the setup" lines={8} />
      </Screen>
    );
  const unknown = isRefusal(setup.error, 'not-found');
  const offline = problemOf(setup.error).kind !== 'refused';
  if (draft && (offline || draft.version === null))
    return <Opened setupId={setupId} start={keptStart(draft)} />;
  if (operation && (unknown || offline))
    return (
      <Opened
        setupId={setupId}
        start={keptStart({ values: newValues(operation, units), version: null })}
      />
    );
  return (
    <Screen title="Setup" backTo={backTo}>
      {unknown ? (
        <EmptyState
          title="There is no setup at this address"
          action={<ButtonLink label="To the setups" href={backTo} />}
        >
          It may belong to another shop, or the address may be mistyped.
        </EmptyState>
      ) : (
        <Notice
          kind="error"
          action={<Button label="Try again" onPress={() => void setup.refetch()} />}
        >
          {problemWords(problemOf(setup.error))}
        </Notice>
      )}
    </Screen>
  );
}

/** Holds the start still: later answers of the server do not reset what is being typed. */
function Opened({ setupId, start }: { setupId: string; start: PlannerStart }) {
  const [first] = useState(start);
  return <Planner key={setupId} setupId={setupId} start={first} />;
}

const keptStart = ({ values, version }: LocalDraft<SetupValues>): PlannerStart => ({
  values,
  version,
  savedAt: null,
  unsent: true,
  theirs: null,
});

function startOf(setup: Setup, draft: LocalDraft<SetupValues> | null): PlannerStart {
  const stored = { version: setup.version, savedAt: setup.updatedAt };
  if (!draft) return { ...stored, values: valuesOf(setup), unsent: false, theirs: null };
  // A first save whose answer was lost left version 1 behind the draft's back.
  const sameBase =
    draft.version === setup.version || (draft.version === null && setup.version === 1);
  return { ...stored, values: draft.values, unsent: true, theirs: sameBase ? null : setup };
}
