import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { FindingCard } from '@/features/ui/finding-card';
import { Notice, Progress } from '@/features/ui/notice';
import { Readout } from '@/features/ui/readout';
import { VerdictAnnouncer, VerdictBadge, verdictWords } from '@/features/ui/verdict';

describe('a verdict', () => {
  it.each([
    ['incomplete', 3, 'Needs 3 things'],
    ['incomplete', 1, 'Needs 1 thing'],
    ['clear', 0, 'Clear'],
    ['check', 2, 'Check 2'],
    ['stop', 1, 'Stop'],
  ] as const)('%s with %d reads "%s"', (verdict, count, words) => {
    expect(verdictWords(verdict, count)).toBe(words);
    render(<VerdictBadge verdict={verdict} count={count} />);
    expect(screen.getByText(words)).toBeInTheDocument();
  });

  it('opens its findings', async () => {
    const onPress = jest.fn();
    render(<VerdictBadge verdict="check" count={2} onPress={onPress} />);
    await userEvent.click(screen.getByRole('button', { name: 'Check 2, show why' }));
    expect(onPress).toHaveBeenCalledTimes(1);
  });

  it('is spoken when it changes', () => {
    const { rerender } = render(<VerdictAnnouncer verdict="clear" count={0} />);
    const live = screen.getByRole('status');
    rerender(<VerdictAnnouncer verdict="stop" count={1} />);
    expect(live).toHaveTextContent('Verdict: Stop');
    expect(live).toHaveAttribute('aria-live', 'polite');
  });
});

describe('a finding', () => {
  it('says its level in a word', () => {
    render(<FindingCard level="check">jaws have gaps.</FindingCard>);
    expect(screen.getByText(/Check:/)).toBeInTheDocument();
  });

  it('interrupts as Stop and waits as Check when it is live', () => {
    render(
      <>
        <FindingCard level="stop" headline="too fast" live>
          15 438 rpm is above the limit.
        </FindingCard>
        <FindingCard level="check" live>
          jaws have gaps.
        </FindingCard>
      </>,
    );
    expect(screen.getByRole('alert')).toHaveTextContent('Stop: too fast');
    expect(screen.getByRole('status')).toHaveTextContent('Check: jaws have gaps.');
  });
});

describe('a figure', () => {
  it('speaks its unit in full and opens its working', async () => {
    const onPress = jest.fn();
    render(
      <Readout
        label="Wheel speed"
        value="19.1"
        unit="m/s"
        spokenUnit="metres per second"
        onPress={onPress}
      />,
    );
    await userEvent.click(
      screen.getByRole('button', { name: 'Wheel speed: 19.1 metres per second. Show the working' }),
    );
    expect(onPress).toHaveBeenCalledTimes(1);
  });

  it('says that it is not known yet', () => {
    render(<Readout label="Work" value={null} unit="rpm" />);
    expect(screen.getByRole('group', { name: 'Work: not known yet' })).toBeInTheDocument();
  });
});

describe('messages in place', () => {
  it('interrupt only for errors', () => {
    render(
      <>
        <Notice kind="done">Saved 10:42.</Notice>
        <Notice kind="error">The server cannot be reached.</Notice>
      </>,
    );
    expect(screen.getByRole('status')).toHaveTextContent('Saved 10:42.');
    expect(screen.getByRole('alert')).toHaveTextContent('The server cannot be reached.');
  });

  it('show how far long work is', () => {
    render(<Progress label="Reading 120 rows" share={0.4} />);
    const bar = screen.getByRole('progressbar', { name: 'Reading 120 rows' });
    expect(bar).toHaveAttribute('aria-valuenow', '40');
    expect(screen.getByText('Reading 120 rows, 40 %')).toBeInTheDocument();
  });
});
