import { fireEvent, screen, within } from '@testing-library/react';

import {
  boreInput,
  jawsInput,
  outsideInput,
  withCut,
  withWork,
} from '@/__tests__/support/plan-inputs';
import { FromReadings } from '@/features/setups/components/from-readings';
import { LearnedFraction } from '@/features/setups/components/learned-fraction';
import { TypedWheelFields } from '@/features/setups/components/typed-wheel-fields';
import { WheelMarks } from '@/features/setups/components/wheel-marks';
import { differences } from '@/features/setups/differences';
import type { PlanInput } from '@/shared/domain/setups';

import { plannedValues, showInPlanner } from '../../../support/in-planner';
import { openAddress } from '../../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../../support/router'));

const button = (name: string | RegExp) => screen.getByRole('button', { name });
const press = (name: string | RegExp) => fireEvent.click(button(name));
const type = (label: string, text: string) =>
  fireEvent.change(screen.getByLabelText(label, { selector: 'input, textarea' }), {
    target: { value: text },
  });

beforeEach(() => {
  window.localStorage.clear();
  openAddress({ setupId: 'one' });
});

describe('run-out from readings', () => {
  const READINGS = '0.06\n0.02\n-0.02\n0.02';

  it('goes into the chosen plane of jaws with its high spot, as if typed', () => {
    showInPlanner(<FromReadings />, jawsInput());
    press('From indicator readings');
    fireEvent.click(screen.getByRole('radio', { name: /^Far, at 100.mm$/ }));
    type('Readings', READINGS);
    press(/^Use 0.08 mm at 0°$/);
    const { inputs, texts } = plannedValues();
    expect(inputs.work.farRunOutMm).toBeCloseTo(0.08, 9);
    expect(inputs.work.farHighSpotDeg).toBe(0);
    expect(texts['work.farRunOutMm']).toBe('0.08');
    expect(inputs.work.nearRunOutMm).toBe(0.1);
  });

  it('goes into the run-out of a bore: all that its circle runs out, which is more than was read', () => {
    showInPlanner(<FromReadings />, boreInput());
    press('From indicator readings');
    type('Readings', '0.06; 0.02; -0.02; 0.04');
    // Offset 0.04 and 0.01: the circle runs out by 2 √(0.04² + 0.01²) = 0.0825, the readings by 0.08.
    press(/^Use 0.083 mm$/);
    expect(plannedValues().inputs.work.runOutMm).toBeCloseTo(0.083, 9);
    expect(plannedValues().texts).toEqual({ 'work.runOutMm': '0.083' });
  });
});

describe('the cut fraction of a run', () => {
  const open = (input: PlanInput) => {
    showInPlanner(<LearnedFraction />, input);
    press(/^Cut fraction from a run/);
    press('From sizes of a spark-out');
  };
  const figure = (label: string) => button(new RegExp(`^${label}`)).textContent ?? '';

  it('is observed, offered beside the computed one, and planned with only when asked', () => {
    open(boreInput());
    type('Sizes, on diameter', '40.100; 40.120; 40.130; 40.135');
    expect(figure('Cut fraction observed')).toContain('0.5');
    expect(figure('Finish, with it')).toContain('0.5');
    expect(plannedValues().inputs.cut.softnessPerMm).toBeNull();
    press('Plan with it');
    expect(plannedValues().inputs.cut.softnessPerMm).toBeGreaterThan(0);
    expect(button(/^Cut fraction from a run: learned, 0.5$/)).toBeInTheDocument();
    press('Back to the computed value');
    expect(plannedValues().inputs.cut.softnessPerMm).toBeNull();
    expect(button(/^Cut fraction from a run: computed/)).toBeInTheDocument();
  });

  it.each([
    ['40.1; 40.12', /Three sizes or more/],
    ['40.1; 40.102; 40.103', /three steps of the gauge/],
    ['40.1; 40.12; 40.15', /do not shrink/],
    ['40.15; 40.12; 40.1', /do not shrink/],
  ])('is not guessed from %s', (sizes, words) => {
    open(boreInput());
    type('Sizes, on diameter', sizes);
    expect(screen.getByText(words)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Plan with it' })).toBeNull();
  });

  it('says what is missing when the plan has no speeds yet', () => {
    open({ ...boreInput(), lathe: null });
    type('Sizes, on diameter', '40.100; 40.120; 40.130');
    expect(screen.getByText(/are still missing/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Plan with it' })).toBeNull();
  });

  it('teaches nothing where the wheel plunges', () => {
    open(withWork(outsideInput(), { lengthMm: 10 }));
    expect(screen.getByText(/the wheel plunges/)).toBeInTheDocument();
    expect(screen.queryByLabelText('Sizes, on diameter')).toBeNull();
  });

  it('is one of the differences between two versions', () => {
    showInPlanner(<LearnedFraction />, withCut(boreInput(), { softnessPerMm: 120 }));
    const learned = plannedValues();
    const computed = {
      ...learned,
      inputs: { ...learned.inputs, cut: { ...learned.inputs.cut, softnessPerMm: null } },
    };
    expect(differences(learned, computed)).toEqual([
      {
        path: 'cut.softnessPerMm',
        label: 'Softness learned from runs',
        mine: '120',
        theirs: 'empty',
      },
    ]);
  });
});

describe('the marks of the wheel', () => {
  it('stand beside the marks the handbook recommends, with points and reasons', () => {
    showInPlanner(<WheelMarks />, boreInput());
    expect(button('What the marking says: A 60 K 7 V')).toBeInTheDocument();
    press('Marks the handbook recommends for this work: A 60 L V');
    const list = within(screen.getByRole('list', { name: 'Recommended marks' }));
    expect(list.getByText('Tool steel, hardened, in a bore or jaws')).toBeInTheDocument();
    expect(list.getByText('95')).toBeInTheDocument();
    expect(screen.getByText(/The grade is softer than recommended\./)).toBeInTheDocument();
    expect(screen.getByText(/Machinery's Handbook, p\. 1317/)).toBeInTheDocument();
  });

  it('are not recommended before the material is known', () => {
    showInPlanner(<WheelMarks />, withWork(boreInput(), { material: null }));
    expect(screen.queryByRole('button', { name: /^Marks the handbook/ })).toBeNull();
  });

  it('of a typed wheel say which position does not fit, and keep it', () => {
    const typed = {
      marking: 'A 60 K 99 V',
      diameterNewMm: 28,
      diameterNowMm: null,
      widthMm: 12,
      holeMm: 8,
      markedRpm: 22000,
      markedSpeedMPerS: null,
      markingReadOn: null,
      looked: null,
      rung: null,
    };
    showInPlanner(
      <>
        <TypedWheelFields />
        <WheelMarks />
      </>,
      { ...boreInput(), wheel: { wheelId: null, typed } },
    );
    const field = screen.getByLabelText('Marking', { selector: 'input' });
    expect(field).toHaveValue('A 60 K 99 V');
    expect(field).toHaveAccessibleDescription(/At “99 V” the structure is expected/);
    expect(button('What the marking says: structure not read')).toBeInTheDocument();
    press(/^Marks the handbook recommends/);
    expect(screen.getByText(/does not read, so it cannot be compared/)).toBeInTheDocument();
    type('Marking', 'A 60 L 8 V');
    expect(button('What the marking says: A 60 L 8 V')).toBeInTheDocument();
    expect(screen.getByText('100')).toBeInTheDocument();
  });
});
