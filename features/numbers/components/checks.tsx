import { StyleSheet, View } from 'react-native';

import { Table, type Column } from '@/features/ui/table';
import { Label, Small, Strong } from '@/features/ui/text';
import { colors, space, stroke } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';

import type { Check } from '../ledger';

interface ChecksProps {
  /** The source, for those who cannot see where the table stands. */
  caption: string;
  checks: readonly Check[];
}

/** What the source states beside what the rules answer: a table where there is room, else one under the other. */
export function Checks({ caption, checks }: ChecksProps) {
  const { wide } = useLayout();
  if (wide)
    return (
      <Table caption={caption} columns={COLUMNS} rows={checks} rowKey={({ key }) => key} dense />
    );
  return (
    <View role="list" aria-label={caption}>
      {checks.map((check) => (
        <CheckRow key={check.key} check={check} />
      ))}
    </View>
  );
}

const COLUMNS: Column<Check>[] = [
  {
    id: 'checks',
    label: 'What is checked',
    cell: (check) => (
      <>
        {check.checks}
        {check.note === null ? null : <Small>{`\n${check.note}`}</Small>}
      </>
    ),
  },
  { id: 'inputs', label: 'From', cell: fromWords },
  { id: 'expected', label: 'Source', numeric: true, cell: ({ expected }) => expected },
  { id: 'got', label: 'Here', numeric: true, cell: ({ got }) => got },
  { id: 'tolerance', label: 'Tolerance', numeric: true, cell: ({ tolerance }) => tolerance },
  { id: 'ok', label: 'Result', whole: true, cell: ({ ok }) => <Answer ok={ok} /> },
];

function fromWords({ inputs, at }: Check): string {
  return at === null ? inputs : `${inputs} · ${at}`;
}

const Answer = ({ ok }: { ok: boolean }) =>
  ok ? <Small>agrees</Small> : <Strong tone="stop">differs</Strong>;

function CheckRow({ check }: { check: Check }) {
  return (
    <View role="listitem" style={styles.row}>
      <Label>{check.checks}</Label>
      <Small>{fromWords(check)}</Small>
      <View style={styles.figures}>
        <Figure name="Source" value={check.expected} />
        <Figure name="Here" value={check.got} />
        <Figure name="Tolerance" value={check.tolerance} />
      </View>
      {check.ok ? null : <Answer ok={false} />}
      {check.note === null ? null : <Small>{check.note}</Small>}
    </View>
  );
}

const Figure = ({ name, value }: { name: string; value: string }) => (
  <View style={styles.figure}>
    <Small>{name}</Small>
    <Label>{value}</Label>
  </View>
);

const styles = StyleSheet.create({
  row: {
    gap: space[1],
    paddingVertical: space[3],
    borderTopWidth: stroke.hairline,
    borderTopColor: colors.rule,
  },
  figures: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space[3], rowGap: space[1] },
  figure: { flexGrow: 1, flexShrink: 1, flexBasis: 88, minWidth: 0 },
});
