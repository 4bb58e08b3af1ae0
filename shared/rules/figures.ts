import type { UnitName } from '../units/unit';
import type { SourceId } from './sources';
import type { Figure, Quantity, Term, Working } from './types';

/**
 * One symbol of a working, with the value that stands in it.
 *
 * @param symbol - as it stands in the formula.
 * @param meaning - in words.
 * @param quantity - value and unit.
 * @returns the term; its value is null where it is not a finite number.
 */
export function term(
  symbol: string,
  meaning: string,
  [value, unit]: readonly [number | null, UnitName],
): Term {
  return { symbol, meaning, value: finite(value), unit };
}

/**
 * A term that nobody gave: recalled from memory, or a shop setting that stands at its default.
 *
 * @param symbol - as it stands in the formula.
 * @param meaning - in words.
 * @param quantity - value and unit.
 * @returns the term, marked as assumed.
 */
export function assumedTerm(
  symbol: string,
  meaning: string,
  quantity: readonly [number | null, UnitName],
): Term {
  return { ...term(symbol, meaning, quantity), assumed: true };
}

/**
 * A figure as the symbol of another figure's working.
 *
 * @param symbol - as it stands in the formula.
 * @param meaning - in words.
 * @param figure - the other figure.
 * @returns the term.
 */
export function termOf(symbol: string, meaning: string, figure: Figure): Term {
  return { symbol, meaning, value: figure.value, unit: figure.unit };
}

/**
 * Works a figure out from its terms, so that the value and the working it shows cannot part company.
 *
 * @param spec - formula, its source and terms, and `compute`, which receives the terms' values in order.
 * @returns the figure; its value is null when a term is missing or the answer is not a finite number.
 */
export function figure(spec: {
  unit: UnitName;
  formula: string;
  source: SourceId;
  terms: Term[];
  compute: (...values: number[]) => number | null;
  note?: string;
}): Figure {
  const values: number[] = [];
  for (const { value } of spec.terms) if (value !== null) values.push(value);
  const known = values.length === spec.terms.length;
  const working: Working = { formula: spec.formula, terms: spec.terms, source: spec.source };
  if (spec.note !== undefined) working.note = spec.note;
  return { value: known ? finite(spec.compute(...values)) : null, unit: spec.unit, working };
}

/**
 * A value that was entered or chosen, as a figure: its working says what it is and who vouches for it.
 *
 * @param meaning - what the value is.
 * @param quantity - value and unit.
 * @param source - who vouches for it.
 * @returns the figure.
 */
export function stated(
  meaning: string,
  [value, unit]: readonly [number | null, UnitName],
  source: SourceId = 'entered',
): Figure {
  return figure({
    unit,
    formula: '{x}',
    source,
    terms: [term('x', meaning, [value, unit])],
    compute: (x) => x,
  });
}

/**
 * A quantity for the words of a finding.
 *
 * @param value - the number.
 * @param unit - its unit.
 * @returns the two together.
 */
export function quantity(value: number, unit: UnitName): Quantity {
  return { value, unit };
}

/**
 * The number itself, or null for nothing, NaN and infinity.
 *
 * @param value - any number, or none.
 * @returns a finite number or null.
 */
export function finite(value: number | null | undefined): number | null {
  return value !== null && value !== undefined && Number.isFinite(value) ? value : null;
}

/**
 * Rounds down to a multiple of `step`; what falls short of the next multiple by doubt of doubles counts as it.
 *
 * @param value - a number, 0 or more.
 * @param step - the step, over 0.
 * @returns the largest multiple not above the value.
 */
export function floorTo(value: number, step: number): number {
  return Math.floor(value / step + 1e-6) * step;
}
