import { emptySetupInputs } from '@/shared/domain/setup-defaults';
import type { SetupInputs } from '@/shared/domain/setups';

import { inchLathe, insideGrinder, metricLathe, outsideGrinder } from './machines';
import { boreWheel, jawWheel, outsideWheel } from './wheels';

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
    ...emptySetupInputs('jaws').work,
    material: 'tool-hardened',
    lengthMm: 28,
    clearDepthMm: 30,
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
    belowCentreMm: null,
    workRotation: null,
  },
  wheel: { wheelId: jawWheel.id, typed: null },
  cut: emptySetupInputs('jaws').cut,
  dress: suggestedDress,
};

const bore: SetupInputs = {
  operation: 'bore',
  work: {
    ...emptySetupInputs('bore').work,
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
    belowCentreMm: null,
    workRotation: null,
  },
  wheel: { wheelId: boreWheel.id, typed: null },
  cut: emptySetupInputs('bore').cut,
  dress: suggestedDress,
};

const outside: SetupInputs = {
  operation: 'outside',
  work: {
    ...emptySetupInputs('outside').work,
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
    belowCentreMm: null,
    workRotation: null,
  },
  wheel: { wheelId: outsideWheel.id, typed: null },
  cut: emptySetupInputs('outside').cut,
  dress: suggestedDress,
};

const centre: SetupInputs = {
  operation: 'taper',
  work: {
    ...emptySetupInputs('taper').work,
    material: 'tool-hardened',
    diameterMm: 30,
    lengthMm: 25,
    includedAngleDeg: 60,
    stockOnDiameterMm: 0.08,
    toleranceMm: 0.02,
    runOutMm: 0.03,
    holding: 'spindle taper',
    unsupportedLengthMm: 45,
  },
  machine: {
    latheId: metricLathe.id,
    grinderId: outsideGrinder.id,
    quillId: '01900000-0000-7000-8000-000000000331',
    beltStepId: '01900000-0000-7000-8000-000000000313',
    shieldFitted: false,
    belowCentreMm: null,
    workRotation: null,
  },
  wheel: { wheelId: outsideWheel.id, typed: null },
  cut: emptySetupInputs('taper').cut,
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
  {
    id: '01900000-0000-7000-8000-000000000504',
    name: 'Headstock centre, 60 degrees',
    inputs: centre,
  },
];
