import type { SetupInputs } from '@/shared/domain/setups';

import { inchLathe, insideGrinder, metricLathe, outsideGrinder } from './machines';
import { boreWheel, jawWheel, outsideWheel } from './wheels';

const noWork: SetupInputs['work'] = {
  material: null,
  diameterMm: null,
  lengthMm: null,
  stockOnDiameterMm: null,
  toleranceMm: null,
  runOutMm: null,
  interrupted: false,
  holding: null,
  unsupportedLengthMm: null,
  shaftDiameterMm: null,
  throughBore: null,
  clearDepthMm: null,
  jawCount: null,
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
};

const suggestedCut: SetupInputs['cut'] = {
  latheRpm: null,
  roughInfeedMm: null,
  finishInfeedMm: null,
  roughTraverseMmPerRev: null,
  finishTraverseMmPerRev: null,
  finishStockMm: null,
  sparkOutPasses: null,
  overrunMm: null,
  strokes: null,
};

const suggestedDress: SetupInputs['dress'] = {
  tipRadiusMm: 0.25,
  diamondCarats: 0.5,
  roughDepthMm: null,
  roughPasses: null,
  roughOverlap: null,
  finishDepthMm: null,
  finishPasses: null,
  finishOverlap: null,
};

const jaws: SetupInputs = {
  operation: 'jaws',
  work: {
    ...noWork,
    material: 'tool-hardened',
    lengthMm: 28,
    interrupted: true,
    clearDepthMm: 30,
    jawCount: 3,
    jawBoreMm: 60,
    padWidthMm: 9,
    lastGroundDiameterMm: 60,
    preload: 'ring',
    nearDistanceMm: 15,
    nearRunOutMm: 0.1,
    nearHighSpotDeg: 40,
    farDistanceMm: 75,
    farRunOutMm: 0.12,
    farHighSpotDeg: 45,
    bellMouthMm: 0.01,
  },
  machine: {
    latheId: metricLathe.id,
    grinderId: insideGrinder.id,
    quillId: '01900000-0000-7000-8000-000000000341',
    beltStepId: '01900000-0000-7000-8000-000000000323',
    shieldFitted: true,
    workRotation: null,
  },
  wheel: { wheelId: jawWheel.id, typed: null },
  cut: suggestedCut,
  dress: suggestedDress,
};

const bore: SetupInputs = {
  operation: 'bore',
  work: {
    ...noWork,
    material: 'alloy-hardened',
    diameterMm: 47.9,
    lengthMm: 35,
    stockOnDiameterMm: 0.1,
    toleranceMm: 0.016,
    runOutMm: 0.03,
    holding: 'chuck',
    throughBore: true,
    clearDepthMm: 25,
  },
  machine: {
    latheId: metricLathe.id,
    grinderId: insideGrinder.id,
    quillId: '01900000-0000-7000-8000-000000000341',
    beltStepId: '01900000-0000-7000-8000-000000000322',
    shieldFitted: false,
    workRotation: null,
  },
  wheel: { wheelId: boreWheel.id, typed: null },
  cut: suggestedCut,
  dress: suggestedDress,
};

const outside: SetupInputs = {
  operation: 'outside',
  work: {
    ...noWork,
    material: 'alloy-hardened',
    diameterMm: 40,
    lengthMm: 150,
    stockOnDiameterMm: 0.1,
    toleranceMm: 0.02,
    runOutMm: 0.04,
    holding: 'centres',
    unsupportedLengthMm: 220,
  },
  machine: {
    latheId: inchLathe.id,
    grinderId: outsideGrinder.id,
    quillId: '01900000-0000-7000-8000-000000000331',
    beltStepId: '01900000-0000-7000-8000-000000000314',
    shieldFitted: false,
    workRotation: null,
  },
  wheel: { wheelId: outsideWheel.id, typed: null },
  cut: suggestedCut,
  dress: suggestedDress,
};

export const setups = [
  {
    id: '01900000-0000-7000-8000-000000000501',
    name: 'Chuck jaws, 160 mm three-jaw',
    inputs: jaws,
  },
  {
    id: '01900000-0000-7000-8000-000000000502',
    name: 'Bearing bore in a hub',
    inputs: bore,
  },
  {
    id: '01900000-0000-7000-8000-000000000503',
    name: 'Pump shaft, 40 mm journal',
    inputs: outside,
  },
];
