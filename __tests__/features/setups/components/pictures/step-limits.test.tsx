import { fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { jawsInput } from '@/__tests__/support/plan-inputs';
import { StepLimits } from '@/features/setups/components/pictures/step-limits';
import {
  limitWords,
  lockedBecause,
  stepRpm,
} from '@/features/setups/components/pictures/step-words';
import { planSetup, type BeltStepPlan, type Plan, type SpeedLimit } from '@/shared/rules';

const NBSP = '\u00a0';

/** The marked rpm is 22 000: the third step of the invented grinder turns faster than that at no load. */
const input = { ...jawsInput(), quill: null };
const plan = planSetup({
  ...input,
  wheelData: input.wheelData && { ...input.wheelData, markedRpm: 16_000 },
});
const rows = () => screen.getAllByRole('radio');

describe('belt steps as the control', () => {
  it('are rows with name, rpm and rim speed, under the limit that governs', () => {
    render(<StepLimits speed={plan.speed} limits={plan.limits} units="mm" onChoose={jest.fn()} />);
    const group = screen.getByRole('radiogroup', { name: 'Belt step' });
    expect(within(group).getAllByRole('radio')).toHaveLength(3);
    expect(screen.getByText(/^limit 16.000.rpm, by the marking$/)).toBeVisible();
    expect(rows()[1]).toHaveAccessibleName(/^B, 15.546.rpm, 22\.0.m\/s$/);
    expect(rows()[1]).toBeChecked();
  });

  it('show rim speed in feet per minute to those who read inches', () => {
    render(
      <StepLimits speed={plan.speed} limits={plan.limits} units="inch" onChoose={jest.fn()} />,
    );
    expect(rows()[1]).toHaveAccessibleName(/4.326.ft\/min/);
  });

  it('choose a step that breaks no limit', async () => {
    const onChoose = jest.fn();
    render(<StepLimits speed={plan.speed} limits={plan.limits} units="mm" onChoose={onChoose} />);
    await userEvent.click(rows()[0] as HTMLElement);
    expect(onChoose.mock.calls).toEqual([['a']]);
  });

  it('lock a step above the limit out, with the reason in its row', async () => {
    const onChoose = jest.fn();
    render(<StepLimits speed={plan.speed} limits={plan.limits} units="mm" onChoose={onChoose} />);
    const locked = rows()[2] as HTMLElement;
    expect(locked).toHaveAccessibleName(
      /^C, 21.375.rpm, 30\.2.m\/s\. Locked out: 21.375.rpm is above the wheel’s 16.000\.$/,
    );
    fireEvent.click(locked);
    await userEvent.tab();
    await userEvent.keyboard('{ArrowDown} ');
    expect(locked).toHaveFocus();
    expect(onChoose).not.toHaveBeenCalled();
  });

  it('are only read where nothing may be chosen', () => {
    render(<StepLimits speed={plan.speed} limits={plan.limits} units="mm" />);
    for (const row of rows()) expect(row).toHaveAttribute('aria-disabled', 'true');
    expect(rows()[0]).not.toHaveAccessibleName(/Locked out/);
  });
});

const figure = (value: number | null, unit: 'rpm' | 'm/s') => ({
  value,
  unit,
  working: { formula: '', terms: [], source: 'derived-jaw-contact' as const },
});
const step = (rpm: number, allowed: boolean | null): BeltStepPlan => ({
  id: 'e',
  name: 'E',
  rpm: figure(rpm, 'rpm'),
  expectedRpm: figure(rpm, 'rpm'),
  wheelSpeed: figure(null, 'm/s'),
  allowed,
  actsSoft: false,
});
const limit = (kind: SpeedLimit['kind'], rpm: number): SpeedLimit => ({
  kind,
  rpm: figure(rpm, 'rpm'),
});

describe('the words of a lock', () => {
  it('never read as equal: the step is rounded up, the limit down', () => {
    const close = step(14_920.4, false);
    expect(stepRpm(close, 'mm')).toBe(`14${NBSP}921${NBSP}rpm`);
    expect(lockedBecause(close, limit('marked rpm', 14_920.3), 'mm')).toBe(
      `Locked out: 14${NBSP}921${NBSP}rpm is above the wheel’s 14${NBSP}920.`,
    );
  });

  it.each([
    ['quill marked', 'the quill’s'],
    ['quill bending', 'the quill’s'],
    ['grinder spindle', 'the grinder’s'],
    ['maker, mounted', 'its maker’s'],
  ] as const)('name whose limit it is: %s', (kind, whose) => {
    expect(lockedBecause(step(9000, false), limit(kind, 8000), 'mm')).toContain(`above ${whose} 8`);
  });

  it('say that an unmarked wheel does not run', () => {
    expect(lockedBecause(step(100, false), limit('unmarked', 0), 'mm')).toBe(
      'Locked out: an unmarked wheel does not run.',
    );
  });

  it('are silent while no limit is known', () => {
    const limits: Plan['limits'] = { governing: null, all: [] };
    expect(lockedBecause(step(9000, null), limits.governing, 'mm')).toBeNull();
    expect(limitWords(limits.governing, 'mm')).toBe('limit not known yet');
  });
});
