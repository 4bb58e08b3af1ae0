import { assumedTerm, figure, termOf } from './figures';
import type { Figure } from './types';

/** The band of a product: a factor's band, in proportion to the figure itself. */
function withBandOf(factor: Figure, product: Figure): Figure {
  const { band, value } = factor;
  if (band === undefined || !value || product.value === null) return product;
  const perUnit = product.value / value;
  return { ...product, band: { low: band.low * perUnit, high: band.high * perUnit } };
}

/**
 * The power that grinding takes at the wheel.
 *
 * @param energy - specific energy, J/mm3, with its band.
 * @param removal - metal removed, mm3/s.
 * @returns W, unrounded, with the band that the energy's range gives.
 * @source kalpakjian-force
 * @example grindingPower(specificEnergy('cast-iron'), removalRate(40, 0.01, 120)).value // 67.4 W
 */
export function grindingPower(energy: Figure, removal: Figure): Figure {
  const power = figure({
    unit: 'W',
    formula: '{P} = {u} {Q}',
    source: 'kalpakjian-force',
    terms: [termOf('u', 'specific energy', energy), termOf('Q', 'metal removed', removal)],
    compute: (specific, rate) => specific * rate,
  });
  return withBandOf(energy, power);
}

/**
 * The force along the wheel's rim.
 *
 * @param power - power at the wheel, W.
 * @param wheelSpeed - wheel speed, m/s, over 0.
 * @returns N, unrounded, with the power's band.
 * @source kalpakjian-force
 * @example tangentialForce(grindingPower(specificEnergy('cast-iron'), removalRate(40, 0.01, 120)), wheelSpeed(125, 5000)).value // 2.06 N
 */
export function tangentialForce(power: Figure, wheelSpeed: Figure): Figure {
  const force = figure({
    unit: 'N',
    formula: '{F_t} = {P} / {v_s}',
    source: 'kalpakjian-force',
    terms: [termOf('P', 'power', power), termOf('v_s', 'wheel speed', wheelSpeed)],
    compute: (watts, speed) => watts / speed,
  });
  return withBandOf(power, force);
}

/**
 * The force that presses wheel and work apart and bends the quill.
 *
 * @param tangential - force along the rim, N.
 * @param forceRatio - tangential over normal force, over 0; 0.3 to 0.5 in fine grinding, 0.2 when dull.
 * @returns N, unrounded, with the band of the tangential force.
 * @source memory-force-ratio
 * @example normalForce(tangentialForce(grindingPower(specificEnergy('cast-iron'), removalRate(40, 0.01, 120)), wheelSpeed(125, 5000)), 0.4).value // 5.15 N
 */
export function normalForce(tangential: Figure, forceRatio: number | null): Figure {
  const force = figure({
    unit: 'N',
    formula: '{F_n} = {F_t} / {μ}',
    source: 'memory-force-ratio',
    terms: [
      termOf('F_t', 'force along the rim', tangential),
      assumedTerm('μ', 'tangential over normal force', [forceRatio, '1']),
    ],
    compute: (along, ratio) => along / ratio,
    note: 'A dull wheel presses about twice as hard.',
  });
  return withBandOf(tangential, force);
}
