import { StyleSheet, View } from 'react-native';

import { useShop } from '@/features/session';
import { TextLink } from '@/features/ui/link';
import { List, ListRow } from '@/features/ui/list-row';
import { Table, type Column } from '@/features/ui/table';
import { Strong } from '@/features/ui/text';
import { stroke, space, colors } from '@/features/ui/tokens';
import type { Wheel } from '@/shared/contracts/wheels';
import type { UnitSystem } from '@/shared/domain/people';
import { limitRpm } from '@/shared/rules/limits';
import { unitLabel } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';

import { sizeWords } from '../sizes';
import { governingLimit, standingOf } from '../standing';
import { StandingWords } from './standing-words';

interface WheelRowsProps {
  wheels: readonly Wheel[];
  /** ISO date of the shop. */
  today: string;
}

function limitWords({ data }: Wheel): string {
  const limit = governingLimit(data);
  if (limit === null) return '–';
  return formatQuantity({ value: limitRpm(limit), unit: 'rpm' }, 'mm', {
    rounding: 'down',
    withUnit: false,
  });
}

const sizesNow = ({ data }: Wheel, units: UnitSystem) =>
  sizeWords([data.diameterNowMm, data.widthMm], units);

/** The rack on a phone. */
export function WheelList({ wheels, today }: WheelRowsProps) {
  const { shop, units } = useShop();
  return (
    <List label="Wheels">
      {wheels.map((wheel) => (
        <ListRow
          key={wheel.id}
          label={[wheel.tag, wheel.data.marking].filter(Boolean).join(' · ')}
          detail={`${sizesNow(wheel, units)}, limit ${limitWords(wheel)}\u00a0rpm`}
          aside={<StandingWords {...standingOf(wheel.data, today)} />}
          href={{
            pathname: '/shops/[shopId]/wheels/[wheelId]',
            params: { shopId: shop.id, wheelId: wheel.id },
          }}
        />
      ))}
    </List>
  );
}

/** The rack on a wide screen; the tag opens the wheel beside the table. */
export function WheelTable({ wheels, today, current }: WheelRowsProps & { current: string }) {
  const { shop, units } = useShop();
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
              params: { shopId: shop.id, wheel: wheel.id },
            }}
          />
        </View>
      ),
    },
    {
      id: 'marking',
      label: 'Marking',
      cell: ({ id, data }) =>
        id === current ? (
          <Strong>{data.marking ?? 'not legible'}</Strong>
        ) : (
          (data.marking ?? 'not legible')
        ),
    },
    {
      id: 'size',
      label: `Size now, ${unitLabel('mm', units)}`,
      numeric: true,
      cell: (wheel) => sizesNow(wheel, units).replace(/\u00a0\D+$/, ''),
    },
    { id: 'limit', label: 'Limit, rpm', numeric: true, cell: limitWords },
    {
      id: 'state',
      label: 'State',
      cell: ({ data }) => <StandingWords {...standingOf(data, today)} />,
    },
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
