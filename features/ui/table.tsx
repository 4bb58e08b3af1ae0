import type { CSSProperties, ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Body, Label, Small } from './text';
import { colors, space } from './tokens';

export interface Column<Row> {
  id: string;
  /** Heading; numbers name their unit here. */
  label: string;
  cell: (row: Row) => ReactNode;
  /** Numbers stand right, in tabular figures. */
  numeric?: boolean;
  /** Stays on one line; for short cells only. */
  whole?: boolean;
}

interface TableProps<Row> {
  /** Says what the table holds; spoken, and shown with `showCaption`. */
  caption: string;
  showCaption?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** A row that is one sentence across all columns: a step between two groups. */
  spanning?: (row: Row) => string | null;
  dense?: boolean;
}

/** Figures to be compared: a table to the eye and to a screen reader. The first column names the row. */
export function Table<Row>({
  caption,
  showCaption = false,
  columns,
  rows,
  rowKey,
  spanning,
  dense = false,
}: TableProps<Row>) {
  const padding = `${dense ? space[1] : space[2]}px ${space[2]}px`;
  const cellStyle = (numeric?: boolean): CSSProperties => ({
    padding,
    textAlign: numeric ? 'right' : 'left',
    verticalAlign: 'middle',
    fontWeight: 'inherit',
    borderBottom: `1px solid ${colors.rule}`,
  });
  return (
    <View style={styles.frame}>
      <table style={{ borderCollapse: 'collapse', width: '100%' }}>
        <caption style={showCaption ? { textAlign: 'left' } : UNSEEN}>
          <Label>{caption}</Label>
        </caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.id} scope="col" style={cellStyle(column.numeric)}>
                <Small align={column.numeric ? 'right' : 'left'}>{column.label}</Small>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => {
            const sentence = spanning?.(row) ?? null;
            if (sentence !== null)
              return (
                <tr key={rowKey(row)}>
                  <td
                    colSpan={columns.length}
                    style={{ ...cellStyle(), backgroundColor: colors.well }}
                  >
                    <Label>{sentence}</Label>
                  </td>
                </tr>
              );
            return (
              <tr key={rowKey(row)}>
                {columns.map((column, index) => {
                  const Cell = index === 0 ? 'th' : 'td';
                  const align = column.numeric ? 'right' : 'left';
                  return (
                    <Cell
                      key={column.id}
                      scope={index === 0 ? 'row' : undefined}
                      style={cellStyle(column.numeric)}
                    >
                      {dense ? (
                        <Small tone="text" align={align} whole={column.whole}>
                          {column.cell(row)}
                        </Small>
                      ) : (
                        <Body align={align} whole={column.whole}>
                          {column.cell(row)}
                        </Body>
                      )}
                    </Cell>
                  );
                })}
              </tr>
            );
          })}
        </tbody>
      </table>
    </View>
  );
}

const UNSEEN: CSSProperties = {
  position: 'absolute',
  width: 1,
  height: 1,
  overflow: 'hidden',
  clipPath: 'inset(50%)',
};

const styles = StyleSheet.create({ frame: { width: '100%' } });
