import { clearanceFindings } from '@/shared/rules/clearance';
import { guardFindings } from '@/shared/rules/guard';

import { BORE_GRINDER, QUILL, SHAFT_GRINDER, SMALL_WHEEL } from '../../support/plan-inputs';

const guard = (over: Partial<Parameters<typeof guardFindings>[0]>) =>
  guardFindings({
    kind: 'bore',
    grinder: BORE_GRINDER,
    shieldFitted: false,
    overrunMm: 4,
    widthMm: 12,
    ...over,
  }).map(({ code, level }) => `${level} ${code}`);

describe('the guard', () => {
  it('is asked for in outside work, and no shield takes its place', () => {
    expect(guard({ kind: 'outside', grinder: SHAFT_GRINDER })).toEqual([]);
    expect(guard({ kind: 'outside', shieldFitted: true })).toEqual(['stop guard-missing']);
    expect(guard({ kind: 'outside', grinder: null })).toEqual([]);
  });

  it('is the bore itself, as long as the wheel does not leave it', () => {
    expect(guard({ overrunMm: 11.99 })).toEqual([]);
    expect(guard({ overrunMm: 12 })).toEqual(['stop wheel-leaves-work']);
    expect(guard({ overrunMm: 12, shieldFitted: true })).toEqual([]);
  });

  it('is missing between jaws until a shield stands', () => {
    expect(guard({ kind: 'jaws' })).toEqual(['check jaws-open']);
    expect(guard({ kind: 'jaws', shieldFitted: true })).toEqual([]);
    expect(guard({ kind: 'jaws', overrunMm: 12 })).toEqual(['stop wheel-leaves-work']);
  });
});

const inside = {
  boreMm: 40,
  lengthMm: 30,
  overrunMm: 4,
  clearDepthMm: 20,
  wheel: SMALL_WHEEL,
  quill: QUILL,
};
const room = (over: Partial<Parameters<typeof clearanceFindings>[0]>) =>
  clearanceFindings({ ...inside, ...over }).map(({ code, level }) => `${level} ${code}`);
const quill = (...segments: [lengthMm: number, diameterMm: number][]) => ({
  ...QUILL,
  segments: segments.map(([lengthMm, diameterMm]) => ({ lengthMm, diameterMm })),
});

describe('room inside', () => {
  it('is enough in an ordinary bore', () => {
    expect(room({})).toEqual([]);
  });

  it('lets the wheel go in, at half to nine tenths of the bore', () => {
    expect(room({ boreMm: 27 })).toEqual(['stop wheel-fills-bore']);
    expect(room({ boreMm: 27.1 })).toEqual(['note wheel-large-for-bore']);
    expect(room({ boreMm: 30 })).toEqual([]);
    expect(room({ boreMm: 54 })).toEqual([]);
    expect(room({ boreMm: 54.1 })).toEqual(['note wheel-small-for-bore']);
  });

  it('asks for length, overrun and five millimetres of quill', () => {
    expect(room({ quill: quill([39, 16]) })).toEqual([]);
    expect(room({ quill: quill([38.9, 16]) })).toEqual(['check quill-reach-tight']);
    expect(room({ quill: quill([33.9, 16]) })).toEqual(['stop quill-too-short']);
  });

  it('keeps the quill thinner than the wheel as far as it goes in', () => {
    expect(room({ quill: quill([60, 27]) })).toEqual(['stop quill-thicker-than-wheel']);
    expect(room({ quill: quill([60, 25.1]) })).toEqual(['check quill-tight']);
    expect(room({ quill: quill([34, 16], [30, 40]) })).toEqual([]);
    expect(room({ quill: quill([33, 16], [30, 40]) })).toEqual(['stop quill-thicker-than-wheel']);
  });

  it('holds overrun and nut behind the surface', () => {
    expect(room({ clearDepthMm: 10 })).toEqual([]);
    expect(room({ clearDepthMm: 9.9 })).toEqual(['check little-room-behind']);
    expect(room({ clearDepthMm: 3.9 })).toEqual(['stop no-room-behind']);
    expect(room({ clearDepthMm: null })).toEqual([]);
  });

  it('is not judged from what is unknown', () => {
    expect(
      room({ boreMm: null, lengthMm: null, overrunMm: null, clearDepthMm: null, quill: null }),
    ).toEqual([]);
  });
});
