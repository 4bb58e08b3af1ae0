import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { machineQueries } from '@/features/machines';
import { LinkRow } from '@/features/records';
import { useShop } from '@/features/session';
import { IconButton } from '@/features/ui/button';
import { TextLink } from '@/features/ui/link';
import { List } from '@/features/ui/list-row';
import { Table, type Column } from '@/features/ui/table';
import { Small, Strong } from '@/features/ui/text';
import { stroke, space, colors } from '@/features/ui/tokens';
import type { Wheel } from '@/shared/contracts/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import { unitLabel } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';

import { leftWords } from '../left';
import { sizeWords } from '../sizes';
import { standingOn } from '../standing';
import { StandingWords } from './standing-words';

interface WheelRowsProps {
  wheels: readonly Wheel[];
  /** ISO date of the shop. */
  today: string;
  /** Asks why a wheel is set aside; left out for those who may not. */
  onSetAside?: (wheel: Wheel) => void;
}

function limitWords({ life }: Wheel): string {
  if (life.limitRpm === 0) return '–';
  return formatQuantity({ value: life.limitRpm, unit: 'rpm' }, 'mm', {
    rounding: 'down',
    withUnit: false,
  });
}

/** Where a wheel stands, a mounted one with the grinder it sits on. */
function useStanding(today: string) {
  const { shop } = useShop();
  const { data: grinders } = useQuery(machineQueries.grinders(shop.id));
  return ({ data, life }: Wheel) => {
    const on = grinders?.items.find(({ id }) => id === life.onSpindle?.grinderId);
    return standingOn(data, today, on?.name ?? null);
  };
}

function SetAsideSign({
  wheel,
  onSetAside,
}: Pick<WheelRowsProps, 'onSetAside'> & { wheel: Wheel }) {
  const { state } = wheel.data;
  if (!onSetAside || state === 'set aside' || state === 'scrapped') return null;
  return (
    <IconButton
      icon="setAside"
      color="textSoft"
      label={`Set ${wheel.tag} aside`}
      onPress={() => onSetAside(wheel)}
    />
  );
}

const sizesNow = ({ data }: Wheel, units: UnitSystem, withUnit = true) =>
  sizeWords([data.diameterNowMm, data.widthMm], { units, withUnit });

function factWords(wheel: Wheel, units: UnitSystem): string {
  const left = leftWords(wheel.data);
  return [
    sizesNow(wheel, units),
    wheel.life.limitRpm === 0 ? '' : `limit ${limitWords(wheel)}\u00a0rpm`,
    left === '–' ? '' : `${left} left`,
  ]
    .filter(Boolean)
    .join(', ');
}

/** The rack on a phone. */
export function WheelList({ wheels, today, onSetAside }: WheelRowsProps) {
  const { shop, units } = useShop();
  const standing = useStanding(today);
  return (
    <List label="Wheels">
      {wheels.map((wheel) => (
        <LinkRow
          key={wheel.id}
          label={[wheel.tag, wheel.data.marking].filter(Boolean).join(' · ')}
          href={{
            pathname: '/shops/[shopId]/wheels/[wheelId]',
            params: { shopId: shop.id, wheelId: wheel.id },
          }}
          beside={<SetAsideSign wheel={wheel} onSetAside={onSetAside} />}
        >
          <Small>{factWords(wheel, units)}</Small>
          <StandingWords {...standing(wheel)} />
        </LinkRow>
      ))}
    </List>
  );
}

/** The rack on a wide screen; the tag opens the wheel beside the table. */
export function WheelTable({
  wheels,
  today,
  onSetAside,
  current,
}: WheelRowsProps & { current: string }) {
  const { shop, units } = useShop();
  // What the rack is narrowed by stays in the address.
  const address = useLocalSearchParams<Record<string, string>>();
  const standing = useStanding(today);
  const columns: Column<Wheel>[] = [
    {
      id: 'tag',
      label: 'Tag',
      cell: (wheel) => (
        <View style={[styles.tag, wheel.id === current && styles.here]}>
          <TextLink
            label={wheel.tag}
            replace
            href={{
              pathname: '/shops/[shopId]/wheels',
              params: { ...address, shopId: shop.id, wheel: wheel.id },
            }}
          />
        </View>
      ),
    },
    {
      id: 'marking',
      label: 'Marking',
      cell: ({ id, data }) => {
        const words = (data.marking ?? 'not legible').replaceAll(' ', '\u00a0');
        return id === current ? <Strong>{words}</Strong> : words;
      },
    },
    {
      id: 'size',
      label: `Size\u00a0now,\u00a0${unitLabel('mm', units)}`,
      numeric: true,
      cell: (wheel) => sizesNow(wheel, units, false),
    },
    { id: 'limit', label: 'Limit,\u00a0rpm', numeric: true, cell: limitWords },
    { id: 'left', label: 'Left', numeric: true, whole: true, cell: ({ data }) => leftWords(data) },
    { id: 'state', label: 'State', cell: (wheel) => <StandingWords {...standing(wheel)} /> },
    ...(onSetAside
      ? [
          {
            id: 'set-aside',
            label: 'Set\u00a0aside',
            cell: (wheel: Wheel) => <SetAsideSign wheel={wheel} onSetAside={onSetAside} />,
          },
        ]
      : []),
  ];
  return <Table caption="Wheels" columns={columns} rows={wheels} rowKey={({ id }) => id} />;
}

const styles = StyleSheet.create({
  tag: {
    borderLeftWidth: stroke.index,
    borderLeftColor: 'transparent',
    paddingLeft: space[2],
    minWidth: 64,
  },
  here: { borderLeftColor: colors.mark },
});
