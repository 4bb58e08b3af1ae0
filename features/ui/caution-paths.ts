/** The subjects of cautions, drawn in strokes of one weight on a 48 by 48 disc. */
export const cautionPaths = {
  // An open manual
  'First of all':
    'M24 15c-3-3-8-4-14-4v23c6 0 11 1 14 4 3-3 8-4 14-4V11c-6 0-11 1-14 4zM24 15v23M15 18c2 0 4 .5 5 1M15 24c2 0 4 .5 5 1M33 18c-2 0-4 .5-5 1M33 24c-2 0-4 .5-5 1',
  // A wheel that rings
  'Wheel soundness':
    'M33 27a10 10 0 1 1-20 0 10 10 0 0 1 20 0zM26 27a3 3 0 1 1-6 0 3 3 0 0 1 6 0zM27 13l1.5-5M32.5 16l4-4M35.5 21.5l5-2',
  // A dial with its hand near the end
  Speed:
    'M13.5 36a15 15 0 1 1 21 0M24 25l8-7M24 10v3M11 18.5l2.5 1.5M37 18.5l-2.5 1.5M9.5 29h3M38.5 29h-3',
  // A wheel between its flanges
  'Mounting and flanges': 'M21 9h6v30h-6zM16 17h5v14h-5zM27 17h5v14h-5zM6 24h10M32 24h10',
  // A hood over the wheel
  'Guards and clearance':
    'M34 28a10 10 0 1 1-20 0 10 10 0 0 1 20 0zM26 28a2 2 0 1 1-4 0 2 2 0 0 1 4 0zM8 28a16 16 0 0 1 32 0M8 28v5M40 28v5',
  // Which way things turn
  Rotation:
    'M12.5 16a14 14 0 0 1 22.5-1M35.5 32a14 14 0 0 1-22.5 1M35.5 7.5l-.5 7.5-7.5-.5M12.5 40.5l.5-7.5 7.5.5M27 24a3 3 0 1 1-6 0 3 3 0 0 1 6 0z',
  // A diamond at the wheel's face
  Dressing: 'M10 9a26 26 0 0 1 0 30M10 9v30M18 24l6-5v10zM24 19h14v10H24M30 19v10',
  // Wheel and work in contact
  Grinding:
    'M26 19a9 9 0 1 1-18 0 9 9 0 0 1 18 0zM18.5 19a1.5 1.5 0 1 1-3 0 1.5 1.5 0 0 1 3 0zM39 31a7 7 0 1 1-14 0 7 7 0 0 1 14 0zM21 30l-5 4M22 34l-4 5M26 38.5l-2 3.5',
  // Goggles, and dust under them
  'Dust and mist':
    'M21 22a6 6 0 1 1-12 0 6 6 0 0 1 12 0zM39 22a6 6 0 1 1-12 0 6 6 0 0 1 12 0zM21 21q3-2.5 6 0M9 20l-2-4M39 20l2-4M17 35h.2M24 33h.2M31 35h.2M24 38.5h.2',
  // A flame
  Fire: 'M24 8c1 7 9 10 9 19a9 9 0 0 1-18 0c0-4 2-6 3.5-9 1 2.5 2 3.5 3.5 4 .5-5 .5-9 2-14zM24 36a4 4 0 0 1-4-4c0-2.5 2-3.5 4-6 2 2.5 4 3.5 4 6a4 4 0 0 1-4 4z',
  // A bare hand
  'Hands and clothing':
    'M16 26V14.5a2.3 2.3 0 0 1 4.6 0V23M20.6 22V11.5a2.3 2.3 0 0 1 4.6 0V22M25.2 22V13a2.3 2.3 0 0 1 4.6 0v11M29.8 24v-6a2.3 2.3 0 0 1 4.6 0v12c0 6-4 10-9.4 10-5 0-7.5-2.5-10-7l-4-7.5a2.2 2.2 0 0 1 3.7-2.3L16 26',
  // A cover over the ways
  'The lathe': 'M8 37h32M12 37l4-9h16l4 9M9 23q15-17 30 0M16 11h.2M24 8h.2M32 11h.2',
} as const;

export type CautionSubject = keyof typeof cautionPaths;
// Object.keys forgets the key type.
export const cautionSubjects = Object.keys(cautionPaths) as CautionSubject[];
