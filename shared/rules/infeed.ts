import type { ShopRules } from '../domain/shop-rules';
import type { Plan } from './types';
import type { WorkRow } from './work-table';

/** Texts begin at this depth for outside and bore grinding, mm: where interrupted work starts. */
const LOW_END_MM = 0.0075;
const STOCK_SHARE = 1 / 3;

export type Cap = { by: NonNullable<Plan['infeed']['governedBy']>; valueMm: number };

/** What bends, heats and stalls, for one millimetre of infeed and traverse; null where unknown. */
export interface CutEffects {
  /** Steady lag in mm for each mm of infeed and each mm of traverse per revolution. */
  lagPerMm2: number | null;
  /** Power in watts for each mm of infeed and each mm of traverse per revolution. */
  wattsPerMm2: number | null;
  availableWatts: number | null;
  /** The deepest dry infeed that stays under the burning threshold, mm. */
  burnMm: number | null;
}

/**
 * Caps on the rough infeed that no traverse can lift: table, shop, stock and burn.
 *
 * @param row - the table's row for the material.
 * @param spec - rough stock on radius in mm (null while unknown), whether the work is interrupted, the shop's
 * rules, the burning infeed and the smallest settable step in mm.
 * @returns the caps, mm on radius, in no order.
 * @source mh31-1318
 * @example leastCap(infeedCaps(workRow('tool-hardened'), { roughStockMm: 0.08, interrupted: true, rules, burnMm: null, stepMm: 0.005 })) // { by: 'table', valueMm: 0.0075 }
 */
export function infeedCaps(
  row: WorkRow,
  spec: {
    roughStockMm: number | null;
    interrupted: boolean;
    rules: Pick<ShopRules, 'roughInfeedLimitMm'>;
    burnMm: number | null;
    /** The smallest infeed that can be set: little stock is no reason for a finer dial. */
    stepMm: number;
  },
): Cap[] {
  const { roughStockMm, burnMm } = spec;
  return [
    {
      by: 'table',
      valueMm: spec.interrupted ? Math.min(LOW_END_MM, row.roughInfeedMm) : row.roughInfeedMm,
    },
    { by: 'shop', valueMm: spec.rules.roughInfeedLimitMm },
    ...(roughStockMm !== null && roughStockMm > spec.stepMm
      ? [{ by: 'stock' as const, valueMm: Math.max(roughStockMm * STOCK_SHARE, spec.stepMm) }]
      : []),
    ...(burnMm !== null ? [{ by: 'burn' as const, valueMm: burnMm }] : []),
  ];
}

/**
 * The least of some caps.
 *
 * @param caps - any number of caps.
 * @returns the one with the least value; null without any.
 */
export function leastCap(caps: readonly Cap[]): Cap | null {
  return caps.reduce<Cap | null>(
    (least, cap) => (least === null || cap.valueMm < least.valueMm ? cap : least),
    null,
  );
}

/**
 * Caps with one more among them; of two of a kind the lower counts.
 *
 * @param caps - caps of different kinds.
 * @param cap - the one to add.
 * @returns a new list, one of each kind.
 */
export function withCap(caps: readonly Cap[], cap: Cap): Cap[] {
  const lower = caps.find(({ by }) => by === cap.by)?.valueMm ?? cap.valueMm;
  return [
    ...caps.filter(({ by }) => by !== cap.by),
    { by: cap.by, valueMm: Math.min(lower, cap.valueMm) },
  ];
}

/**
 * Infeed and traverse together: where spring or power would be too much, the traverse is cut first, down to
 * the finishing one, and only then the infeed.
 *
 * @param cap - the infeed aimed at, mm, and what set it.
 * @param traverse - traverse aimed at and the least worth taking, mm per revolution; `fixed` when it was typed.
 * @param limits - what lag and power allow.
 * @returns infeed in mm, traverse in mm per revolution, and the cap that governs.
 * @source derived-spring
 * @example balanceCut({ by: 'shop', valueMm: 0.0125 }, { aimMm: 1.5, leastMm: 0.75, fixed: false }, { lagPerMm2: 1, lagLimitMm: 0.0125, wattsPerMm2: null, availableWatts: null, burnMm: null }) // { infeedMm: 0.0125, traverseMm: 1, by: 'shop' }
 */
export function balanceCut(
  cap: Cap,
  traverse: { aimMm: number; leastMm: number; fixed: boolean },
  limits: CutEffects & { lagLimitMm: number },
): { infeedMm: number; traverseMm: number; by: Cap['by'] } {
  // Both grow with the product of infeed and traverse, so each limit is a largest product.
  const products: Cap[] = [];
  if (limits.lagPerMm2 !== null && limits.lagPerMm2 > 0)
    products.push({ by: 'lag', valueMm: limits.lagLimitMm / limits.lagPerMm2 });
  if (limits.wattsPerMm2 !== null && limits.wattsPerMm2 > 0 && limits.availableWatts !== null)
    products.push({ by: 'power', valueMm: limits.availableWatts / limits.wattsPerMm2 });
  const most = leastCap(products);
  const asked = cap.valueMm * traverse.aimMm;
  if (most === null || asked <= most.valueMm)
    return { infeedMm: cap.valueMm, traverseMm: traverse.aimMm, by: cap.by };
  const least = traverse.fixed ? traverse.aimMm : Math.min(traverse.leastMm, traverse.aimMm);
  const traverseMm = Math.max(most.valueMm / cap.valueMm, least);
  const infeedMm = Math.min(most.valueMm / traverseMm, cap.valueMm);
  return { infeedMm, traverseMm, by: infeedMm < cap.valueMm - 1e-12 ? most.by : cap.by };
}
