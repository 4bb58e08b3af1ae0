import type { Href } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { Card } from './card';
import { FormulaLines, SymbolText } from './formula';
import type { FormulaTerm } from './formula';
import { TextLink } from './link';
import { Sheet } from './sheet';
import { Body, Label, Small, Subheading } from './text';
import { colors, space, stroke } from './tokens';

export interface WorkingProps {
  formula: string;
  terms: readonly FormulaTerm[];
  /** The figure as shown, with its unit; null while something is missing. */
  result: string | null;
  /** Least and greatest, where the range of an input gives them: "between 8 and 22 W". */
  band?: string;
  /** A plain sentence the formula cannot say. */
  note?: string;
  /** Title and place: "29 CFR 1910.215(d)(1)". */
  source: string;
  /** Where the source and what is checked against it can be read. */
  sourceHref?: Href;
  /** What kind of source: law, standard, handbook, memory. */
  mark: string;
}

/** How a number was found: formula, values, terms, note, source. */
function WorkingBlock({
  formula,
  terms,
  result,
  band,
  note,
  source,
  sourceHref,
  mark,
  onLeave,
}: WorkingProps & { onLeave: () => void }) {
  return (
    <View style={styles.block}>
      <Card>
        <FormulaLines formula={formula} terms={terms} result={result} />
        {band ? <Small>{band}</Small> : null}
        {note ? <Small>{note}</Small> : null}
      </Card>
      {terms.length > 0 ? (
        <View role="list" aria-label="Values in the formula">
          {terms.map((term) => (
            <View key={term.symbol} role="listitem" style={styles.term}>
              <View style={styles.symbol}>
                <Label>
                  <SymbolText symbol={term.symbol} />
                </Label>
              </View>
              <View style={styles.meaning}>
                <Small>{term.meaning}</Small>
                {term.assumed ? <Small tone="accentText">assumed, nobody gave it</Small> : null}
              </View>
              <Label align="right">
                {term.value === null ? 'missing' : `${term.value}\u00a0${term.unit ?? ''}`.trim()}
              </Label>
            </View>
          ))}
        </View>
      ) : null}
      <View>
        <Subheading>Source</Subheading>
        {sourceHref === undefined ? (
          <Body>{source}</Body>
        ) : (
          <TextLink label={source} href={sourceHref} onPress={onLeave} />
        )}
        <Small>{mark}</Small>
      </View>
    </View>
  );
}

interface WorkingSheetProps extends WorkingProps {
  /** The figure's name: "Limit from the marked speed". */
  title: string;
  open: boolean;
  onClose: () => void;
}

/** Opens over the screen when a figure is pressed. */
export function WorkingSheet({ title, open, onClose, ...working }: WorkingSheetProps) {
  return (
    <Sheet open={open} onClose={onClose} title={title}>
      <WorkingBlock {...working} onLeave={onClose} />
    </Sheet>
  );
}

const styles = StyleSheet.create({
  block: { gap: space[4] },
  term: {
    flexDirection: 'row',
    alignItems: 'baseline',
    gap: space[3],
    paddingVertical: space[2],
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
  },
  symbol: { minWidth: 36 },
  meaning: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
});
