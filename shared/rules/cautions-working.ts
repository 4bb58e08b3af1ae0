import type { Caution } from './caution';

/** Cautions about dressing, grinding, dust, fire, hands and the lathe. */
export const WORKING_CAUTIONS = {
  'dress-after-mounting': {
    subject: 'Dressing',
    words:
      'True the wheel after every mounting. The diamond stands at centre height or slightly on the trailing side, dragging 10 to 15 degrees; the lathe spindle is locked.',
    source: 'tc9-524-7',
  },
  'dresser-out': {
    subject: 'Dressing',
    words:
      'Take the dresser out before you grind. Wear eye and breathing protection while dressing.',
    source: 'tc9-524-7',
  },
  'start-at-high-spot': {
    subject: 'Grinding',
    words: 'Touch off at the high spot, both turning, with the smallest infeed.',
    source: 'tc9-524-5',
  },
  'never-stop-in-contact': {
    subject: 'Grinding',
    words: 'Never stop wheel or work while they touch. Withdraw first. Never brake the wheel.',
    source: 'tc9-524-5',
  },
  'measure-cold': {
    subject: 'Grinding',
    words: 'Measure with wheel and work stopped, the wheel withdrawn, and the work cold.',
    source: 'practice-schedule',
  },
  'coolant-off-first': {
    subject: 'Grinding',
    words: 'Turn coolant off before the wheel stops, and let the wheel spin it out.',
    source: 'trade-association-coolant',
  },
  'jaws-fixed': {
    subject: 'Grinding',
    words:
      'Jaws are ground under the preload they will work with, never loose in a turning chuck. They run true only near the diameter at which they were ground.',
    source: 'practice-jaw-preload',
    operations: ['jaws'],
  },
  'work-held': {
    subject: 'Grinding',
    words:
      'Centres: the headstock centre runs true, the tailstock is lubricated and re-set as the work warms. Chuck: long work has a centre or a steady.',
    source: 'practice-holding',
    operations: ['outside'],
  },
  'breathe-nothing': {
    subject: 'Dust and mist',
    words:
      'Draw dust and mist off at the wheel, and protect eyes, ears and breath. Oil mist has a limit of 5 mg per cubic metre.',
    source: 'osha-oil-mist',
  },
  'carbide-dust': {
    subject: 'Dust and mist',
    words: 'Dust of cemented carbide holds cobalt, with limits of 0.1 and 0.05 mg per cubic metre.',
    source: 'osha-cobalt',
  },
  'stop-and-ask': {
    subject: 'Dust and mist',
    words: 'Beryllium, chromium or lead in the work, or a coating you do not know: stop and ask.',
    source: 'practice-sparks',
  },
  'grinding-is-hot-work': {
    subject: 'Fire',
    words: 'Grinding is hot work. Look where the sparks go, and clear away what burns.',
    source: 'osha-letter-2009-10-08',
  },
  'aluminium-dust': {
    subject: 'Fire',
    words:
      'Fine aluminium, magnesium and titanium dust burns, and with the sparks of steel it can explode. Clean the machine first, and collect the dust apart.',
    source: 'practice-sparks',
    materials: ['aluminium-alloy'],
  },
  'no-gloves': {
    subject: 'Hands and clothing',
    words: 'No gloves, loose sleeves, rings or open hair near a turning lathe.',
    source: 'practice-hands',
  },
  'withdraw-to-write': {
    subject: 'Hands and clothing',
    words: 'Withdraw the wheel before you pick up the phone.',
    source: 'practice-hands',
  },
  'stand-clear': {
    subject: 'Hands and clothing',
    words: 'Stand out of the plane of the wheel when it starts, and at each first touch.',
    source: 'japan-118',
  },
  'cover-the-ways': {
    subject: 'The lathe',
    words: 'Cover the ways, the scroll and the bearings from grit. Wash it off, do not blow it.',
    source: 'practice-lathe',
  },
} as const satisfies Record<string, Caution>;
