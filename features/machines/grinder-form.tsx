import { useQueryClient } from '@tanstack/react-query';
import { useRouter, type Href } from 'expo-router';
import { useState } from 'react';

import { PlanReader } from '@/features/plan';
import { RecordForm } from '@/features/records';
import { useShop } from '@/features/session';
import { grinder as grinderContract, type Grinder } from '@/shared/contracts/machines';
import type { UnitSystem } from '@/shared/domain/people';

import { GrinderFields } from './components/grinder-fields';
import { QuillRows } from './components/quill-rows';
import { StepRows } from './components/step-rows';
import { grinderSchema } from './grinder-schema';
import { grinderInUnits, grinderRequest, grinderValuesOf, newGrinder } from './grinder-values';
import { isGrinderValues, type GrinderValues } from './grinder-values';
import { grinderParts } from './parts';
import { machineQueries, useSaveGrinder } from './queries';

/** Adds a grinder with its belt steps and quills, or edits one; null is a new one. */
export function GrinderForm({ grinder, backTo }: { grinder: Grinder | null; backTo: Href }) {
  const { shop, units } = useShop();
  const router = useRouter();
  const client = useQueryClient();
  const save = useSaveGrinder(shop.id);
  const [fresh] = useState(() => newGrinder(units));
  const start = grinder
    ? { values: grinderValuesOf(grinder, units), version: grinder.version }
    : { values: fresh, version: null };
  return (
    <PlanReader units={units}>
      <RecordForm<GrinderValues, Grinder>
        title={grinder ? grinder.name : 'Add a grinder'}
        backTo={backTo}
        noun="grinder"
        subject={`grinder:${grinder?.id ?? 'new'}`}
        start={start}
        isValues={isGrinderValues}
        schema={grinderSchema}
        inUnits={grinderInUnits}
        parts={grinderParts}
        save={(values, version) => {
          const { id, ...body } = grinderRequest(values);
          return save.mutateAsync({
            id,
            body: version === null ? { id, ...body } : { version, ...body },
          });
        }}
        stored={storedGrinder}
        fetchCurrent={async (id) => {
          const { items } = await client.fetchQuery({
            ...machineQueries.grinders(shop.id),
            staleTime: 0,
          });
          return items.find((item) => item.id === id);
        }}
        onSaved={() => router.dismissTo(backTo)}
      >
        {() => (
          <>
            <GrinderFields />
            <StepRows />
            <QuillRows />
          </>
        )}
      </RecordForm>
    </PlanReader>
  );
}

function storedGrinder(current: unknown, units: UnitSystem) {
  const { success, data } = grinderContract.safeParse(current);
  return success ? { values: grinderValuesOf(data, units), version: data.version } : null;
}
