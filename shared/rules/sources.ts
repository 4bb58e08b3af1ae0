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

/** Writes the references of one mark: title, place, and edition or note where there is one. */
function marked(mark: SourceMark) {
  return (title: string, place: string, extra?: Extra): Source => ({
    title,
    place,
    mark,
    ...extra,
  });
}

const law = marked('law');
const standard = marked('standard');
const handbook = marked('handbook');
const textbook = marked('textbook');
const derived = marked('derived');
const practice = marked('common practice');
const memory = marked('memory');
const entered = marked('entered');

const LAWS = {
  'osha-1910-215-a1': law(OSHA, '(a)(1), guards'),
  'osha-1910-215-d1': law(OSHA, '(d)(1), inspection, ring test and spindle speed'),
  'cal-t8-3579': law(CALIFORNIA, 's. 3579, flanges'),
  'cal-t8-3580': law(CALIFORNIA, 's. 3580, speed and mounting'),
  'wac-296-806-40506': law(WASHINGTON, '40506, guards'),
  'wac-296-806-40512': law(WASHINGTON, '40512, speed'),
  'wac-296-806-40516': law(WASHINGTON, '40516, flanges'),
  'wac-296-806-40524': law(WASHINGTON, '40524, blotters'),
  'miosha-408-10113': law(MICHIGAN, 'R 408.10113, ring test'),
  'miosha-408-10174': law(MICHIGAN, 'R 408.10174, spindle speed'),
  'hk-59l-5-3': law(HONG_KONG, 'reg. 5(3), worn wheels', {
    note: 'Lets a worn wheel turn faster; kept for comparison only, never offered.',
  }),
  'hk-59l-7': law(HONG_KONG, 'reg. 7, appointed persons'),
  'japan-36': law(JAPAN, 'art. 36, training'),
  'japan-118': law(JAPAN, 'art. 118, trial run'),
  'dguv-100-500': law('DGUV Regel 100-500 (Germany)', 'ch. 2.25 s. 3.1.2, worn wheels'),
  'bgv-d12-12': law('BGV D12, Schleif- und Bürstwerkzeuge (Germany)', 's. 12, trial run'),
  'osha-letter-2009-10-08': law('OSHA letter of interpretation', '8 October 2009, hot work'),
  'osha-cobalt': law('OSHA and NIOSH pages on cobalt', 'limits 0.1 and 0.05 mg/m3'),
  'osha-oil-mist': law('OSHA page on mineral oil mist', 'limit 5 mg/m3'),
} satisfies Record<string, Source>;

const STANDARDS = {
  'ansi-b7-1-2000-2-3': standard(ANSI_B7_1, 's. 2.3, storage', { edition: '2000' }),
  'ansi-b7-1-2000-7-1-1': standard(ANSI_B7_1, 's. 7.1.1, speed', { edition: '2000' }),
  'ansi-b7-1-2000-10-1': standard(ANSI_B7_1, 's. 10.1, mounted wheels', {
    edition: '2000',
  }),
  'ansi-b7-1-2010-5-1': standard(ANSI_B7_1, 's. 5.1, flanges', { edition: '2010' }),
  'ansi-b74-13': standard('ANSI B74.13, Markings for Identifying Wheels', 'marking system'),
  'iso-525': standard('ISO 525, Bonded abrasive products', 'designation and marking'),
  'iso-1101': standard('ISO 1101, Geometrical tolerancing', 'circular run-out'),
  'iso-12181': standard('ISO 12181, Roundness', 'least-squares circle'),
  'iso-3089': standard('ISO 3089, Self-centring manual chucks', 'test torque'),
  'nist-sp-811': standard('NIST Special Publication 811', 'app. B, conversion factors', {
    note: 'The inch is 25.4 mm exactly, the foot 0.3048 m, the pound 0.45359237 kg.',
  }),
  'us-ordnance-od-1645': standard('US Army Ordnance OD 1645', 'p. 32, scroll chucks'),
} satisfies Record<string, Source>;

