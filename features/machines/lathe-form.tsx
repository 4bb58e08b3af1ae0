import { useQueryClient } from '@tanstack/react-query';
import { useRouter, type Href } from 'expo-router';
import { useState } from 'react';

import { RecordForm } from '@/features/records';
import { useShop } from '@/features/session';
import { lathe as latheContract, type Lathe } from '@/shared/contracts/machines';
import type { UnitSystem } from '@/shared/domain/people';

import { LatheFields } from './components/lathe-fields';
import { isLatheValues, latheInUnits, latheRequest, latheSchema } from './lathe-values';
import { latheValuesOf, newLathe, type LatheValues } from './lathe-values';
import { latheParts } from './parts';
import { machineQueries, useSaveLathe } from './queries';

/** Adds a lathe, or edits one; null is a new one. */
export function LatheForm({ lathe, backTo }: { lathe: Lathe | null; backTo: Href }) {
  const { shop, units } = useShop();
  const router = useRouter();
  const client = useQueryClient();
  const save = useSaveLathe(shop.id);
  const [fresh] = useState(() => newLathe(units));
  const start = lathe
    ? { values: latheValuesOf(lathe, units), version: lathe.version }
    : { values: fresh, version: null };
  return (
    <RecordForm<LatheValues, Lathe>
      title={lathe ? lathe.name : 'Add a lathe'}
      backTo={backTo}
      noun="lathe"
      subject={`lathe:${lathe?.id ?? 'new'}`}
      start={start}
      isValues={isLatheValues}
      schema={latheSchema}
      inUnits={latheInUnits}
      parts={() => latheParts}
      save={(values, version) => {
        const { id, ...body } = latheRequest(values);
        return save.mutateAsync({
          id,
          body: version === null ? { id, ...body } : { version, ...body },
        });
      }}
      stored={storedLathe}
      fetchCurrent={async (id) => {
        const { items } = await client.fetchQuery({
          ...machineQueries.lathes(shop.id),
          staleTime: 0,
        });
        return items.find((item) => item.id === id);
      }}
      onSaved={() => router.dismissTo(backTo)}
    >
      {() => <LatheFields />}
    </RecordForm>
  );
}

function storedLathe(current: unknown, units: UnitSystem) {
  const { success, data } = latheContract.safeParse(current);
  return success ? { values: latheValuesOf(data, units), version: data.version } : null;
}
