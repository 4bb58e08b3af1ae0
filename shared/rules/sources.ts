/**
 * Every reference the rules lean on, one id for each place that is cited. Nowhere else is a reference
 * spelt out: workings, findings and tests name the id.
 */

/**
 * How far a value can be trusted. 'derived' follows from first principles and was checked numerically;
 * 'common practice' has no text behind it; 'memory' was recalled without seeing the text and is shown so;
 * 'entered' is what the shop itself wrote down.
 */
export const SOURCE_MARKS = [
  'law',
  'standard',
  'handbook',
  'textbook',
  'derived',
  'common practice',
  'memory',
  'entered',
] as const;
export type SourceMark = (typeof SOURCE_MARKS)[number];

export interface Source {
  title: string;
  edition?: string;
  /** Chapter, section or page. */
  place: string;
  mark: SourceMark;
  note?: string;
}

const OSHA = '29 CFR 1910.215, Abrasive wheel machinery (United States)';
const CALIFORNIA = 'California Code of Regulations, Title 8';
const WASHINGTON = 'Washington Administrative Code, chapter 296-806';
const MICHIGAN = 'Michigan General Industry Safety Standards, Part 1';
const HONG_KONG = 'Hong Kong Cap. 59L, Factories and Industrial Undertakings (Abrasive Wheels)';
const JAPAN = 'Ordinance on Industrial Safety and Health (Japan)';
const ANSI_B7_1 = 'ANSI B7.1, Use, Care and Protection of Abrasive Wheels';
const GROOVER = 'Groover, Fundamentals of Modern Manufacturing';
const HANDBOOK = "Machinery's Handbook";
const KALPAKJIAN = 'Kalpakjian and Schmid, Manufacturing Engineering and Technology';
const MALKIN = 'Malkin and Guo, Grinding Technology';
const ARMY_TC = 'US Army TC 9-524, Fundamentals of Machine Tools';
const MODERN_GRINDING = 'Modern Grinding Technology (web handbook)';
const JONES = 'Jones, Turning and Boring';
const DERIVED = 'From first principles';
const PRACTICE = 'Common practice of the trade';
const RECALLED = 'Recalled, text not seen';

type Extra = Pick<Source, 'edition' | 'note'>;

/** One reference; `extra` holds edition and note. */
function cite(mark: SourceMark, title: string, place: string, extra?: Extra): Source {
  return { title, place, mark, ...extra };
}

const LAWS = {
  'osha-1910-215-a1': cite('law', OSHA, '(a)(1), guards'),
  'osha-1910-215-d1': cite('law', OSHA, '(d)(1), inspection, ring test and spindle speed'),
  'cal-t8-3579': cite('law', CALIFORNIA, 's. 3579, flanges'),
  'cal-t8-3580': cite('law', CALIFORNIA, 's. 3580, speed and mounting'),
  'wac-296-806-40506': cite('law', WASHINGTON, '40506, guards'),
  'wac-296-806-40512': cite('law', WASHINGTON, '40512, speed'),
  'wac-296-806-40516': cite('law', WASHINGTON, '40516, flanges'),
  'wac-296-806-40524': cite('law', WASHINGTON, '40524, blotters'),
  'miosha-408-10113': cite('law', MICHIGAN, 'R 408.10113, ring test'),
  'miosha-408-10174': cite('law', MICHIGAN, 'R 408.10174, spindle speed'),
  'hk-59l-5-3': cite('law', HONG_KONG, 'reg. 5(3), worn wheels', {
    note: 'Lets a worn wheel turn faster; kept for comparison only, never offered.',
  }),
  'hk-59l-7': cite('law', HONG_KONG, 'reg. 7, appointed persons'),
  'japan-36': cite('law', JAPAN, 'art. 36, training'),
  'japan-118': cite('law', JAPAN, 'art. 118, trial run'),
  'dguv-100-500': cite('law', 'DGUV Regel 100-500 (Germany)', 'ch. 2.25 s. 3.1.2, worn wheels'),
  'bgv-d12-12': cite('law', 'BGV D12, Schleif- und Bürstwerkzeuge (Germany)', 's. 12, trial run'),
  'osha-letter-2009-10-08': cite(
    'law',
    'OSHA letter of interpretation',
    '8 October 2009, hot work',
  ),
  'osha-cobalt': cite('law', 'OSHA and NIOSH pages on cobalt', 'limits 0.1 and 0.05 mg/m3'),
  'osha-oil-mist': cite('law', 'OSHA page on mineral oil mist', 'limit 5 mg/m3'),
} satisfies Record<string, Source>;

