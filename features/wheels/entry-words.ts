import type { WheelEntryView, WheelLife } from '@/shared/contracts/wheel-entries';
import type { UnitSystem } from '@/shared/domain/people';
import type { Signer, WheelStep } from '@/shared/domain/wheel-life';
import type { LookResult, RingResult } from '@/shared/domain/wheels';
import { formatQuantity } from '@/shared/units/format';

const LOOKED: Record<LookResult, string> = { sound: 'no fault seen', damaged: 'damaged' };
const RANG: Record<RingResult, string> = {
  clear: 'rings clear',
  dull: 'dull',
  silent: 'does not ring',
};

export const SIGNER_WORDS: Record<Signer, string> = {
  skilled: 'a lead or a machinist',
  appointed: 'an appointed person',
};

export interface EntryReader {
  units: UnitSystem;
  spindles: WheelLife['spindles'];
  entries: readonly WheelEntryView[];
}

/** "Short arbor, outside grinder": where a wheel was mounted, as far as the shop still has it. */
function spindleWords(quillId: string | null, spindles: WheelLife['spindles']): string {
  const spindle = spindles.find((one) => one.quillId === quillId);
  return spindle ? `${spindle.quillName}, ${spindle.grinderName}` : 'a spindle no longer recorded';
}

/** What happened in one entry, in a line. */
export function entryWords(step: WheelStep, reader: EntryReader): string {
  const { units } = reader;
  const length = (value: number) => formatQuantity({ value, unit: 'mm' }, units);
  const minutes = (value: number) => formatQuantity({ value, unit: 'min' }, units);
  const measured = (value: number | null) => (value === null ? '' : `, ${length(value)} measured`);
  switch (step.kind) {
    case 'received':
      return `Received, ${length(step.diameterMm)}`;
    case 'inspected':
      return `Close look: ${LOOKED[step.look]}${measured(step.diameterMm)}`;
    case 'ring test':
      return `Ring test: ${RANG[step.ring]}`;
    case 'mounted':
      return `Mounted on ${spindleWords(step.quillId, reader.spindles)}`;
    case 'trial run': {
      const rpm = formatQuantity({ value: step.spindleRpm, unit: 'rpm' }, units);
      return `Trial run, ${minutes(step.minutes)} at ${rpm}`;
    }
    case 'dressed':
      return `Dressed, ${step.passes} × ${length(step.depthMm)}`;
    case 'used':
      return `Used${step.minutes === null ? '' : `, ${minutes(step.minutes)}`}${measured(step.diameterMm)}`;
    case 'taken off':
      return 'Taken off';
    case 'set aside':
      return `Set aside: ${step.reason}`;
    case 'returned':
      return 'Returned to the rack';
    case 'scrapped':
      return `Scrapped: ${step.reason}`;
    case 'countersigned':
      return `Signed for ${pointer(step.entryId, reader)}`;
    case 'correction':
      return `Takes back ${pointer(step.entryId, reader)}: ${step.reason}`;
  }
}

/** "no. 5, Dressed, 2 × 0.02 mm", or less where it stands on a page not fetched yet. */
function pointer(entryId: string, reader: EntryReader): string {
  const entry = reader.entries.find(({ id }) => id === entryId);
  if (!entry) return 'an earlier entry';
  return `no.\u00a0${entry.number}, ${entryWords(entry.step, reader).toLowerCase()}`;
}
