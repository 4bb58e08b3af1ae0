import type { GrinderData } from '../domain/machines';
import { finding } from './findings';
import { figure, finite, quantity, term } from './figures';
import { infeedGain, shimStack, type Shim } from './height';
import { positive } from './sizes';
import type { Surface } from './surface';
import type { Figure, Finding, HeightPlan } from './types';

/** How near to centre height a stack of shims must bring the wheel, mm (common practice). */
const NEAR_ENOUGH_MM = 0.05;
/** Below these shares of the infeed reaching the work the height is worth a note, and a Check. */
const GAIN = { note: 0.999, check: 0.95 };

/**
 * What a wheel off centre height does to the infeed, and the shims that raise it.
 *
 * @param spec - how far the wheel's axis stands below centre (negative above) in mm, the ground surface, the
 * wheel's diameter in mm, and the grinder with its shims; each null while unknown.
 * @returns the figures, null where the height was not measured, and findings.
 * @source derived-centre-height
 * @example planHeight({ belowMm: 1.5, surface: surfaceOf(planInput), wheelMm: 27, grinder }).height?.shimsMm // [1, 0.5]
 */
export function planHeight(spec: {
  belowMm: number | null;
  surface: Surface;
  wheelMm: number | null;
  grinder: GrinderData | null;
}): { height: HeightPlan | null; findings: Finding[] } {
  const belowMm = finite(spec.belowMm);
  if (belowMm === null) return { height: null, findings: [] };
  const across = acrossFigure(belowMm, spec.surface, spec.wheelMm);
  const height: HeightPlan = {
    gain: infeedGain(across.value, belowMm),
    across,
    shimsMm: belowMm > 0 ? shimsFor(belowMm, spec.grinder) : null,
  };
  return { height, findings: heightFindings(belowMm, height) };
}

/** Across from axis to axis when the wheel touches the work's surface. */
function acrossFigure(belowMm: number, surface: Surface, wheelMm: number | null): Figure {
  const outside = surface.side === 'outside';
  return figure({
    unit: 'mm',
    formula: `{X} = √((({d_w} ${outside ? '+' : '-'} {d_s}) / 2)² - {h}²)`,
    source: 'derived-centre-height',
    terms: [
      term('d_w', 'diameter of the work', [surface.diameterMm, 'mm']),
      term('d_s', 'diameter of the wheel', [positive(wheelMm), 'mm']),
      term('h', 'height off centre', [belowMm, 'mm']),
    ],
    compute: (work, wheel, below) => {
      const apart = (outside ? work + wheel : work - wheel) / 2;
      return apart > Math.abs(below) ? Math.sqrt(apart ** 2 - below ** 2) : null;
    },
  });
}

function shimsFor(belowMm: number, grinder: GrinderData | null): number[] | null {
  const shims: Shim[] = [];
  for (const thicknessMm of grinder?.shimsMm ?? []) {
    const same = shims.find((shim) => shim.thicknessMm === thicknessMm);
    if (same) same.count += 1;
    else shims.push({ thicknessMm, count: 1 });
  }
  return shimStack(belowMm, NEAR_ENOUGH_MM, shims)?.piecesMm ?? null;
}

function heightFindings(belowMm: number, { gain, across }: HeightPlan): Finding[] {
  if (Math.abs(belowMm) <= NEAR_ENOUGH_MM) return [];
  const height = quantity(Math.abs(belowMm), 'mm');
  if (gain.value === null)
    return across.working.terms.every(({ value }) => value !== null)
      ? [finding('height-out-of-reach', { figures: { height } })]
      : [];
  if (gain.value >= GAIN.note) return [];
  return [
    finding('wheel-off-centre', {
      level: gain.value < GAIN.check ? 'check' : 'note',
      figures: { height, share: quantity(100 * gain.value, '%') },
      names: { way: belowMm > 0 ? 'below' : 'above' },
    }),
  ];
}