const STANDARDS = {
  'ansi-b7-1-2000-2-3': cite('standard', ANSI_B7_1, 's. 2.3, storage', { edition: '2000' }),
  'ansi-b7-1-2000-7-1-1': cite('standard', ANSI_B7_1, 's. 7.1.1, speed', { edition: '2000' }),
  'ansi-b7-1-2000-10-1': cite('standard', ANSI_B7_1, 's. 10.1, mounted wheels', {
    edition: '2000',
  }),
  'ansi-b7-1-2010-5-1': cite('standard', ANSI_B7_1, 's. 5.1, flanges', { edition: '2010' }),
  'ansi-b74-13': cite('standard', 'ANSI B74.13, Markings for Identifying Wheels', 'marking system'),
  'iso-525': cite('standard', 'ISO 525, Bonded abrasive products', 'designation and marking'),
  'iso-1101': cite('standard', 'ISO 1101, Geometrical tolerancing', 'circular run-out'),
  'iso-12181': cite('standard', 'ISO 12181, Roundness', 'least-squares circle'),
  'iso-3089': cite('standard', 'ISO 3089, Self-centring manual chucks', 'test torque'),
  'nist-sp-811': cite('standard', 'NIST Special Publication 811', 'app. B, conversion factors', {
    note: 'The inch is 25.4 mm exactly, the foot 0.3048 m, the pound 0.45359237 kg.',
  }),
  'us-ordnance-od-1645': cite('standard', 'US Army Ordnance OD 1645', 'p. 32, scroll chucks'),
} satisfies Record<string, Source>;

const HANDBOOKS = {
  'mh31-1303': cite('handbook', HANDBOOK, 'p. 1303, diamonds for truing', { edition: '31st' }),
  'mh31-1317': cite('handbook', HANDBOOK, 'p. 1317, wheel markings', { edition: '31st' }),
  'mh31-1318': cite('handbook', HANDBOOK, 'p. 1318, cylindrical grinding', {
    edition: '31st',
    note: 'The columns were garbled in the copy read; fractions follow the standard layout.',
  }),
  'tc9-524-5': cite('handbook', ARMY_TC, 'ch. 5, grinding on the lathe'),
  'tc9-524-7': cite('handbook', ARMY_TC, 'ch. 7, truing and dressing'),
  'dguv-209-002': cite(
    'handbook',
    'DGUV Information 209-002 (Germany)',
    'resin-bonded wheels: expiry',
  ),
  ccohs: cite('handbook', 'Canadian Centre for Occupational Health and Safety', 'grinding wheels'),
  'modern-grinding-dressing': cite('handbook', MODERN_GRINDING, 'Dresser overlays'),
  'trade-association-coolant': cite('handbook', "Abrasive makers' association list", 'coolant'),
  lautard: cite('handbook', "Lautard, The Machinist's Bedside Reader", 'compound for tenths'),
  jones: cite('handbook', JONES, 'cutting speeds'),
  'jones-setover': cite('handbook', JONES, 'setting over the tailstock'),
  'navy-14345': cite('handbook', 'US Navy training course 14345', 'taper turning'),
  colvin: cite('handbook', 'Colvin, Turning and Boring Tapers', 'table of tapers'),
  'wood-turning': cite('handbook', 'A Course in Wood Turning', 'pulleys'),
} satisfies Record<string, Source>;

const TEXTBOOKS = {
  'groover-24': cite('textbook', GROOVER, 'ch. 24, grinding'),
  'groover-24-diamond': cite('textbook', GROOVER, 'ch. 24, diamond and cBN wheels'),
  'khurmi-33': cite('textbook', 'Khurmi, A Textbook of Engineering Mechanics', 'ch. 33, belts'),
  'kalpakjian-energy': cite('textbook', KALPAKJIAN, 'table of specific energy in grinding'),
  'kalpakjian-force': cite('textbook', KALPAKJIAN, 'worked example, forces in grinding'),
  'marinescu-18': cite(
    'textbook',
    'Marinescu et al., Handbook of Machining with Grinding Wheels',
    'ch. 18, spark-out',
  ),
  'nptel-rotor-2-9': cite('textbook', 'NPTEL, Theory and Practice of Rotor Dynamics', 'ex. 2.9'),
  'mpe-2017-1568019': cite(
    'textbook',
    'Mathematical Problems in Engineering 2017, 1568019',
    'table 1, beam with a tip mass',
  ),
} satisfies Record<string, Source>;

const DERIVATIONS = {
  'derived-geometry': cite('derived', DERIVED, 'geometry and trigonometry'),
  'derived-worst-rpm': cite('derived', DERIVED, 'slip and belt thickness only ever slow a spindle'),
  'derived-least-squares': cite('derived', DERIVED, 'least squares of an offset circle'),
  'derived-jaw-contact': cite('derived', DERIVED, 'wheel circle against offset pads'),
  'derived-round-clean-up': cite('derived', DERIVED, 'clean-up stock of round work'),
  'derived-contact-length': cite('derived', DERIVED, 'contact of wheel and work'),
  'derived-wheel-wear': cite('derived', DERIVED, 'wheel wear per pass from the grinding ratio'),
  'derived-dressing': cite('derived', DERIVED, 'diamond tip on the wheel'),
  'derived-spring': cite('derived', DERIVED, 'infeed against spring, pass by pass', {
    note: 'Theory in Malkin and Guo, and in King and Hahn.',
  }),
  'derived-beam': cite('derived', DERIVED, 'bending of a stepped cantilever'),
  'derived-directions': cite('derived', DERIVED, 'directions of turning at the contact'),
  'derived-taper': cite('derived', DERIVED, 'geometry of cones'),
  'derived-centre-height': cite('derived', DERIVED, 'wheel off centre height'),
  'derived-shims': cite('derived', DERIVED, 'fewest shims to a height'),
  'derived-units': cite('derived', DERIVED, 'a figure 25 times off beside its neighbours'),
  'derived-time': cite('derived', DERIVED, 'travel over feed, pass by pass'),
} satisfies Record<string, Source>;

