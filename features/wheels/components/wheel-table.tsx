import { StyleSheet, View } from 'react-native';

import { LinkRow } from '@/features/records';
import { useShop } from '@/features/session';
import { TextLink } from '@/features/ui/link';
import { List } from '@/features/ui/list-row';
import { Table, type Column } from '@/features/ui/table';
import { Small, Strong } from '@/features/ui/text';
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

const sizesNow = ({ data }: Wheel, units: UnitSystem, withUnit = true) =>
  sizeWords([data.diameterNowMm, data.widthMm], { units, withUnit });

/** The rack on a phone. */
export function WheelList({ wheels, today }: WheelRowsProps) {
  const { shop, units } = useShop();
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
        >
          <Small>{`${sizesNow(wheel, units)}, limit ${limitWords(wheel)}\u00a0rpm`}</Small>
          <StandingWords {...standingOf(wheel.data, today)} />
        </LinkRow>
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
