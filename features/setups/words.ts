import type { Material } from '@/shared/domain/materials';
import type {
  Holding,
  Operation,
  PassStrokes,
  Preload,
  SetupPart,
  SetupState,
  Shoulders,
  Side,
  TaperGiven,
  TaperMethod,
} from '@/shared/domain/setups';

export const OPERATION_WORDS: Record<Operation, string> = {
  jaws: 'Chuck jaws',
  bore: 'Bore',
  outside: 'Outside cylinder',
  taper: 'Taper or centre',
};

/** The name a setup starts with. */
export const OPERATION_NAMES: Record<Operation, string> = {
  jaws: 'True the jaws',
  bore: 'Grind a bore',
  outside: 'Grind a shaft',
  taper: 'Grind a taper',
};

export const PART_WORDS: Record<SetupPart, string> = {
  work: 'Work',
  machine: 'Machine',
  wheel: 'Wheel',
  cut: 'Cut',
  dress: 'Dress',
};

export const MATERIAL_WORDS: Record<Material, string> = {
  'plain-carbon-annealed': 'Plain carbon steel, soft',
  'plain-carbon-hardened': 'Plain carbon steel, hardened',
  'alloy-annealed': 'Alloy steel, soft',
  'alloy-hardened': 'Alloy steel, hardened',
  'tool-annealed': 'Tool steel, soft',
  'tool-hardened': 'Tool steel, hardened',
  'cast-iron': 'Cast iron',
  stainless: 'Stainless steel',
  'copper-alloy': 'Brass, bronze, copper',
  'aluminium-alloy': 'Aluminium alloy',
};

export const HOLDING_WORDS: Record<Holding, string> = {
  chuck: 'Chuck alone',
  'spindle taper': 'In the taper of the spindle',
  'chuck and centre': 'Chuck and tailstock centre',
  centres: 'Between centres',
  'chuck and steady': 'Chuck and steady',
};

export const PRELOAD_WORDS: Record<Preload, string> = {
  ring: 'Ring gripped outside the pads',
  plug: 'Plug behind the pads',
  spider: 'Spider between the jaws',
};

/** Where four operations stand side by side. */
export const OPERATION_SHORT: Record<Operation, string> = {
  jaws: 'Jaws',
  bore: 'Bore',
  outside: 'Outside',
  taper: 'Taper',
};

export const SIDE_WORDS: Record<Side, string> = { outside: 'Outside', inside: 'Inside' };

export const TAPER_METHOD_WORDS: Record<TaperMethod, string> = {
  compound: 'Compound slide',
  tailstock: 'Tailstock',
};

export const TAPER_GIVEN_WORDS: Record<TaperGiven, string> = {
  angle: 'Angle',
  'small end': 'Small end',
  taper: 'Taper',
};

export const SHOULDER_WORDS: Record<Shoulders, string> = {
  none: 'None',
  'one end': 'At one end',
  'both ends': 'At both ends',
};

export const STROKE_WORDS: Record<PassStrokes, string> = {
  'one stroke': 'One stroke',
  'both strokes': 'There and back',
};
export const STATE_WORDS: Record<SetupState, string> = {
  draft: 'Draft',
  'for review': 'For review',
  cleared: 'Cleared',
  retired: 'Retired',
};

export { LOOK_WORDS, MARKING_PLACE_WORDS, RING_WORDS } from '@/features/wheels';
