/** Subjects of cautions, drawn in white strokes of one weight on a 48 by 48 disc. */
export const cautionPaths = {
  /** Ring test and close look. */
  ring: 'M33 27a10 10 0 1 1-20 0 10 10 0 0 1 20 0zM26 27a3 3 0 1 1-6 0 3 3 0 0 1 6 0zM27 13l1.500-5M32.500 16l4-4M35.500 21.500l5-2',
  /** Flanges, blotters, a free fit of the hole. */
  mount: 'M21 9h6v30h-6zM16 17h5v14h-5zM27 17h5v14h-5zM6 24h10M32 24h10',
  /** Guard or shield round the wheel. */
  guard:
    'M34 28a10 10 0 1 1-20 0 10 10 0 0 1 20 0zM26 28a2 2 0 1 1-4 0 2 2 0 0 1 4 0zM8 28a16 16 0 0 1 32 0M8 28v5M40 28v5',
  /** Trial run: nobody in line with the wheel. */
  clear:
    'M12 9v30M12 17h4v14h-4M34 16a3.500 3.500 0 1 1-7 0 3.500 3.500 0 0 1 7 0zM30.500 20v10M30.500 30l-4.500 9M30.500 30l4.500 9M24 25h13M20 12l-3 2M20 36l-3-2',
  /** Power off before hands go in. */
  isolate: 'M17 15.500a13 13 0 1 0 14 0M24 9v15',
  /** Which way wheel, work and threads turn. */
  rotation:
    'M12.500 16a14 14 0 0 1 22.500-1M35.500 32a14 14 0 0 1-22.500 1M35.500 7.500l-.5 7.500-7.500-.5M12.500 40.500l.5-7.500 7.500.5M27 24a3 3 0 1 1-6 0 3 3 0 0 1 6 0z',
  /** How the work or the jaws are held. */
  holding:
    'M31 25a7 7 0 1 1-14 0 7 7 0 0 1 14 0zM21.500 8h5v10h-5zM9.500 31.500l2.500 4.300 8.300-4.800M38.500 31.500l-2.500 4.300-8.300-4.800',
  /** Eyes, ears, breathing. */
  dust: 'M21 23a6 6 0 1 1-12 0 6 6 0 0 1 12 0zM39 23a6 6 0 1 1-12 0 6 6 0 0 1 12 0zM21 22q3-2.500 6 0M9 21l-2-4M39 21l2-4M17 36h.2M24 34h.2M31 36h.2M24 39h.2',
  /** Where the sparks go, and what burns. */
  sparks:
    'M24 8c1 7 9 10 9 19a9 9 0 0 1-18 0c0-4 2-6 3.500-9 1 2.500 2 3.500 3.500 4 .500-5 .500-9 2-14zM24 36a4 4 0 0 1-4-4c0-2.500 2-3.500 4-6 2 2.500 4 3.500 4 6a4 4 0 0 1-4 4z',
  /** No gloves, sleeves or rings near turning work. */
  hands:
    'M16 26V14.500a2.300 2.300 0 0 1 4.600 0V23M20.600 22V11.500a2.300 2.300 0 0 1 4.600 0V22M25.200 22V13a2.300 2.300 0 0 1 4.600 0v11M29.800 24v-6a2.300 2.300 0 0 1 4.600 0v12c0 6-4 10-9.400 10-5 0-7.500-2.500-10-7l-4-7.500a2.200 2.200 0 0 1 3.700-2.300L16 26',
  /** Ways, scroll and bearings covered from grit. */
  ways: 'M8 37h32M12 37l4-9h16l4 9M9 23q15-17 30 0M16 11h.2M24 8h.2M32 11h.2',
} as const;

export type CautionSubject = keyof typeof cautionPaths;
// Object.keys forgets the key type.
export const cautionSubjects = Object.keys(cautionPaths) as CautionSubject[];
