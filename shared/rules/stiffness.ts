import type { Material } from '../domain/materials';
import type { WorkInputs } from '../domain/setups';
import { assumedTerm, figure, stated, term, termOf } from './figures';
import type { Surface } from './surface';
import { positive } from './sizes';
import type { Figure } from './types';

/** Young's modulus of the work, N/mm2. */
function workModulus(material: Material): number {
  switch (material) {
    case 'cast-iron':
      return 110_000;
    case 'copper-alloy':
      return 110_000;
    case 'aluminium-alloy':
      return 70_000;
    case 'stainless':
      return 195_000;
    default:
      return 206_000;
  }
}

/**
 * How stiff the work is where the wheel presses: as a beam between centres at mid-length, or as one that
 * stands out of the chuck. Bores and jaws are stiff.
 *
 * A chuck with a centre or steady holds stiffer than two centres; the softer figure is used for it.
 *
 * @param work - holding, unsupported length and shaft diameter in mm, material; null where unknown.
 * @param surface - the ground surface; its diameter stands in for the shaft's where that is not given.
 * @returns stiffness, N/mm; 'stiff' inside; null while something is missing.
 * @source derived-beam
 * @example workStiffness(planInput.work, surfaceOf(planInput)) // 'stiff'
 */
export function workStiffness(work: WorkInputs, surface: Surface): Figure | 'stiff' {
  if (surface.side === 'inside') return 'stiff';
  const free = work.holding === 'chuck' || work.holding === 'spindle taper';
  const factor = work.holding === null ? null : free ? 3 : 48;
  const modulus = work.material === null ? null : workModulus(work.material);
  return figure({
    unit: 'N/mm',
    formula: `{k_work} = ${free ? 3 : 48} {E} π {d}⁴ / (64 {L}³)`,
    source: 'derived-beam',
    terms: [
      assumedTerm('E', "Young's modulus of the work", [modulus, 'N/mm2']),
      term('d', 'smallest diameter between supports', [
        positive(work.shaftDiameterMm) ?? surface.diameterMm,
        'mm',
      ]),
      term('L', 'unsupported length', [positive(work.unsupportedLengthMm), 'mm']),
    ],
    compute: (e, d, length) =>
      factor === null ? null : (factor * e * Math.PI * d ** 4) / (64 * length ** 3),
    note: free ? 'Standing out of the chuck, pressed at its end.' : 'Pressed at mid-length.',
  });
}

/**
 * Stiffness of post and slides: measured, or the shop's assumed value, N/mm.
 *
 * @param measured - measured stiffness, N/mm; null where it was not measured.
 * @param assumed - the shop's assumed value, N/mm.
 * @returns N/mm.
 */
export function postStiffness(measured: number | null, assumed: number): Figure {
  return positive(measured) !== null
    ? stated('post and slides as measured', [measured, 'N/mm'])
    : figure({
        unit: 'N/mm',
        formula: '{k}',
        source: 'memory-post-stiffness',
        terms: [assumedTerm('k', 'post and slides, assumed', [assumed, 'N/mm'])],
        compute: (k) => k,
        note: 'Measure it: a spring balance and an indicator at the wheel, force over movement.',
      });
}

/**
 * How stiff everything together is at the wheel: quill, post and work give way one after the other.
 *
 * @param parts - stiffness of quill, post and work, N/mm; 'stiff' leaves the work out.
 * @returns stiffness, N/mm, below the least of them; null while a part is unknown.
 * @source derived-spring
 * @example stiffnessAtWheel({ quill: stated('quill', [1800, 'N/mm']), post: stated('post', [5000, 'N/mm']), work: 'stiff' }).value // 1324 N/mm
 */
export function stiffnessAtWheel(parts: {
  quill: Figure;
  post: Figure;
  work: Figure | 'stiff';
}): Figure {
  const { quill, post, work } = parts;
  const terms = [
    termOf('k_quill', 'stiffness of the quill', quill),
    { ...termOf('k_post', 'stiffness of post and slides', post) },
    ...(work === 'stiff' ? [] : [termOf('k_work', 'stiffness of the work', work)]),
  ];
  return figure({
    unit: 'N/mm',
    formula:
      work === 'stiff'
        ? '1/{k} = 1/{k_quill} + 1/{k_post}'
        : '1/{k} = 1/{k_quill} + 1/{k_post} + 1/{k_work}',
    source: 'derived-spring',
    terms,
    compute: (...all) => 1 / all.reduce((sum, k) => sum + 1 / k, 0),
    ...(work === 'stiff' ? { note: 'Bores and jaws count as stiff.' } : {}),
  });
}
