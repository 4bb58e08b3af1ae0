export interface FormulaPiece {
  text: string;
  /** Named in braces: a symbol, or the value set in its place. */
  term: boolean;
}

const PIECE = /\{([^{}]+)\}/g;
const NO_BREAK_SPACE = '\u00a0';

/** Cuts a formula into symbols and what stands between them; thousands keep together. */
export function formulaPieces(formula: string): FormulaPiece[] {
  const pieces: FormulaPiece[] = [];
  const between = (text: string) => {
    if (text !== '')
      pieces.push({ text: text.replace(/(\d) (?=\d{3})/g, `$1${NO_BREAK_SPACE}`), term: false });
  };
  let end = 0;
  for (const match of formula.matchAll(PIECE)) {
    between(formula.slice(end, match.index));
    pieces.push({ text: match[1] ?? '', term: true });
    end = match.index + match[0].length;
  }
  between(formula.slice(end));
  return pieces;
}

/** The right-hand side with values in place of symbols; what stood close together gets a times sign. */
export function withValues(
  formula: string,
  values: ReadonlyMap<string, string | null>,
): FormulaPiece[] {
  const pieces = formulaPieces(formula.slice(formula.indexOf('=') + 1).trim());
  return pieces.map((piece, index) => {
    if (!piece.term)
      return {
        text: multiplied(piece.text, pieces[index - 1]?.term, pieces[index + 1]?.term),
        term: false,
      };
    const value = values.has(piece.text) ? (values.get(piece.text) ?? '?') : piece.text;
    return { text: /^[-−]/.test(value) ? `(${value})` : value, term: true };
  });
}

const FACTOR_END = /[\dπ)²³⁴]\s*$/;
/** A bracket that opens words is no factor. */
const FACTOR_START = /^\s*([\dπ√]|\((?![a-z]{2}))/;
const STARTS_WITH_CONSTANT = /^\s*π\s*$/;

/** Between two numbers a gap no longer means "times": write the sign. */
function multiplied(text: string, afterTerm = false, beforeTerm = false): string {
  if (text.trim() === '') return afterTerm && beforeTerm ? ' × ' : text;
  if (STARTS_WITH_CONSTANT.test(text))
    return `${afterTerm ? ' × ' : ''}π${beforeTerm ? ' × ' : ''}`;
  const opened = afterTerm && FACTOR_START.test(text) ? ` × ${text.trimStart()}` : text;
  return beforeTerm && FACTOR_END.test(opened) ? `${opened.trimEnd()} × ` : opened;
}
