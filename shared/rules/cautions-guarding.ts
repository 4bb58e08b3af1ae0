import type { Caution } from './caution';

/** Cautions about the wheel, its mounting, its guard and its direction. */
export const GUARDING_CAUTIONS = {
  'look-and-ring': {
    subject: 'Wheel soundness',
    words:
      'Before each mounting look the wheel over closely and tap it gently: about 45 degrees either side of the upright, 25 to 50 mm from the rim, then a turn of 45 degrees and again. A cracked wheel sounds dull. Dry and clean it first.',
    source: 'osha-1910-215-d1',
    mounted: false,
  },
  'small-wheels-look': {
    subject: 'Wheel soundness',
    words:
      'Wheels of 100 mm and under, and wheels of resin, rubber or shellac, may not ring at all: what counts then is a close look in good light.',
    source: 'miosha-408-10113',
  },
  'dropped-wheel': {
    subject: 'Wheel soundness',
    words:
      'A wheel that fell, was hit or got stuck in the work is set aside until it is tested again.',
    source: 'ccohs',
  },
  'store-dry': {
    subject: 'Wheel soundness',
    words: 'Keep wheels dry, free of frost and at an even temperature, and use the oldest first.',
    source: 'ansi-b7-1-2000-2-3',
  },
  'limit-is-new': {
    subject: 'Speed',
    words:
      'The marked rpm stays the limit when the wheel is worn. Never run above it, also not for a moment, and not to try it out.',
    source: 'osha-1910-215-d1',
  },
  'measure-spindle': {
    subject: 'Speed',
    words:
      'Measure the spindle with a tachometer after each change of belt or pulley, and write it down.',
    source: 'miosha-408-10174',
  },
  'mounted-overhang': {
    subject: 'Speed',
    words:
      "A mounted wheel's speed is the maker's for its shape, mandrel and overhang. Grip at least 10 mm of the mandrel, and never let more stand out than the figure is for.",
    source: 'ansi-b7-1-2000-10-1',
    mounted: true,
  },
  'appointed-person': {
    subject: 'Mounting and flanges',
    words:
      'Only a person whom the shop has appointed in writing mounts, dresses and trial-runs wheels; others do so under that person’s signature.',
    source: 'hk-59l-7',
  },
  'slides-on': {
    subject: 'Mounting and flanges',
    words: 'The wheel slides on freely. Never force it, never open its hole.',
    source: 'cal-t8-3580',
    mounted: false,
  },
  'flanges-alike': {
    subject: 'Mounting and flanges',
    words:
      'Both flanges alike, clean, and at least a third of the wheel across, with a new blotter on each side. (Internal wheels under 50 mm go without.)',
    source: 'wac-296-806-40516',
    mounted: false,
  },
  'tighten-enough': {
    subject: 'Mounting and flanges',
    words: 'Tighten the nut or screw only as far as it takes to drive the wheel.',
    source: 'cal-t8-3579',
    mounted: false,
  },
  'isolate-first': {
    subject: 'Guards and clearance',
    words:
      'Isolate the machine before you change wheel, belt or guard. Look at lead, plug and earth of the grinder, and use a residual-current device.',
    source: 'practice-isolate',
  },
  'trial-run': {
    subject: 'Guards and clearance',
    words:
      'After each wheel change run the wheel guarded for three minutes, and one minute at the start of each day, with everybody out of its plane.',
    source: 'japan-118',
  },
  'guard-outside': {
    subject: 'Guards and clearance',
    words: 'The guard leaves at most half of the wheel open and stands between the wheel and you.',
    source: 'osha-1910-215-a1',
    operations: ['outside'],
  },
  'wheel-inside-first': {
    subject: 'Guards and clearance',
    words:
      'Bring the wheel into the work before it starts, or start and stop it behind the shield; it stays inside while it turns.',
    source: 'wac-296-806-40506',
    operations: ['bore', 'jaws'],
  },
  'stroke-by-hand': {
    subject: 'Guards and clearance',
    words:
      'With the power off, turn the work and move the wheel through one full stroke by hand: quill body, nut, post and guard clear of everything that turns. Set stops.',
    source: 'practice-clearance',
  },
  'key-out': {
    subject: 'Guards and clearance',
    words: 'The chuck key is out before anything turns.',
    source: 'practice-isolate',
  },
  'look-at-directions': {
    subject: 'Rotation',
    words:
      'Look which way wheel and work turn before they meet. Work running backwards can unscrew a chuck; a wheel running backwards can unscrew its nut.',
    source: 'practice-rotation',
  },
} as const satisfies Record<string, Caution>;
