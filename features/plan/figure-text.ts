import type { UnitSystem } from '@/shared/domain/people';
import type { Figure, Quantity } from '@/shared/rules';
import { isShopSetting } from '@/shared/rules/shop-settings';
import { SOURCES, type SourceId } from '@/shared/rules/sources';
import { displayUnit, ENTRY_UNITS } from '@/shared/units/entry-units';
import { formatQuantity, type FormatOptions } from '@/shared/units/format';

/** A figure's number as shown beside its unit; null while something it needs is missing. */
export function figureNumber(
  figure: Figure,
  units: UnitSystem,
  options: FormatOptions = {},
): string | null {
  if (figure.value === null) return null;
  return formatQuantity({ value: figure.value, unit: figure.unit }, units, {
    ...options,
    withUnit: false,
  });
}

export const figureUnit = (figure: Figure, units: UnitSystem): string =>
  ENTRY_UNITS[displayUnit(figure.unit, units)].label;

/** Number and unit, for sentences. */
export function figureText(figure: Figure, units: UnitSystem, options: FormatOptions = {}): string {
  if (figure.value === null) return '–';
  return formatQuantity({ value: figure.value, unit: figure.unit }, units, options);
}

/** The least and greatest that the range of an input gives; null where that does not matter. */
export function bandText({ band, unit }: Figure, units: UnitSystem): string | null {
  if (!band) return null;
  const low = formatQuantity({ value: band.low, unit }, units, { withUnit: false });
  return `${low} to ${formatQuantity({ value: band.high, unit }, units)}`;
}

/** How findings write their quantities. */
export const quantityText =
  (units: UnitSystem) =>
  (quantity: Quantity): string =>
    formatQuantity(quantity, units, quantity.unit === '1' ? ratioDigits(quantity.value) : {});

/** Ratios deserve no more figures than the speeds they come from. */
const ratioDigits = (value: number): FormatOptions => ({
  digits: Math.abs(value) >= 10 ? 0 : Math.abs(value) >= 1 ? 1 : 3,
});

/** In a working, small values keep four figures that count, so that the sum can be followed. */
function metricDigits(value: number): FormatOptions {
  const size = Math.abs(value);
  if (size === 0 || size >= 1) return {};
  return { digits: Math.min(9, 3 - Math.floor(Math.log10(size))) };
}

const metric = (value: number, unit: Quantity['unit']) =>
  formatQuantity({ value, unit }, 'mm', { ...metricDigits(value), withUnit: false });

/**
 * A figure's working as the sheet shows it. Formulas hold for metric values, so they stand in the lines; a reader
 * of inches finds theirs beside the meaning.
 */
export function workingProps(figure: Figure, units: UnitSystem, options: FormatOptions = {}) {
  const { formula, terms, source, note } = figure.working;
  const own = (value: number | null, unit: Quantity['unit']) =>
    units === 'inch' && value !== null && displayUnit(unit, 'inch') !== unit
      ? `, ${formatQuantity({ value, unit }, 'inch')}`
      : '';
  const { title, place, mark } = sourceWords(source);
  return {
    formula,
    terms: terms.map((term) => ({
      symbol: term.symbol,
      meaning: `${term.meaning}${own(term.value, term.unit)}`,
      value: term.value === null ? null : metric(term.value, term.unit),
      unit: ENTRY_UNITS[term.unit].label,
      ...(term.assumed ? { assumed: true } : {}),
    })),
    result: figure.value === null ? null : `${exact(figure)}${shownAs(figure, units, options)}`,
    ...(figure.band
      ? { band: `The range of the values behind it gives ${bandText(figure, units)}.` }
      : {}),
    ...(note ? { note } : {}),
    source: [title, place].filter(Boolean).join(', '),
    sourceHref: { pathname: '/numbers', params: { source } } as const,
    mark,
  };
}

const exact = ({ value, unit }: Figure) =>
  formatQuantity({ value: value ?? NaN, unit }, 'mm', metricDigits(value ?? 1));

/** How the plan shows the result, where that is not the same: in inches, or rounded to the side that counts. */
function shownAs(figure: Figure, units: UnitSystem, options: FormatOptions): string {
  const shown = figureText(figure, units, options);
  if (shown === exact(figure)) return '';
  const way =
    options.rounding && options.rounding !== 'nearest' ? ` rounded ${options.rounding}` : '';
  return `, shown${way} as ${shown}`;
}

export function sourceWords(id: SourceId): { title: string; place: string; mark: string } {
  const { title, place, mark } = SOURCES[id];
  const own = mark === 'memory' && isShopSetting(id) ? '; your shop can set its own value' : '';
  return { title, place, mark: MARK_WORDS[mark] + own };
}

const MARK_WORDS = {
  law: 'Law',
  standard: 'Standard',
  handbook: 'Handbook',
  textbook: 'Textbook',
  derived: 'Derived from first principles, checked numerically',
  'common practice': 'Common practice, no source',
  entered: 'As entered',
  memory: 'Recalled from memory, text not seen',
} as const;
