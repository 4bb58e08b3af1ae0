import { configure, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { NumbersScreen } from '@/features/numbers/numbers-screen';
import { PUBLISHED } from '@/shared/rules/published';
import { SOURCES } from '@/shared/rules/sources';

import { addressParams, openAddress } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

// Asking jsdom of each element whether it is shown takes seconds on a long page.
configure({ defaultHidden: true });

const sources = new Set(PUBLISHED.map(({ source }) => source)).size;
const folds = () => screen.getAllByRole('button', { name: /: / });

beforeEach(() => openAddress());

it('says how many checks there are and that they were carried out here', () => {
  render(<NumbersScreen />);
  expect(
    screen.getByText(
      `${PUBLISHED.length} checks against ${sources} sources, worked out on this device just now: all agree.`,
    ),
  ).toBeInTheDocument();
  expect(folds()).toHaveLength(sources);
  expect(screen.queryByRole('alert')).toBeNull();
});

it('explains each mark above its sources', () => {
  render(<NumbersScreen />);
  for (const heading of ['Law', 'Standard', 'Handbook', 'Textbook', 'Derived', 'Memory'])
    expect(screen.getByRole('heading', { name: heading })).toBeInTheDocument();
  expect(screen.getByText(/Recalled; the text itself was not seen/)).toBeInTheDocument();
});

it('opens a source: what rests on it, and what it states beside what the rules answer', async () => {
  const user = userEvent.setup();
  render(<NumbersScreen />);
  await user.click(screen.getByRole('button', { name: /^Jones.*cutting speeds/ }));
  const check = screen.getByRole('listitem', { name: '' });
  expect(check).toHaveTextContent('Lathe speed for a cutting speed');
  expect(check).toHaveTextContent('60 ft/min, 5 in diameter');
  expect(check).toHaveTextContent(/Source46\srpm/);
  expect(check).toHaveTextContent(/Here45.84\srpm/);
  expect(check).toHaveTextContent(/±0.5\srpm/);
});

it('shows the one source that a working leads to, open, and leads on to all', async () => {
  const user = userEvent.setup();
  openAddress({ source: 'mh31-1303' });
  render(<NumbersScreen />);
  expect(folds()).toHaveLength(1);
  expect(screen.getByText(/smallest diamond\./)).toBeInTheDocument();
  const checks = within(screen.getByRole('list', { name: /^Checks against Machinery/ }));
  expect(checks.getAllByRole('listitem')).toHaveLength(
    PUBLISHED.filter(({ source }) => source === 'mh31-1303').length,
  );
  await user.click(screen.getByRole('button', { name: 'Show all sources' }));
  expect(addressParams().source).toBeUndefined();
  expect(folds()).toHaveLength(sources);
});

it('says so when the address names no source', () => {
  openAddress({ source: 'no-such-book' });
  render(<NumbersScreen />);
  expect(screen.getByText('There is no such source')).toBeInTheDocument();
});

it('lists sources without a check too, and the shop setting that starts at a recalled value', async () => {
  const user = userEvent.setup();
  render(<NumbersScreen />);
  await user.click(screen.getByRole('radio', { name: /^all / }));
  expect(folds()).toHaveLength(Object.keys(SOURCES).length);
  await user.click(
    screen.getByRole('button', { name: /stiffness of post and slides: no published/ }),
  );
  expect(
    screen.getByText(/Stiffness of post and slides: a shop setting that starts at 5\s000\sN\/mm/),
  ).toBeInTheDocument();
});

it('finds a check by a word of it, and says when nothing holds the words', () => {
  openAddress({ search: 'bushings' });
  const { unmount } = render(<NumbersScreen />);
  expect(folds()).toHaveLength(1);
  // What the source states, and what the rules answer.
  expect(screen.getAllByText('A60 L')).toHaveLength(2);
  unmount();
  openAddress({ search: 'bushings elephant' });
  render(<NumbersScreen />);
  expect(screen.getByText('Nothing holds all of these words')).toBeInTheDocument();
});
