import { useQueryClient } from '@tanstack/react-query';
import { useRouter, type Href } from 'expo-router';
import { useState } from 'react';

import { FindingList, PlanReader } from '@/features/plan';
import { RecordForm } from '@/features/records';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { wheel as wheelContract, type Wheel } from '@/shared/contracts/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import { markingFindings } from '@/shared/rules/wheel-checks';

import { Nameplate } from './components/nameplate';
import { MarkingFields, SizeFields, StateFields } from './components/wheel-fields';
import { inUnits, isWheelValues, newWheel, toRequest, valuesOf, wheelSchema } from './form';
import type { WheelValues } from './form';
import { wheelParts } from './parts';
import { useSaveWheel, wheelQueries } from './queries';

interface WheelFormProps {
  /** Null for a new wheel. */
  wheel: Wheel | null;
  backTo: Href;
}

/** Adds a wheel, or edits one. */
export function WheelForm({ wheel, backTo }: WheelFormProps) {
  const { shop, units } = useShop();
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
        parts={() => wheelParts}
        save={(values, version) => {
          const { id, ...body } = toRequest(values);
          return save.mutateAsync({
            id,
            body: version === null ? { id, ...body } : { version, ...body },
          });
        }}
        stored={storedWheel}
        fetchCurrent={(id) =>
          client.fetchQuery({ ...wheelQueries.detail(shop.id, id), staleTime: 0 })
        }
        onSaved={() => router.dismissTo(backTo)}
        pane={(values) => <Plate values={values} />}
      >
        {() => (
          <>
            <MarkingFields />
            <SizeFields />
            <StateFields before={wheel?.data.state ?? null} />
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

/** The wheel's own label as it comes out of what is typed. */
function Plate({ values }: { values: WheelValues }) {
  const { isMounted, mounted } = values;
  const plate = {
    marking: values.marking.trim() || null,
    diameterNewMm: values.diameterNewMm.si,
    widthMm: values.widthMm.si,
    holeMm: values.holeMm.si,
    markedRpm: values.markedRpm.si,
    markedSpeedMPerS: values.markedSpeedMPerS.si,
    markingReadOn: values.markingReadOn === 'unknown' ? null : values.markingReadOn,
    mounted: isMounted
      ? {
          mandrelDiameterMm: mounted.mandrelDiameterMm.si ?? 0,
          overhangMm: mounted.overhangMm.si ?? 0,
          threaded: mounted.threaded,
          makerMaximumRpm: mounted.makerMaximumRpm.si,
        }
      : null,
  };
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
    </Stack>
  );
}
