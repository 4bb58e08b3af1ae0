import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';

import { ReadingsSheet } from '@/features/surveys';
import { Button } from '@/features/ui/button';
import type { UnitSystem } from '@/shared/domain/people';
import { surfaceOf } from '@/shared/rules/surface';
import { formatQuantity } from '@/shared/units/format';

import type { QuantityPath } from '../fields';
import { usePlanner } from '../planner-context';

interface Plane {
  id: string;
  label: string;
  runOut: QuantityPath;
  highSpot: QuantityPath | null;
}

/** Run-out and high spot worked out from a list of indicator readings, put into the fields as if typed. */
export function FromReadings() {
  const { setupId } = useLocalSearchParams<{ setupId: string }>();
  const { values, setTexts } = usePlanner();
  const [open, setOpen] = useState(false);
  const { operation, work } = values.inputs;
  const jaws = operation === 'jaws';
  const planes: Plane[] = jaws
    ? [
        {
          id: 'near',
          label: placed('Near', work.nearDistanceMm, values.units),
          runOut: 'work.nearRunOutMm',
          highSpot: 'work.nearHighSpotDeg',
        },
        {
          id: 'far',
          label: placed('Far', work.farDistanceMm, values.units),
          runOut: 'work.farRunOutMm',
          highSpot: 'work.farHighSpotDeg',
        },
      ]
    : [{ id: 'worst', label: 'Worst', runOut: 'work.runOutMm', highSpot: null }];
  return (
    <>
      <Button
        label="From indicator readings"
        kind="quiet"
        icon="working"
        onPress={() => setOpen(true)}
      />
      <ReadingsSheet
        key={operation}
        open={open}
        onClose={() => setOpen(false)}
        planes={planes}
        // Jaws are read on a bar that they grip, or on a ring: from outside.
        side={jaws ? 'outside' : surfaceOf(values.inputs).side}
        counting={
          jaws
            ? 'Angles count from jaw 1, the way jaws are numbered.'
            : 'Take them where the run-out is worst.'
        }
        uses={jaws ? 'offset' : 'whole swing'}
        keptAs={`readings:${setupId}:${jaws ? 'jaws' : 'round'}`}
        onUse={({ plane, runOut, highSpot }) => {
          const target = planes.find(({ id }) => id === plane);
          if (!target) return;
          setTexts([
            [target.runOut, runOut],
            ...(target.highSpot ? [[target.highSpot, highSpot] as const] : []),
          ]);
        }}
      />
    </>
  );
}

const placed = (name: string, distanceMm: number | null, units: UnitSystem) =>
  distanceMm === null
    ? name
    : `${name}, at ${formatQuantity({ value: distanceMm, unit: 'mm' }, units)}`;
