import { readDraft, draftKey } from '@/features/forms';
import { FindingList, MarkingFold } from '@/features/plan';
import { Facts } from '@/features/records';
import { useShop } from '@/features/session';
import { Row, Stack } from '@/features/ui/card';
import { ButtonLink } from '@/features/ui/link';
import { Notice } from '@/features/ui/notice';
import type { Wheel } from '@/shared/contracts/wheels';

import { isWheelValues, speedUnitOf, valuesOf } from '../form';
import { wheelParts } from '../parts';
import { standingOf, wheelFindingsOn } from '../standing';
import { Nameplate } from './nameplate';
import { SetAside } from './set-aside';
import { WhereItMayRun } from './where-it-may-run';

interface WheelDetailProps {
  wheel: Wheel;
  /** ISO date of the shop. */
  today: string;
}

/** One wheel to be read: its plate, what stands against it, and every fact. Stands in a PlanReader. */
export function WheelDetail({ wheel, today }: WheelDetailProps) {
  const { shop, person, units, may } = useShop();
  const mayEdit = may('wheel:edit');
  const draft =
    mayEdit && readDraft(draftKey(person.personId, shop.id, `wheel:${wheel.id}`), isWheelValues);
  const shown = new Set(['tag', 'marking', 'markingReadOn', 'markedRpm', 'markedSpeedMPerS']);
  const edit = (label: string) => (
    <ButtonLink
      label={label}
      icon="edit"
      href={{
        pathname: '/shops/[shopId]/wheels/[wheelId]',
        params: { shopId: shop.id, wheelId: wheel.id, edit: 'yes' },
      }}
    />
  );
  return (
    <Stack>
      <Nameplate
        tag={wheel.tag}
        wheel={wheel.data}
        speedUnit={speedUnitOf(wheel.typed, units)}
        units={units}
      />
      {draft ? (
        <Notice action={edit('Go on with them')}>
          Changes to this wheel are kept on this device and not saved yet.
        </Notice>
      ) : null}
      <FindingList findings={wheelFindingsOn(wheel.data, today)} sourced />
      <Row>
        {mayEdit ? edit('Edit') : null}
        {may('wheel:set-aside') ? <SetAside shopId={shop.id} wheel={wheel} today={today} /> : null}
      </Row>
      {standingOf(wheel.data, today).usable ? (
        <WhereItMayRun wheel={wheel.data} today={today} />
      ) : null}
      <MarkingFold marking={wheel.data.marking} />
      <Facts
        label={`Facts of ${wheel.tag}`}
        parts={wheelParts.filter(({ key }) => !shown.has(key))}
        values={valuesOf(wheel, units)}
      />
    </Stack>
  );
}
