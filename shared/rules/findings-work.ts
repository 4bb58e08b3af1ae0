import type { FindingCatalogue } from './finding-catalogue';

/** Findings about the work, its taper, and the height of the wheel. */
export const WORK_FINDINGS = {
  'clean-up-short': {
    part: 'work',
    levels: ['check'],
    title: 'The stock is {shortfall} too small on diameter to clean up a run-out of {runOut}.',
    remedy: 'Set the work truer, or accept a surface that is not ground all round.',
    source: 'derived-round-clean-up',
  },
  'taper-ends-swapped': {
    part: 'work',
    levels: ['stop'],
    title: 'The small end, {small}, is not smaller than the big end, {large}.',
    remedy: 'Look at both diameters.',
    source: 'derived-taper',
  },
  'cone-past-its-point': {
    part: 'work',
    levels: ['stop'],
    title: 'A cone of this angle comes to its point after {longest}.',
    remedy: 'Look at length, diameter and angle.',
    source: 'derived-taper',
  },
  'setover-inside': {
    part: 'work',
    levels: ['stop'],
    title: 'A tailstock set over makes tapers outside only.',
    remedy: 'Set the compound slide over instead.',
    source: 'jones-setover',
  },
  'setover-needs-centres': {
    part: 'work',
    levels: ['stop'],
    title: 'A tailstock set over works between centres only.',
    remedy: 'Hold the work between centres, or set the compound slide over instead.',
    source: 'jones-setover',
  },
  shoulder: {
    part: 'work',
    levels: ['note'],
    title: 'At the shoulder the wheel cannot run past the end.',
    remedy:
      'Leave a relief or an undercut there, set a carriage stop, and touch the shoulder by hand only: its side is not guarded and burns easily.',
    source: 'practice-overrun',
  },
  'unit-doubt': {
    part: 'work',
    levels: ['note'],
    title:
      'Is {first} right beside {second}? One of them looks like {unit} typed as the other unit.',
    remedy: 'Look at the unit of {firstLabel} and of {secondLabel}.',
    source: 'derived-units',
  },
  'no-room-behind': {
    part: 'work',
    levels: ['stop'],
    title: 'Behind the ground surface there is {room}, and the wheel runs {overrun} past it.',
    remedy: 'Shorten the overrun, or open a relief behind the surface.',
    source: 'practice-clearance',
  },
  'little-room-behind': {
    part: 'work',
    levels: ['check'],
    title: 'Past the overrun only {gap} is left for the nut or screw in front of the wheel.',
    remedy: 'Measure the nut, set a carriage stop, and try one full stroke by hand, power off.',
    source: 'practice-clearance',
  },
  'compound-travel-unknown': {
    part: 'machine',
    levels: ['note'],
    title: 'How far this lathe’s compound slide travels is not recorded.',
    remedy: 'Try the whole stroke by hand first, power off; then record the travel with the lathe.',
    source: 'practice-clearance',
  },
  'compound-zero-unknown': {
    part: 'machine',
    levels: ['check'],
    title: 'Nobody has recorded how this lathe marks the zero of its compound slide.',
    remedy:
      'Set it to zero and look whether it lies across the bed or along it; both readings are given.',
    source: 'practice-scale',
  },
  'wheel-off-centre': {
    part: 'machine',
    levels: ['note', 'check'],
    title:
      'The wheel stands {height} {way} centre: {share} of the infeed reaches the work, and a cone comes out hollow.',
    remedy: 'Set it to centre height with shims, or trust the gauge and not the dial.',
    source: 'derived-centre-height',
  },
  'height-out-of-reach': {
    part: 'machine',
    levels: ['stop'],
    title: 'With its axis {height} off centre the wheel cannot touch this work.',
    remedy: 'Look at the height, and set the wheel to centre with shims.',
    source: 'derived-centre-height',
  },
} as const satisfies FindingCatalogue;
