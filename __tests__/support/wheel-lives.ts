import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import type { WheelEntry, WheelStep } from '@/shared/domain/wheel-life';
import type { WheelRecord } from '@/shared/domain/wheels';
import { foldWheelLife } from '@/shared/rules/wheel-life';
import type { StepCase } from '@/shared/rules/wheel-steps';

import { ARBOR, SHAFT_GRINDER, TODAY } from './plan-inputs';

export const RECORD: WheelRecord = {
  marking: 'A 60 L 7 V',
  shape: '1',
  diameterNewMm: 125,
  widthMm: 16,
  holeMm: 20,
  markedRpm: 5345,
  markedSpeedMPerS: 35,
  markingReadOn: 'blotter',
  mounted: null,
  smallestUsableMm: 80,
  madeOn: null,
  expiresOn: null,
  place: 'Peg 3',
  notes: null,
};

type Extra = Partial<Omit<WheelEntry, 'step'>>;

/** One entry of a wheel's life, as the server would number it. */
export const entry = (number: number, step: WheelStep, extra: Extra = {}): WheelEntry => ({
  id: `entry-${number}`,
  number,
  personId: 'lead',
  happenedOn: TODAY,
  needs: null,
  step,
  ...extra,
});

/** Entries in the order given, one number after the other. */
export const lifeOf = (...steps: (WheelStep | [WheelStep, Extra])[]): WheelEntry[] =>
  steps.map((step, index) =>
    Array.isArray(step) ? entry(index + 1, ...step) : entry(index + 1, step),
  );

export const RECEIVED: WheelStep = { kind: 'received', diameterMm: 125 };
export const SOUND: WheelStep = { kind: 'inspected', look: 'sound', diameterMm: null };
export const CLEAR: WheelStep = { kind: 'ring test', ring: 'clear' };
export const MOUNTED: WheelStep = { kind: 'mounted', grinderId: 'grinder', quillId: 'arbor' };
export const TRIAL_RUN: WheelStep = { kind: 'trial run', minutes: 3, spindleRpm: 5000 };
export const DRESSED: WheelStep = { kind: 'dressed', depthMm: 0.02, passes: 5 };
export const USED: WheelStep = { kind: 'used', minutes: 20, diameterMm: null };
export const TAKEN_OFF: WheelStep = { kind: 'taken off' };
export const SET_ASIDE: WheelStep = { kind: 'set aside', reason: 'A chip at the edge' };
export const RETURNED: WheelStep = { kind: 'returned' };
export const SCRAPPED: WheelStep = { kind: 'scrapped', reason: 'Worn out' };

export const READY = [RECEIVED, SOUND, CLEAR];
export const RUNNING = [...READY, MOUNTED, TRIAL_RUN];

/** A lead who is appointed for everything, with a wheel of this life in front of them. */
export const caseOf = (entries: readonly WheelEntry[], extra: Partial<StepCase> = {}): StepCase => {
  const wheel = extra.wheel ?? RECORD;
  return {
    wheel,
    entries,
    standing: foldWheelLife(wheel, entries),
    actor: { personId: 'lead', role: 'lead', tasks: ['mount', 'dress', 'trial run'] },
    today: TODAY,
    happenedOn: TODAY,
    rules: DEFAULT_SHOP_RULES,
    spindle: { grinder: SHAFT_GRINDER, quill: ARBOR },
    ...extra,
  };
};
