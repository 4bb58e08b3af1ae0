import type {
  CompoundZero,
  DialReading,
  Guard,
  QuillMaterial,
  Rotation,
  SpindleNose,
  ThreadHand,
} from '@/shared/domain/machines';

export const DIAL_WORDS: Record<DialReading, string> = {
  radius: 'radius',
  diameter: 'diameter',
};

export const COMPOUND_ZERO_WORDS: Record<CompoundZero, string> = {
  'cross-slide': 'along the cross-slide',
  'spindle-axis': 'along the spindle',
};

export const NOSE_WORDS: Record<SpindleNose, string> = {
  threaded: 'Threaded',
  locked: 'Locked: cams, studs or bayonet',
};

export const GUARD_WORDS: Record<Guard, string> = {
  none: 'No guard',
  fixed: 'Fixed guard, at most half of the wheel open',
};

export const ROTATION_WORDS: Record<Rotation, string> = {
  clockwise: 'Clockwise',
  anticlockwise: 'Anticlockwise',
};

export const MATERIAL_WORDS: Record<QuillMaterial, string> = {
  steel: 'Steel',
  carbide: 'Carbide',
};

export const THREAD_WORDS: Record<ThreadHand, string> = {
  right: 'Right-hand',
  left: 'Left-hand',
  none: 'None: a collet grips a mandrel',
};
