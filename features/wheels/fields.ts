import type { QuantitySpec } from '@/features/forms';

/** Lengths and rpm of a wheel, by their names in WheelData. */
export const WHEEL_FIELDS = {
  diameterNewMm: {
    label: 'Diameter when new',
    hint: 'The marked speed counts for this one. All three at once, as on the label: 25 x 20 x 8.',
    unit: 'mm',
    limit: 'wheelDiameterMm',
  },
  diameterNowMm: {
    label: 'Diameter now',
    hint: 'Leave empty for a new wheel.',
    unit: 'mm',
    limit: 'wheelDiameterMm',
  },
  widthMm: { label: 'Width', unit: 'mm', limit: 'wheelWidthMm' },
  holeMm: { label: 'Hole', unit: 'mm', limit: 'wheelHoleMm' },
  smallestUsableMm: {
    label: 'Smallest usable diameter',
    hint: 'No dressing goes below it. Leave empty where it is not known.',
    unit: 'mm',
    limit: 'wheelDiameterMm',
  },
  markedRpm: {
    label: 'Marked rpm',
    hint: 'Leave empty where no rpm is marked.',
    unit: 'rpm',
    limit: 'wheelRpm',
  },
} as const satisfies Record<string, QuantitySpec>;

/** The mandrel of a mounted wheel, by the names in MountedWheel. */
export const MANDREL_FIELDS = {
  mandrelDiameterMm: { label: 'Mandrel diameter', unit: 'mm', limit: 'quillDiameterMm' },
  overhangMm: {
    label: 'Overhang',
    hint: 'From the collet to the back of the wheel.',
    unit: 'mm',
    limit: 'quillLengthMm',
  },
  makerMaximumRpm: {
    label: "Maker's rpm at this overhang",
    hint: "From the maker's table for shape, mandrel and overhang. Without it the wheel does not run.",
    unit: 'rpm',
    limit: 'wheelRpm',
  },
} as const satisfies Record<string, QuantitySpec>;

export type WheelField = keyof typeof WHEEL_FIELDS;
export type MandrelField = keyof typeof MANDREL_FIELDS;
