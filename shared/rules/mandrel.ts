import type { QuillData } from '../domain/machines';
import type { WheelData } from '../domain/wheels';

/**
 * The quill as it bends: a mounted wheel adds its mandrel in front, and what was measured without it no
 * longer holds.
 *
 * @param quill - the quill or collet; null while not chosen.
 * @param wheel - the wheel; null while not chosen.
 * @returns the same quill, or one with the mandrel's overhang and the head's width as a first segment.
 * @source derived-beam
 * @example effectiveQuill(quill, wheel) === quill // true
 */
export function effectiveQuill(quill: QuillData | null, wheel: WheelData | null): QuillData | null {
  if (quill === null || wheel === null || wheel.mounted === null) return quill;
  const { mandrelDiameterMm, overhangMm } = wheel.mounted;
  return {
    ...quill,
    segments: [
      { lengthMm: overhangMm + wheel.widthMm, diameterMm: mandrelDiameterMm },
      ...quill.segments,
    ],
    measuredStiffnessNPerMm: null,
    measuredFrequencyHz: null,
  };
}
