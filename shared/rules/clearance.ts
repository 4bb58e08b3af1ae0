import type { QuillData } from '../domain/machines';
import type { WheelData } from '../domain/wheels';
import { finding } from './findings';
import { quantity } from './figures';
import { quillLength } from './quill';
import type { Finding } from './types';

/** Room to leave between grinder and work at the end of a stroke, mm (common practice). */
const REACH_CLEARANCE_MM = 5;
/** A nut or screw head in front of a small wheel, mm, where it was not measured (common practice). */
const NUT_MM = 6;
/** Less than this between the quill and the work is tight, mm on one side (common practice). */
const SIDE_CLEARANCE_MM = 1;
const USUAL_SHARE = { low: 0.5, high: 0.9 };

interface Inside {
  boreMm: number | null;
  lengthMm: number | null;
  overrunMm: number | null;
  /** Free depth behind the ground surface, mm; null where the wheel comes out, or while unknown. */
  clearDepthMm: number | null;
  wheel: WheelData | null;
  quill: QuillData | null;
}

/**
 * Whether wheel and quill have room inside a bore or between jaws.
 *
 * @param inside - bore, length, overrun and free depth in mm, wheel and quill; each null while unknown.
 * @returns findings; nothing is said of what is not known yet.
 * @source practice-clearance
 * @example clearanceFindings({ boreMm: 40, lengthMm: 30, overrunMm: 4, clearDepthMm: 20, wheel, quill }) // []
 */
export function clearanceFindings(inside: Inside): Finding[] {
  return [...boreFindings(inside), ...reachFindings(inside), ...depthFindings(inside)];
}

function boreFindings({ boreMm, wheel }: Inside): Finding[] {
  if (boreMm === null || wheel === null) return [];
  const share = wheel.diameterNowMm / boreMm;
  const figures = {
    wheel: quantity(wheel.diameterNowMm, 'mm'),
    bore: quantity(boreMm, 'mm'),
    share: quantity(100 * share, '%'),
  };
  if (share >= 1) return [finding('wheel-fills-bore', { figures })];
  if (share > USUAL_SHARE.high) return [finding('wheel-large-for-bore', { figures })];
  return share < USUAL_SHARE.low ? [finding('wheel-small-for-bore', { figures })] : [];
}

/** The quill's axis stands off the work's, so what is thicker than the wheel would rub first. */
function reachFindings({ lengthMm, overrunMm, wheel, quill }: Inside): Finding[] {
  if (lengthMm === null || overrunMm === null || quill === null) return [];
  const found: Finding[] = [];
  const needed = lengthMm + overrunMm;
  const reach = quillLength(quill.segments);
  if (reach < needed)
    found.push(
      finding('quill-too-short', {
        figures: {
          reach: quantity(reach, 'mm'),
          needed: quantity(needed + REACH_CLEARANCE_MM, 'mm'),
        },
      }),
    );
  else if (reach < needed + REACH_CLEARANCE_MM - 1e-9)
    found.push(finding('quill-reach-tight', { figures: { gap: quantity(reach - needed, 'mm') } }));
  if (wheel === null) return found;
  const thickest = thickestWithin(quill, needed);
  const gap = (wheel.diameterNowMm - thickest) / 2;
  if (gap <= 0)
    found.push(
      finding('quill-thicker-than-wheel', {
        figures: { quill: quantity(thickest, 'mm'), wheel: quantity(wheel.diameterNowMm, 'mm') },
      }),
    );
  else if (gap < SIDE_CLEARANCE_MM)
    found.push(finding('quill-tight', { figures: { gap: quantity(gap, 'mm') } }));
  return found;
}

function thickestWithin(quill: QuillData, depthMm: number): number {
  let from = 0;
  let thickest = 0;
  for (const { lengthMm, diameterMm } of quill.segments) {
    if (from < depthMm) thickest = Math.max(thickest, diameterMm);
    from += lengthMm;
  }
  return thickest;
}

function depthFindings({ overrunMm, clearDepthMm }: Inside): Finding[] {
  if (overrunMm === null || clearDepthMm === null) return [];
  const gap = clearDepthMm - overrunMm;
  if (gap < 0)
    return [
      finding('no-room-behind', {
        figures: { room: quantity(clearDepthMm, 'mm'), overrun: quantity(overrunMm, 'mm') },
      }),
    ];
  return gap < NUT_MM
    ? [finding('little-room-behind', { figures: { gap: quantity(gap, 'mm') } })]
    : [];
}
