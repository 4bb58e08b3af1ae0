import type { QuantitySpec } from '@/features/forms';
import type { Operation } from '@/shared/domain/setups';

/** Every number of a setup, by its path in SetupInputs. */
export const QUANTITY_FIELDS = {
  'work.diameterMm': {
    label: 'Diameter before grinding',
    unit: 'mm',
    limit: 'diameterMm',
  },
  'work.lengthMm': { label: 'Length to grind', unit: 'mm', limit: 'lengthMm' },
  'work.stockOnDiameterMm': {
    label: 'To come off, on diameter',
    unit: 'mm',
    limit: 'stockOnDiameterMm',
  },
  'work.toleranceMm': {
    label: 'Tolerance, on diameter',
    unit: 'mm',
    limit: 'toleranceMm',
  },
  'work.runOutMm': {
    label: 'Worst run-out (TIR)',
    hint: 'The whole swing of the indicator, where it is largest.',
    unit: 'mm',
    limit: 'runOutMm',
  },
  'work.unsupportedLengthMm': {
    label: 'Free length',
    hint: 'From the chuck to the far end of the ground surface, or between the centres.',
    unit: 'mm',
    limit: 'unsupportedLengthMm',
  },
  'work.shaftDiameterMm': {
    label: 'Thinnest place between supports',
    hint: 'Leave empty when it is the ground diameter.',
    unit: 'mm',
    limit: 'diameterMm',
  },
  'work.clearDepthMm': {
    label: 'Free depth behind',
    hint: 'Room beyond the ground surface for the wheel and its nut.',
    unit: 'mm',
    limit: 'clearDepthMm',
  },
  'work.includedAngleDeg': {
    label: 'Included angle',
    hint: 'From side to side; a lathe centre has 60°.',
    unit: 'deg',
    limit: 'includedAngleDeg',
  },
  'work.smallDiameterMm': {
    label: 'Diameter at the small end',
    unit: 'mm',
    limit: 'smallDiameterMm',
  },
  'work.taperPerLength': {
    label: 'Taper',
    hint: 'Diameter over length, as 1/20.',
    unit: 'taper',
    limit: 'taperPerLength',
  },
  'work.warmerK': {
    label: 'Warmer than the gauge',
    unit: 'K',
    limit: 'warmerK',
  },
  'work.headEndMm': { label: 'Diameter near the headstock', unit: 'mm', limit: 'diameterMm' },
  'work.tailEndMm': { label: 'Diameter near the tailstock', unit: 'mm', limit: 'diameterMm' },
  'work.endsApartMm': { label: 'Distance between the two', unit: 'mm', limit: 'lengthMm' },
  'machine.belowCentreMm': {
    label: 'Wheel axis below centre',
    hint: 'Minus where it stands above; 0 on centre.',
    unit: 'mm',
    limit: 'belowCentreMm',
  },
  'work.jawCount': { label: 'Jaws', unit: '1', limit: 'jawCount', whole: true },
  'work.jawBoreMm': {
    label: 'Bore at the jaws',
    hint: 'Across the pads, closed on the preload.',
    unit: 'mm',
    limit: 'diameterMm',
  },
  'work.padWidthMm': { label: 'Pad width', unit: 'mm', limit: 'padWidthMm' },
  'work.lastGroundDiameterMm': {
    label: 'Last ground at',
    hint: 'The bore at which the pads were last ground. Leave empty when nobody knows.',
    unit: 'mm',
    limit: 'diameterMm',
  },
  'work.nearDistanceMm': { label: 'Near plane at', unit: 'mm', limit: 'distanceMm' },
  'work.nearRunOutMm': { label: 'Run-out there (TIR)', unit: 'mm', limit: 'runOutMm' },
  'work.nearHighSpotDeg': {
    label: 'High spot',
    hint: 'Degrees from jaw 1, the way jaws are numbered.',
    unit: 'deg',
    limit: 'highSpotDeg',
  },
  'work.farDistanceMm': { label: 'Far plane at', unit: 'mm', limit: 'distanceMm' },
  'work.farRunOutMm': { label: 'Run-out there (TIR)', unit: 'mm', limit: 'runOutMm' },
  'work.farHighSpotDeg': { label: 'High spot', unit: 'deg', limit: 'highSpotDeg' },
  'work.bellMouthMm': {
    label: 'Worn back at the front',
    hint: 'On radius. Leave empty when not measured.',
    unit: 'mm',
    limit: 'bellMouthMm',
  },
  'wheel.typed.diameterNewMm': {
    label: 'Diameter when new',
    unit: 'mm',
    limit: 'wheelDiameterMm',
  },
  'wheel.typed.diameterNowMm': {
    label: 'Diameter now',
    hint: 'Leave empty for a new wheel.',
    unit: 'mm',
    limit: 'wheelDiameterMm',
  },
  'wheel.typed.widthMm': { label: 'Width', unit: 'mm', limit: 'wheelWidthMm' },
  'wheel.typed.holeMm': { label: 'Hole', unit: 'mm', limit: 'wheelHoleMm' },
  'wheel.typed.markedRpm': { label: 'Marked rpm', unit: 'rpm', limit: 'wheelRpm' },
  'wheel.typed.markedSpeedMPerS': {
    label: 'Marked speed',
    unit: 'm/s',
    limit: 'wheelSpeedMPerS',
  },
  'cut.roughInfeedMm': { label: 'Infeed, rough', unit: 'mm', limit: 'infeedMm' },
  'cut.finishInfeedMm': { label: 'Infeed, finish', unit: 'mm', limit: 'infeedMm' },
  'cut.roughTraverseMmPerRev': {
    label: 'Traverse, rough',
    unit: 'mm/rev',
    limit: 'traverseMmPerRev',
  },
  'cut.finishTraverseMmPerRev': {
    label: 'Traverse, finish',
    unit: 'mm/rev',
    limit: 'traverseMmPerRev',
  },
  'cut.finishStockMm': {
    label: 'Left for finishing',
    hint: 'On radius.',
    unit: 'mm',
    limit: 'finishStockMm',
  },
  'cut.sparkOutPasses': {
    label: 'Spark-out passes',
    unit: 'passes',
    limit: 'sparkOutPasses',
    whole: true,
  },
  'cut.overrunMm': {
    label: 'Overrun at each end',
    hint: 'How far the wheel passes the end of the surface.',
    unit: 'mm',
    limit: 'overrunMm',
  },
  'cut.softnessPerMm': {
    label: 'Softness learned from runs',
    hint: 'For this quill, kind of wheel and material. Leave empty to compute the cut fraction.',
    unit: '1/mm',
    limit: 'softnessPerMm',
  },
  'dress.tipRadiusMm': { label: 'Diamond tip radius', unit: 'mm', limit: 'tipRadiusMm' },
  'dress.diamondCarats': { label: 'Diamond', unit: 'ct', limit: 'diamondCarats' },
  'dress.roughDepthMm': { label: 'Depth, rough', unit: 'mm', limit: 'dressDepthMm' },
  'dress.roughPasses': {
    label: 'Passes, rough',
    unit: 'passes',
    limit: 'dressPasses',
    whole: true,
  },
  'dress.roughOverlap': { label: 'Overlap, rough', unit: '1', limit: 'dressOverlap' },
  'dress.finishDepthMm': { label: 'Depth, finish', unit: 'mm', limit: 'dressDepthMm' },
  'dress.finishPasses': {
    label: 'Passes, finish',
    unit: 'passes',
    limit: 'dressPasses',
    whole: true,
  },
  'dress.finishOverlap': { label: 'Overlap, finish', unit: '1', limit: 'dressOverlap' },
} as const satisfies Record<string, QuantitySpec>;

export type QuantityPath = keyof typeof QUANTITY_FIELDS;

/** Words that change with the operation. */
const OPERATION_LABELS: Partial<Record<Operation, Partial<Record<QuantityPath, string>>>> = {
  jaws: { 'work.lengthMm': 'Pad length' },
  bore: { 'work.diameterMm': 'Bore before grinding' },
  taper: {
    'work.diameterMm': 'Diameter at the big end',
    'work.lengthMm': 'Length along the axis',
  },
};

export function quantityField(path: QuantityPath, operation: Operation): QuantitySpec {
  const spec = QUANTITY_FIELDS[path];
  const label = OPERATION_LABELS[operation]?.[path];
  return label ? { ...spec, label } : spec;
}
