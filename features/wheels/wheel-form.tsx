import { useQueryClient } from '@tanstack/react-query';
import { useRouter, type Href } from 'expo-router';
import { useState } from 'react';

import { FindingList, PlanReader } from '@/features/plan';
import { RecordForm, shopDay } from '@/features/records';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { useLayout } from '@/features/ui/use-layout';
import { wheel as wheelContract, type Wheel } from '@/shared/contracts/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import { markingFindings } from '@/shared/rules/wheel-checks';

import { FurtherFields } from './components/further-fields';
import { Nameplate } from './components/nameplate';
import { WhereItMayRun } from './components/where-it-may-run';
import { MarkingFields, SizeFields, SpeedFields } from './components/wheel-fields';
import { isWheelValues, newWheel, plateOf, valuesOf, wheelDataOf, type WheelValues } from './form';
import { inUnits, toRequest } from './form';
import { recordParts, wheelParts } from './parts';
import { wheelPlace } from './place';
import { wheelSchema } from './schema';
import { useSaveWheel, wheelQueries } from './queries';

interface WheelFormProps {
  /** Null for a new wheel. */
  wheel: Wheel | null;
  backTo: Href;
}

/** Adds a wheel, or edits one. */
export function WheelForm({ wheel, backTo }: WheelFormProps) {
  const { shop, units } = useShop();
  const { wide } = useLayout();
  const router = useRouter();
  const client = useQueryClient();
  const save = useSaveWheel(shop.id);
  const [fresh] = useState(() => newWheel(units));
  const start = wheel
    ? { values: valuesOf(wheel, units), version: wheel.version }
    : { values: fresh, version: null };
  return (
    <PlanReader units={units}>
      <RecordForm<WheelValues, Wheel>
        title={wheel ? `Edit ${wheel.tag}` : 'Add a wheel'}
        backTo={backTo}
        noun="wheel"
        subject={`wheel:${wheel?.id ?? 'new'}`}
        start={start}
        isValues={isWheelValues}
        schema={wheelSchema}
        inUnits={inUnits}
        parts={() => (wheel ? recordParts : wheelParts)}
        save={(values, version) => {
          const { id, received, ...body } = toRequest(values);
          return save.mutateAsync({
            id,
            body: version === null ? { id, received, ...body } : { version, ...body },
          });
        }}
        stored={storedWheel}
        fetchCurrent={(id) =>
          client.fetchQuery({ ...wheelQueries.detail(shop.id, id), staleTime: 0 })
        }
        onSaved={(saved) => router.dismissTo(wheelPlace(shop.id, saved.id, wide))}
        pane={(values) => <Plate values={values} />}
      >
        {(values) => (
          <>
            <MarkingFields />
            <SizeFields />
            <SpeedFields />
            <FurtherFields isNew={wheel === null} />
            {wide ? null : <MayRun values={values} />}
          </>
        )}
      </RecordForm>
    </PlanReader>
  );
}

function storedWheel(current: unknown, units: UnitSystem) {
  const { success, data } = wheelContract.safeParse(current);
  return success ? { values: valuesOf(data, units), version: data.version } : null;
}

/** The wheel's own label as it comes out of what is typed, and where such a wheel may run. */
function Plate({ values }: { values: WheelValues }) {
  const { wide } = useLayout();
  const plate = plateOf(values);
  const { diameterNewMm } = plate;
  return (
    <Stack>
      <Nameplate
        tag={values.tag.trim()}
        wheel={plate}
        speedUnit={values.speedUnit}
        units={values.units}
        typing
      />
      {diameterNewMm === null ? null : (
        <FindingList findings={markingFindings({ ...plate, diameterNewMm }, true)} />
      )}
      {wide ? <MayRun values={values} /> : null}
    </Stack>
  );
}

/** On a phone it stands under the fields: over them it would push them away from the hands that type. */
function MayRun({ values }: { values: WheelValues }) {
  const { shop } = useShop();
  const whole = wheelDataOf(values);
  return whole === null ? null : <WhereItMayRun wheel={whole} today={shopDay(shop.timeZone)} />;
}