const HANDBOOKS = {
  'mh31-1303': handbook(HANDBOOK, 'p. 1303, diamonds for truing', { edition: '31st' }),
  'mh31-1317': handbook(HANDBOOK, 'p. 1317, wheel markings', { edition: '31st' }),
  'mh31-1318': handbook(HANDBOOK, 'p. 1318, cylindrical grinding', {
    edition: '31st',
    note: 'The columns were garbled in the copy read; fractions follow the standard layout.',
  }),
  'tc9-524-5': handbook(ARMY_TC, 'ch. 5, grinding on the lathe'),
  'tc9-524-7': handbook(ARMY_TC, 'ch. 7, truing and dressing'),
  'dguv-209-002': handbook('DGUV Information 209-002 (Germany)', 'resin-bonded wheels: expiry'),
  ccohs: handbook('Canadian Centre for Occupational Health and Safety', 'grinding wheels'),
  'modern-grinding-dressing': handbook(MODERN_GRINDING, 'Dresser overlays'),
  'trade-association-coolant': handbook("Abrasive makers' association list", 'coolant'),
  lautard: handbook("Lautard, The Machinist's Bedside Reader", 'compound for tenths'),
  jones: handbook(JONES, 'cutting speeds'),
  'jones-setover': handbook(JONES, 'setting over the tailstock'),
  'navy-14345': handbook('US Navy training course 14345', 'taper turning'),
  colvin: handbook('Colvin, Turning and Boring Tapers', 'table of tapers'),
  'wood-turning': handbook('A Course in Wood Turning', 'pulleys'),
} satisfies Record<string, Source>;

const TEXTBOOKS = {
  'groover-24': textbook(GROOVER, 'ch. 24, grinding'),
  'groover-24-diamond': textbook(GROOVER, 'ch. 24, diamond and cBN wheels'),
  'khurmi-33': textbook('Khurmi, A Textbook of Engineering Mechanics', 'ch. 33, belts'),
  'kalpakjian-energy': textbook(KALPAKJIAN, 'table of specific energy in grinding'),
  'kalpakjian-force': textbook(KALPAKJIAN, 'worked example, forces in grinding'),
  'marinescu-18': textbook(
    'Marinescu et al., Handbook of Machining with Grinding Wheels',
    'ch. 18, spark-out',
  ),
  'nptel-rotor-2-9': textbook('NPTEL, Theory and Practice of Rotor Dynamics', 'ex. 2.9'),
  'mpe-2017-1568019': textbook(
    'Mathematical Problems in Engineering 2017, 1568019',
    'table 1, beam with a tip mass',
  ),
} satisfies Record<string, Source>;

const DERIVATIONS = {
  'derived-geometry': derived(DERIVED, 'geometry and trigonometry'),
  'derived-worst-rpm': derived(DERIVED, 'slip and belt thickness only ever slow a spindle'),
  'derived-least-squares': derived(DERIVED, 'least squares of an offset circle'),
  'derived-jaw-contact': derived(DERIVED, 'wheel circle against offset pads'),
  'derived-round-clean-up': derived(DERIVED, 'clean-up stock of round work'),
  'derived-contact-length': derived(DERIVED, 'contact of wheel and work'),
  'derived-wheel-wear': derived(DERIVED, 'wheel wear per pass from the grinding ratio'),
  'derived-dressing': derived(DERIVED, 'diamond tip on the wheel'),
  'derived-spring': derived(DERIVED, 'infeed against spring, pass by pass', {
    note: 'Theory in Malkin and Guo, and in King and Hahn.',
  }),
  'derived-beam': derived(DERIVED, 'bending of a stepped cantilever'),
  'derived-directions': derived(DERIVED, 'directions of turning at the contact'),
  'derived-taper': derived(DERIVED, 'geometry of cones'),
  'derived-centre-height': derived(DERIVED, 'wheel off centre height'),
  'derived-shims': derived(DERIVED, 'fewest shims to a height'),
  'derived-units': derived(DERIVED, 'a figure 25 times off beside its neighbours'),
  'derived-time': derived(DERIVED, 'travel over feed, pass by pass'),
} satisfies Record<string, Source>;

