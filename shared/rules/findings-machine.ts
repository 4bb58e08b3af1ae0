import type { FindingCatalogue } from './finding-catalogue';

/** Findings about lathe, grinder, quill and how they turn. */
export const MACHINE_FINDINGS = {
  'step-too-fast': {
    part: 'machine',
    levels: ['stop'],
    title: 'Belt step {step} turns the wheel at {rpm}, above the limit of {limit} ({governs}).',
    remedy: 'Choose a belt step at or below {limit}, or a wheel marked for more.',
    source: 'osha-1910-215-d1',
  },
  'spindle-too-fast': {
    part: 'machine',
    levels: ['stop'],
    title: '{rpm} is above the limit of {limit} ({governs}).',
    remedy: 'Turn at {limit} or less, or take a wheel marked for more.',
    source: 'osha-1910-215-d1',
  },
  'every-step-too-fast': {
    part: 'machine',
    levels: ['stop'],
    title: 'Every belt step is above the limit of {limit} ({governs}).',
    remedy: 'Take a wheel marked for more, or a grinder that turns slower.',
    source: 'osha-1910-215-d1',
  },
  'spindle-maximum-not-stated': {
    part: 'machine',
    levels: ['check'],
    title: "The greatest speed of the grinder's spindle is not recorded.",
    remedy: "Look for it on its plate or in the maker's manual, and record it on the machine.",
    source: 'miosha-408-10174',
  },
  'guard-missing': {
    part: 'machine',
    levels: ['stop'],
    title: 'Outside work needs a guard on the grinder, and none is recorded.',
    remedy: 'Fit a guard that leaves at most half of the wheel open, and record it on the machine.',
    source: 'osha-1910-215-a1',
  },
  'wheel-leaves-work': {
    part: 'machine',
    levels: ['stop'],
    title: 'The overrun of {overrun} takes the {width} wheel out of the work, with no shield.',
    remedy: 'Shorten the overrun, or stand a fixed shield around the opening and sign for it.',
    source: 'wac-296-806-40506',
  },
  'jaws-open': {
    part: 'machine',
    levels: ['check'],
    title: 'Jaws have gaps: the wheel runs partly open between them.',
    remedy: 'Fit a fixed shield and sign for it before starting.',
    source: 'wac-296-806-40506',
  },
  'wheel-rotation-unknown': {
    part: 'machine',
    levels: ['stop'],
    title: 'Nobody has recorded which way the grinder turns its wheel.',
    remedy: 'Look from the tailstock towards the headstock, and record it on the machine.',
    source: 'practice-rotation',
  },
  'nose-unknown': {
    part: 'machine',
    levels: ['stop'],
    title: "Nobody has recorded how the chuck sits on the lathe's spindle nose.",
    remedy: 'Look whether it is screwed on or locked, and record it on the machine.',
    source: 'practice-rotation',
  },
  'thread-hand-unknown': {
    part: 'machine',
    levels: ['stop'],
    title: 'Nobody has recorded the hand of the thread that holds the wheel.',
    remedy: "Look at the quill's nut or screw, and record it on the machine.",
    source: 'practice-rotation',
  },
  'nut-loosens': {
    part: 'machine',
    levels: ['stop'],
    title:
      'Turning {rotation}, seen from the tailstock, the wheel works its {hand}-hand nut or screw loose.',
    remedy: 'Take a quill with a {needed}-hand thread, or turn the grinder the other way.',
    source: 'practice-rotation',
  },
  'chuck-can-unscrew': {
    part: 'machine',
    levels: ['stop'],
    title: 'The work would turn backwards on a screwed nose: the chuck can unscrew.',
    remedy: 'Use a lathe whose nose locks, or a grinder that turns its wheel the other way.',
    source: 'practice-rotation',
  },
  'work-rotation-other': {
    part: 'machine',
    levels: ['check'],
    title:
      'The work turns {rotation}, so wheel and work run along with each other where they touch.',
    remedy: 'Turn the work {needed}, seen from the tailstock, so that they meet.',
    source: 'derived-directions',
  },
  'quill-thicker-than-wheel': {
    part: 'machine',
    levels: ['stop'],
    title: 'Inside the work the quill is {quill}, and the wheel {wheel}: the quill would rub.',
    remedy: 'Take a thinner or longer-necked quill, or a larger wheel.',
    source: 'practice-clearance',
  },
  'quill-tight': {
    part: 'machine',
    levels: ['check'],
    title: 'Only {gap} is left between the quill and the work.',
    remedy: 'Turn the work over by hand with the power off, over one full stroke, before starting.',
    source: 'practice-clearance',
  },
  'quill-too-short': {
    part: 'machine',
    levels: ['stop'],
    title:
      'The quill reaches {reach}; this stroke needs {needed} before the grinder meets the work.',
    remedy: 'Take a longer quill.',
    source: 'practice-clearance',
  },
  'quill-reach-tight': {
    part: 'machine',
    levels: ['check'],
    title: 'At the end of the stroke only {gap} is left between the grinder and the work.',
    remedy: 'Set a carriage stop, and try one full stroke by hand with the power off.',
    source: 'practice-clearance',
  },
} as const satisfies FindingCatalogue;