const PRACTICES = {
  'practice-interrupted': cite('common practice', PRACTICE, 'interrupted work starts gently'),
  'practice-overrun': cite('common practice', PRACTICE, 'overrun a third of the wheel width'),
  'practice-jaw-clean-up': cite('common practice', PRACTICE, 'truing three-jaw chucks'),
  'practice-jaw-preload': cite('common practice', PRACTICE, 'jaws ground under preload'),
  'practice-bore-wheel': cite('common practice', PRACTICE, 'bore wheel 0.5 to 0.9 of the bore'),
  'practice-clearance': cite('common practice', PRACTICE, 'one full stroke by hand, power off'),
  'practice-rotation': cite('common practice', PRACTICE, 'rotation, noses and threads'),
  'practice-holding': cite('common practice', PRACTICE, 'holding and preload'),
  'practice-isolate': cite('common practice', PRACTICE, 'isolating, keys, earth and braking'),
  'practice-sparks': cite('common practice', PRACTICE, 'sparks and burning dusts'),
  'practice-hands': cite('common practice', PRACTICE, 'hands, gloves and sleeves'),
  'practice-lathe': cite('common practice', PRACTICE, 'keeping grit off the lathe'),
  'practice-dial': cite('common practice', PRACTICE, 'infeed in whole or half divisions'),
  'practice-schedule': cite('common practice', PRACTICE, 'rough, spark out, measure, finish'),
  'practice-scale': cite('common practice', PRACTICE, "reading of the compound's scale"),
  'practice-crank': cite('common practice', PRACTICE, 'hand feed of one crank turn a second'),
} satisfies Record<string, Source>;

const MEMORIES = {
  'osha-1910-215-d2': cite('memory', OSHA, '(d)(2), arbor size'),
  'memory-quill-share': cite('memory', RECALLED, 'share of the first bending frequency'),
  'memory-materials': cite('memory', RECALLED, 'cast iron and stainless as annealed steel'),
  'memory-speed-ratio': cite('memory', RECALLED, 'speed ratio 60 to 120'),
  'memory-traverse-share': cite('memory', RECALLED, 'traverse on a tool-post grinder'),
  'memory-post-stiffness': cite('memory', RECALLED, 'stiffness of post and slides'),
  'memory-force-ratio': cite('memory', RECALLED, 'tangential over normal force'),
  'memory-grinding-ratio': cite('memory', RECALLED, 'grinding ratio of small dry wheels'),
  'memory-chip-thickness': cite('memory', RECALLED, 'equivalent chip and specific removal'),
  'memory-dress-overlap': cite('memory', RECALLED, 'overlap ratio of dressing'),
  'memory-tip-radius': cite('memory', RECALLED, 'tip radius of a dressing diamond'),
  'memory-quill-material': cite('memory', RECALLED, 'steel and carbide, modulus and density'),
  'memory-wheel-density': cite('memory', RECALLED, 'density of a vitrified wheel'),
  'memory-expansion': cite('memory', RECALLED, 'expansion of steel'),
  'memory-mandrel-grip': cite('memory', RECALLED, 'mounted wheel gripped 10 mm or more'),
  'memory-finish-stock': cite('memory', RECALLED, 'finish stock and lag limit'),
  'memory-energy-assumed': cite('memory', RECALLED, 'specific energy of materials without a row'),
  'memory-grade-words': cite('memory', RECALLED, 'soft, medium and hard grades', {
    note: 'One of several published splits.',
  }),
  'malkin-burn': cite('memory', MALKIN, 'burning threshold'),
  'groover-problem': cite('memory', GROOVER, 'ch. 24, end-of-chapter problems'),
  'kalpakjian-contact': cite('memory', KALPAKJIAN, 'worked example, contact length'),
} satisfies Record<string, Source>;

/** The registry: law, standard, handbook, textbook, derived, common practice, memory, entered. */
export const SOURCES = {
  ...LAWS,
  ...STANDARDS,
  ...HANDBOOKS,
  ...TEXTBOOKS,
  ...DERIVATIONS,
  ...PRACTICES,
  ...MEMORIES,
  entered: cite('entered', 'As entered by the shop', 'the setup, its machines and its wheel'),
} satisfies Record<string, Source>;

export type SourceId = keyof typeof SOURCES;
