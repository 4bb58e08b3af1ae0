import { StyleSheet, View } from 'react-native';

import { Small, Strong } from '@/features/ui/text';
import { colors, space, stroke } from '@/features/ui/tokens';

/** One fact of a record: what it is called, how it reads, and how it is taken over from another version. */
export interface Part<Values> {
  key: string;
  label: string;
  words: (values: Values) => string;
  take: (into: Values, from: Values) => Values;
}

/** What stands for a fact that nobody has given. */
export const NOT_GIVEN = '–';

/** A fact held in one key of the form. */
export function keyPart<Values extends object, Key extends keyof Values & string>(
  key: Key,
  label: string,
  words: (value: Values[Key], values: Values) => string,
): Part<Values> {
  return {
    key,
    label,
    words: (values) => words(values[key], values),
    take: (into, from) => ({ ...into, [key]: from[key] }),
  };
}

interface Row {
  id: string;
}

interface RowsWords<Item> {
  label: (item: Item) => string;
  words: (item: Item) => string;
}

/** The rows of a list that either of two versions holds, each as a fact of its own. */
export function rowParts<Item extends Row, Key extends string, Values extends Record<Key, Item[]>>(
  key: Key,
  versions: readonly Values[],
  { label, words }: RowsWords<Item>,
): Part<Values>[] {
  const rows = new Map(versions.flatMap((values) => values[key].map((row) => [row.id, row])));
  return [...rows.values()].map((row) => {
    const at = (values: Values) => values[key].find(({ id }) => id === row.id);
    const names = versions.flatMap((values) => at(values) ?? []).map(label);
    // The name is part of what differs only where the row was renamed.
    const named = new Set(names).size > 1;
    return {
      key: `${key}.${row.id}`,
      label: label(row),
      words: (values) => {
        const there = at(values);
        if (!there) return 'not there';
        return named ? `${label(there)}: ${words(there)}` : words(there);
      },
      take: (into, from) => ({ ...into, [key]: replaced(into[key], row.id, at(from)) }),
    };
  });
}

function replaced<Item extends Row>(rows: Item[], id: string, row: Item | undefined): Item[] {
  if (!row) return rows.filter((other) => other.id !== id);
  const known = rows.some((other) => other.id === id);
  return known ? rows.map((other) => (other.id === id ? row : other)) : [...rows, row];
}

interface FactsProps<Values> {
  label: string;
  parts: readonly Part<Values>[];
  values: Values;
}

/** A record to be read: each fact by its name. */
export function Facts<Values>({ label, parts, values }: FactsProps<Values>) {
  return (
    <View role="list" aria-label={label} style={styles.facts}>
      {parts.map((part) => (
        <View key={part.key} role="listitem" style={styles.fact}>
          <View style={styles.name}>
            <Small>{part.label}</Small>
          </View>
          <View style={styles.words}>
            <Strong>{part.words(values)}</Strong>
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  facts: { borderTopWidth: stroke.hairline, borderTopColor: colors.rule },
  fact: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    columnGap: space[4],
    paddingVertical: space[2],
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
  },
  name: { flexGrow: 1, flexShrink: 1, flexBasis: 140 },
  words: { flexGrow: 2, flexShrink: 1, flexBasis: 200, minWidth: 0 },
});
