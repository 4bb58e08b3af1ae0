import type { Operation, SetupInputs } from './setups';

const THREE_JAWS = 3;

/**
 * A new setup with nothing answered yet, but three jaws, which most chucks have.
 *
 * @param operation - which kind of work the setup is for.
 * @returns inputs with null for everything unanswered.
 */
export function emptySetupInputs(operation: Operation): SetupInputs {
  return {
    operation,
    work: {
      material: null,
      diameterMm: null,
      lengthMm: null,
      stockOnDiameterMm: null,
      toleranceMm: null,
      runOutMm: null,
      taperSide: 'outside',
      taperMethod: 'compound',
      taperGiven: 'angle',
      includedAngleDeg: null,
      smallDiameterMm: null,
      taperPerLength: null,
      shoulders: 'none',
      warmerK: null,
      headEndMm: null,
      tailEndMm: null,
      endsApartMm: null,
      interrupted: false,
      holding: null,
      unsupportedLengthMm: null,
      shaftDiameterMm: null,
      throughBore: null,
      clearDepthMm: null,
      jawCount: THREE_JAWS,
      jawBoreMm: null,
      padWidthMm: null,
      lastGroundDiameterMm: null,
      preload: null,
      nearDistanceMm: null,
      nearRunOutMm: null,
      nearHighSpotDeg: null,
      farDistanceMm: null,
      farRunOutMm: null,
      farHighSpotDeg: null,
      bellMouthMm: null,
    },
    machine: {
      latheId: null,
      grinderId: null,
      quillId: null,
      beltStepId: null,
      shieldFitted: false,
      belowCentreMm: null,
      workRotation: null,
    },
    wheel: { wheelId: null, typed: null },
    cut: {
      latheRpm: null,
      roughInfeedMm: null,
      finishInfeedMm: null,
      roughTraverseMmPerRev: null,
      finishTraverseMmPerRev: null,
      finishStockMm: null,
      sparkOutPasses: null,
      overrunMm: null,
      softnessPerMm: null,
      strokes: null,
    },
    dress: {
      tipRadiusMm: null,
      diamondCarats: null,
      roughDepthMm: null,
      roughPasses: null,
      roughOverlap: null,
      finishDepthMm: null,
      finishPasses: null,
      finishOverlap: null,
    },
  };
}

/**
 * Inputs that were kept before a field was added, with that field unanswered.
 *
 * @param kept - inputs of any age, as they came back from a device.
 * @returns inputs with every field of today.
 */
export function completeInputs(kept: SetupInputs): SetupInputs {
  const empty = emptySetupInputs(kept.operation);
  return {
    ...kept,
    work: { ...empty.work, ...kept.work },
    machine: { ...empty.machine, ...kept.machine },
    cut: { ...empty.cut, ...kept.cut },
    dress: { ...empty.dress, ...kept.dress },
  };
}
