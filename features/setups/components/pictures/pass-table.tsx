import { View } from 'react-native';

import { Table, type Column } from '@/features/ui/table';
import { useLayout, useMeasuredWidth } from '@/features/ui/use-layout';
import type { UnitSystem } from '@/shared/domain/people';
import type { Pass } from '@/shared/rules/types';
import { displayUnit, ENTRY_UNITS } from '@/shared/units/entry-units';

import {
  BETWEEN_STAGES,
  dialWords,
  groupName,
  groupPasses,
  infeedWords,
  isFinish,
  lengthWords,
  type PassGroup,
} from './pass-groups';

const ROOM_FOR_ALL = 440;
const ROOM_FOR_WHOLE_CELLS = 250;

type Row = PassGroup | 'between';

/** The passes as they are set at the dial, alike ones in one row. */
export function PassTable({ passes, units }: { passes: readonly Pass[]; units: UnitSystem }) {
  const [width, onLayout] = useMeasuredWidth();
  const { textScale } = useLayout();
  const unit = ENTRY_UNITS[displayUnit('mm', units)].label;
  const room = (width ?? 0) / textScale;
  const all = room >= ROOM_FOR_ALL;
  const whole = room >= ROOM_FOR_WHOLE_CELLS;
  const rows = groupPasses(passes).flatMap<Row>((group, index, groups) => {
    const before = groups[index - 1];
    const startsFinish = before && isFinish(group.stage) && !isFinish(before.stage);
    return startsFinish ? ['between', group] : [group];
  });
  const of = (cell: (group: PassGroup) => string) => (row: Row) =>
    row === 'between' ? '' : cell(row);
  const columns: Column<Row>[] = [
    { id: 'passes', label: 'Passes', whole, cell: of(groupName) },
    {
      id: 'dial',
      label: 'Dial',
      numeric: true,
      whole,
      cell: of((group) => dialWords(group, units)),
    },
    {
      id: 'infeed',
      label: `Infeed, ${unit}`,
      numeric: true,
      cell: of((group) => infeedWords(group, units)),
    },
    {
      id: 'metal',
      label: `Metal left, ${unit}`,
      numeric: true,
      cell: of((group) => lengthWords(group.metalToGoMm, units)),
    },
    {
      id: 'spring',
      label: `Spring, ${unit}`,
      numeric: true,
      cell: of((group) => lengthWords(group.springMm, units)),
    },
  ];
  return (
    <View onLayout={onLayout}>
      <Table
        caption="Infeed, pass by pass"
        dense
        columns={all ? columns : columns.filter(({ id }) => id !== 'infeed' && id !== 'spring')}
        rows={rows}
        rowKey={(row) => (row === 'between' ? row : String(row.first))}
        spanning={(row) => (row === 'between' ? BETWEEN_STAGES : null)}
      />
    </View>
  );
}
