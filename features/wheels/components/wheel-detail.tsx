import { readDraft, draftKey } from '@/features/forms';
import { FindingList, MarkingFold } from '@/features/plan';
import { dayWords, Facts } from '@/features/records';
import { useShop } from '@/features/session';
import { Row, Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { ButtonLink } from '@/features/ui/link';
import { Notice } from '@/features/ui/notice';
import { Body } from '@/features/ui/text';
import type { WheelLife } from '@/shared/contracts/wheel-entries';
import type { Wheel } from '@/shared/contracts/wheels';

import { isWheelValues, speedUnitOf, valuesOf } from '../form';
import { wheelParts } from '../parts';
import { standingOn, wheelFindingsOn } from '../standing';
import { DUE_WORDS } from '../words';
import { Nameplate } from './nameplate';
import { StandingWords } from './standing-words';

interface WheelDetailProps {
  life: WheelLife;
  /** ISO date of the shop. */
  today: string;
}

/** The wheel's plate, where it stands, what is due, and the first thing against it. Stands in a PlanReader. */
export function WheelDetail({ life, today }: WheelDetailProps) {
  const { units } = useShop();
  const { wheel, spindles, standing } = life;
  const on = spindles.find(({ quillId }) => quillId === standing.onSpindle?.quillId);
  const spindle = on ? `${on.quillName}, ${on.grinderName}` : null;
  const [first, ...more] = wheelFindingsOn(wheel.data, today);
  return (
    <Stack gap={3}>
      <Nameplate
        tag={wheel.tag}
        wheel={wheel.data}
        speedUnit={speedUnitOf(wheel.typed, units)}
        units={units}
      />
      <StandingWords {...standingOn(wheel.data, today, spindle)} />
      {wheel.life.due ? <Body>{dueWords(wheel.life.due, today)}</Body> : null}
      {first ? <FindingList findings={[first]} sourced={more.length === 0} /> : null}
      {first && more.length > 0 ? (
        <Fold label="All that speaks of it" value={`${more.length + 1} findings`}>
          <FindingList findings={[first, ...more]} sourced />
        </Fold>
      ) : null}
    </Stack>
  );
}

/** "Ring test due since 16 Feb 2026", "Expires on 31 Mar 2027". */
function dueWords({ on, why }: NonNullable<Wheel['life']['due']>, today: string): string {
  const day = dayWords(on);
  if (why === 'expiry') return on < today ? `Expired on ${day}` : `Expires on ${day}`;
  if (on === today) return `${DUE_WORDS[why]} due today`;
  return on < today ? `${DUE_WORDS[why]} due since ${day}` : `${DUE_WORDS[why]} due ${day}`;
}

/** Everything that was written down of it, and the way to edit that. */
export function WheelRecord({ wheel }: { wheel: Wheel }) {
  const { shop, person, units, may } = useShop();
  const mayEdit = may('wheel:edit');
  const draft =
    mayEdit && readDraft(draftKey(person.personId, shop.id, `wheel:${wheel.id}`), isWheelValues);
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
    <Stack gap={3}>
      {draft ? (
        <Notice action={edit('Go on with them')}>
          Changes to this wheel are kept on this device and not saved yet.
        </Notice>
      ) : null}
      <MarkingFold marking={wheel.data.marking} />
      <Fold label="All that is written down of it" value={wheel.data.place ?? 'no place given'}>
        <Facts label={`Facts of ${wheel.tag}`} parts={wheelParts} values={valuesOf(wheel, units)} />
      </Fold>
      {mayEdit ? <Row>{edit('Edit')}</Row> : null}
    </Stack>
  );
}
