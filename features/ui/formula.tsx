import { StyleSheet, Text, View } from 'react-native';

import { formulaPieces, withValues } from './formula-pieces';
import { colors, fonts, space, type } from './tokens';

export interface FormulaTerm {
  /** The symbol as it stands in braces in the formula; what follows an underscore is set low. */
  symbol: string;
  meaning: string;
  /** The value as shown, or null while it is missing. */
  value: string | null;
  unit?: string;
  /** Nobody gave this value: assumed, or recalled from memory. */
  assumed?: boolean;
}

interface FormulaLinesProps {
  /** Symbols in braces: `{N} = 60 000 {v} / (π {D})`. */
  formula: string;
  terms: readonly FormulaTerm[];
  /** The result as shown, with its unit: "15 038 rpm". */
  result: string | null;
}

/** A symbol with its index set low: v_s. */
export function SymbolText({ symbol }: { symbol: string }) {
  const [base, ...index] = symbol.split('_');
  return (
    <Text style={styles.symbol}>
      {base}
      {index.length > 0 ? <sub style={{ fontSize: '0.72em' }}>{index.join(' ')}</sub> : null}
    </Text>
  );
}

/** The formula in symbols, the same with its values in place, and what comes out. */
export function FormulaLines({ formula, terms, result }: FormulaLinesProps) {
  const values = new Map(terms.map((term) => [term.symbol, term.value]));
  const set = withValues(formula, values);
  const onlyOneValue = set.length === 1;
  return (
    <View style={styles.lines}>
      <Text style={[type.reading, styles.ink]}>
        {formulaPieces(formula).map((piece, index) =>
          piece.term ? <SymbolText key={index} symbol={piece.text} /> : piece.text,
        )}
      </Text>
      <Text style={[type.reading, styles.ink]}>
        {onlyOneValue ? '' : `= ${set.map((piece) => piece.text).join('')} `}
        {'= '}
        <Text style={styles.result}>{result ?? '?'}</Text>
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  lines: { gap: space[1] },
  ink: { color: colors.text },
  symbol: { ...fonts.medium },
  result: { ...fonts.semibold },
});