const PRACTICES = {
  'practice-interrupted': practice(PRACTICE, 'interrupted work starts gently'),
  'practice-overrun': practice(PRACTICE, 'overrun a third of the wheel width'),
  'practice-jaw-clean-up': practice(PRACTICE, 'truing three-jaw chucks'),
  'practice-jaw-preload': practice(PRACTICE, 'jaws ground under preload'),
  'practice-bore-wheel': practice(PRACTICE, 'bore wheel 0.5 to 0.9 of the bore'),
  'practice-clearance': practice(PRACTICE, 'one full stroke by hand, power off'),
  'practice-rotation': practice(PRACTICE, 'rotation, noses and threads'),
  'practice-holding': practice(PRACTICE, 'holding and preload'),
  'practice-isolate': practice(PRACTICE, 'isolating, keys, earth and braking'),
  'practice-sparks': practice(PRACTICE, 'sparks and burning dusts'),
  'practice-hands': practice(PRACTICE, 'hands, gloves and sleeves'),
  'practice-lathe': practice(PRACTICE, 'keeping grit off the lathe'),
  'practice-dial': practice(PRACTICE, 'infeed in whole or half divisions'),
  'practice-schedule': practice(PRACTICE, 'rough, spark out, measure, finish'),
  'practice-scale': practice(PRACTICE, "reading of the compound's scale"),
  'practice-crank': practice(PRACTICE, 'hand feed of one crank turn a second'),
} satisfies Record<string, Source>;

const MEMORIES = {
  'osha-1910-215-d2': memory(OSHA, '(d)(2), arbor size'),
  'memory-quill-share': memory(RECALLED, 'share of the first bending frequency'),
  'memory-materials': memory(RECALLED, 'cast iron and stainless as annealed steel'),
  'memory-speed-ratio': memory(RECALLED, 'speed ratio 60 to 120'),
  'memory-traverse-share': memory(RECALLED, 'traverse on a tool-post grinder'),
  'memory-post-stiffness': memory(RECALLED, 'stiffness of post and slides'),
  'memory-force-ratio': memory(RECALLED, 'tangential over normal force'),
  'memory-grinding-ratio': memory(RECALLED, 'grinding ratio of small dry wheels'),
  'memory-chip-thickness': memory(RECALLED, 'equivalent chip and specific removal'),
  'memory-dress-overlap': memory(RECALLED, 'overlap ratio of dressing'),
  'memory-dress-depth': memory(RECALLED, 'depth and passes of dressing'),
  'memory-tip-radius': memory(RECALLED, 'tip radius of a dressing diamond'),
  'memory-quill-material': memory(RECALLED, 'steel and carbide, modulus and density'),
  'memory-wheel-density': memory(RECALLED, 'density of a vitrified wheel'),
  'memory-expansion': memory(RECALLED, 'expansion of steel'),
  'memory-mandrel-grip': memory(RECALLED, 'mounted wheel gripped 10 mm or more'),
  'memory-finish-stock': memory(RECALLED, 'finish stock and lag limit'),
  'memory-energy-assumed': memory(RECALLED, 'specific energy of materials without a row'),
  'memory-grade-words': memory(RECALLED, 'soft, medium and hard grades', {
    note: 'One of several published splits.',
  }),
  'malkin-burn': memory(MALKIN, 'burning threshold'),
  'groover-problem': memory(GROOVER, 'ch. 24, end-of-chapter problems'),
  'kalpakjian-contact': memory(KALPAKJIAN, 'worked example, contact length'),
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
  entered: entered('As entered by the shop', 'the setup, its machines and its wheel'),
} satisfies Record<string, Source>;

export type SourceId = keyof typeof SOURCES;
