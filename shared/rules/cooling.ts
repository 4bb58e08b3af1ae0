import type { ShopRules } from '../domain/shop-rules';
import { assumedTerm, figure, term } from './figures';
import type { Figure } from './types';

/**
 * How much a warm part shrinks on diameter while it cools: why it is measured cold.
 *
 * @param diameterMm - diameter, mm.
 * @param warmerK - how much warmer the part is than the gauge and the room, kelvin (the same as degrees C).
 * @param rules - the shop's value for the expansion of steel, for each kelvin.
 * @returns shrinkage on diameter, mm, unrounded, for steel.
 * @source memory-expansion
 * @example shrinkage(50, 20, rules).value // 0.0115 mm
 */
export function shrinkage(
  diameterMm: number | null,
  warmerK: number | null,
  { steelExpansionPerK }: Pick<ShopRules, 'steelExpansionPerK'>,
): Figure {
  return figure({
    unit: 'mm',
    formula: '{ΔD} = {α} {D} {ΔT}',
    source: 'memory-expansion',
    terms: [
      assumedTerm('α', 'expansion of steel for each degree', [steelExpansionPerK, '1']),
      term('D', 'diameter', [diameterMm, 'mm']),
      term('ΔT', 'warmer than the gauge', [warmerK, 'K']),
    ],
    compute: (perDegree, diameter, warmer) => perDegree * diameter * warmer,
    note: 'For steel. Let the work cool before it is measured.',
  });
}
