import { StyleSheet, Text, View } from 'react-native';

import { colors, fonts, space, type } from './tokens';

export interface FormulaTerm {
  /** The symbol as it stands in braces in the formula. */
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

export interface FormulaPiece {
  text: string;
  /** Named in braces: a symbol, or the value set in its place. */
  term: boolean;
}

const PIECE = /\{([^{}]+)\}/g;

/** Cuts a formula into symbols and what stands between them. */
export function formulaPieces(formula: string): FormulaPiece[] {
  const pieces: FormulaPiece[] = [];
  let end = 0;
  for (const match of formula.matchAll(PIECE)) {
    if (match.index > end) pieces.push({ text: formula.slice(end, match.index), term: false });
    pieces.push({ text: match[1] ?? '', term: true });
    end = match.index + match[0].length;
  }
  if (end < formula.length) pieces.push({ text: formula.slice(end), term: false });
  return pieces;
}

/** The right-hand side with values in place of symbols; neighbours that stood close get a times sign. */
export function withValues(formula: string, terms: readonly FormulaTerm[]): FormulaPiece[] {
  const right = formula.slice(formula.indexOf('=') + 1).trim();
  const values = new Map(terms.map((term) => [term.symbol, term.value ?? '?']));
  const pieces = formulaPieces(right);
  return pieces.map((piece, index) => {
    if (!piece.term) {
      const afterTerm = pieces[index - 1]?.term ?? false;
      const beforeTerm = pieces[index + 1]?.term ?? false;
      return { text: multiplied(piece.text, afterTerm, beforeTerm), term: false };
    }
    const value = values.get(piece.text) ?? piece.text;
    return {
      text: value.startsWith('−') || value.startsWith('-') ? `(${value})` : value,
      term: true,
    };
  });
}

const FACTOR_END = /[\dπ)²³]\s*$/;
const FACTOR_START = /^\s*[\dπ(√]/;

/** Between two numbers a gap no longer means "times": write the sign. */
function multiplied(text: string, afterTerm: boolean, beforeTerm: boolean): string {
  if (text.trim() === '') return afterTerm && beforeTerm ? ' × ' : text;
  const start = afterTerm && FACTOR_START.test(text) ? ` × ${text.trimStart()}` : text;
  return beforeTerm && FACTOR_END.test(start) ? `${start.trimEnd()} × ` : start;
}

/** The formula in symbols, the same with its values in place, and what comes out. */
export function FormulaLines({ formula, terms, result }: FormulaLinesProps) {
  return (
    <View style={styles.lines}>
      <Text style={[type.reading, styles.ink]}>
        {formulaPieces(formula).map((piece, index) => (
          <Text key={index} style={piece.term ? styles.symbol : null}>
            {piece.text}
          </Text>
        ))}
      </Text>
      <Text style={[type.reading, styles.ink]}>
        {'= '}
        {withValues(formula, terms).map((piece, index) => (
          <Text key={index}>{piece.text}</Text>
        ))}
        {' = '}
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
