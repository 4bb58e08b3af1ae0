import { render, screen, within } from '@testing-library/react';

import { jawsInput } from '@/__tests__/support/plan-inputs';
import { InfeedPasses } from '@/features/setups/components/pictures/infeed-passes';
import {
  dialWords,
  groupName,
  groupPasses,
} from '@/features/setups/components/pictures/pass-groups';
import { planSetup, type Pass } from '@/shared/rules';

const pass = (number: number, over: Partial<Pass>): Pass => ({
  number,
  stage: 'rough',
  infeedMm: 0.0125,
  divisions: 5,
  cutMm: 0.01,
  springMm: 0.002,
  dialToGoMm: 0.1,
  metalToGoMm: 0.1,
  ...over,
});

const PASSES: Pass[] = [
  pass(1, { metalToGoMm: 0.05 }),
  pass(2, { metalToGoMm: 0.04 }),
  pass(3, { infeedMm: 0.005, divisions: 2, metalToGoMm: 0.035 }),
  pass(4, { stage: 'rough spark-out', infeedMm: 0, divisions: 0, metalToGoMm: 0.033 }),
  pass(5, { stage: 'rough spark-out', infeedMm: 0, divisions: 0, metalToGoMm: 0.031 }),
  pass(6, { stage: 'finish', infeedMm: 0.00125, divisions: 0.5, metalToGoMm: 0.03 }),
];

describe('groups of passes', () => {
  it('hold neighbours of one stage that are set alike, and end as the last of them ends', () => {
    expect(groupPasses(PASSES).map((group) => [groupName(group), group.metalToGoMm])).toEqual([
      ['1–2 rough', 0.04],
      ['3 rough', 0.035],
      ['4–5 spark-out', 0.031],
      ['6 finish', 0.03],
    ]);
  });

  it('say what to do at the dial', () => {
    expect(groupPasses(PASSES).map((group) => dialWords(group, 'mm'))).toEqual([
      '+5\u00a0div each',
      '+2\u00a0div',
      'leave',
      '+0.5\u00a0div',
    ]);
  });

  it('give the infeed where no dial is known', () => {
    const [group] = groupPasses([pass(1, { divisions: null })]);
    expect(group && dialWords(group, 'mm')).toBe('+0.0125');
  });

  it('do not change the passes they are made of', () => {
    const before = JSON.parse(JSON.stringify(PASSES));
    groupPasses(PASSES);
    expect(PASSES).toEqual(before);
  });
});

describe('infeed, pass by pass', () => {
  it('is a table whose rough and finish passes are parted by what is done between them', () => {
    render(<InfeedPasses passes={PASSES} units="mm" />);
    const table = screen.getByRole('table', { name: 'Infeed, pass by pass' });
    const rows = within(table)
      .getAllByRole('row')
      .map((row) => row.textContent ?? '');
    expect(rows[1]).toMatch(/^1–2 rough\+5.div each0\.040$/);
    expect(rows[4]).toBe('Measure cold, dress fine, touch off, set the dial to zero');
    expect(rows[5]).toMatch(/^6 finish/);
    expect(within(table).getByRole('rowheader', { name: '1–2 rough' })).toBeInTheDocument();
    expect(within(table).getByRole('columnheader', { name: 'Metal left, mm' })).toBeInTheDocument();
  });

  it('reads in inches', () => {
    render(<InfeedPasses passes={PASSES} units="inch" />);
    expect(screen.getByRole('columnheader', { name: 'Metal left, in' })).toBeInTheDocument();
    expect(screen.getByText('0.0016')).toBeInTheDocument();
  });

  it('names both lines in words', () => {
    render(<InfeedPasses passes={PASSES} units="mm" />);
    expect(screen.getByText('dial still to go, mm')).toBeInTheDocument();
    expect(screen.getByText('metal still to come off, mm')).toBeInTheDocument();
  });

  it('shows nothing while there are no passes', () => {
    const { container } = render(<InfeedPasses passes={[]} units="mm" />);
    expect(container).toBeEmptyDOMElement();
  });

  it('covers every pass of a real plan once', () => {
    const { passes } = planSetup(jawsInput());
    const groups = groupPasses(passes);
    const covered = groups.reduce((sum, group) => sum + group.last - group.first + 1, 0);
    expect(passes.length).toBeGreaterThan(5);
    expect(covered).toBe(passes.length);
  });
});
