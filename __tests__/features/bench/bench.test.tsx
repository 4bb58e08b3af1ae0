import { screen } from '@testing-library/react';

import { BenchScreen } from '@/features/bench/bench-screen';
import { needingAttention } from '@/features/bench/attention';
import type { SetupSummary } from '@/shared/contracts/setups';
import type { Verdict } from '@/shared/domain/setups';

import { serve, SHOP_ID, showInShop, stored } from '../../support/in-shop';
import { openAddress } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const setup = (name: string, verdict: Verdict, updatedByName = 'Bo Lathe'): SetupSummary => ({
  id: `0190a000-0000-7000-8000-0000000002${name.length.toString().padStart(2, '0')}`,
  name,
  operation: 'bore',
  state: 'draft',
  verdict,
  count: 1,
  version: 1,
  updatedAt: '2026-02-28T09:05:00Z',
  updatedByName,
});

const empty = { items: [] };
const noPage = { items: [], next: null };

beforeEach(() => openAddress());

it("puts one's own setups first, and the gravest of them before the others", () => {
  const order = needingAttention(
    [
      setup('theirs, stop', 'stop'),
      setup('mine, check', 'check', 'Ada Quill'),
      setup('clear', 'clear', 'Ada Quill'),
      setup('mine, needs', 'incomplete', 'Ada Quill'),
      setup('mine, stop', 'stop', 'Ada Quill'),
      { ...setup('retired', 'stop', 'Ada Quill'), state: 'retired' },
    ],
    'Ada Quill',
  );
  expect(order.map(({ name }) => name)).toEqual([
    'mine, stop',
    'mine, needs',
    'mine, check',
    'theirs, stop',
  ]);
});

const lathe = {
  ...stored,
  id: '0190a000-0000-7000-8000-0000000000c1',
  name: 'Lathe 3',
  typed: {},
  data: {
    spindleSpeedsRpm: [45],
    feedsMmPerRev: [0.1],
    crossSlideDivisionMm: 0.02,
    crossSlideReads: 'diameter',
    crossSlideDivisionsPerTurn: null,
    compoundZero: null,
    compoundDivisionMm: null,
    compoundTravelMm: null,
    compoundMmPerTurn: null,
    spindleNose: null,
  },
};

describe('an empty shop', () => {
  const answers = (lathes: object[]) =>
    serve(({ path }) => ({
      body: path.startsWith('/lathes')
        ? { items: lathes }
        : path.startsWith('/grinders')
          ? empty
          : noPage,
    }));

  it('leads a lead to the first thing that is missing', async () => {
    answers([]);
    showInShop(<BenchScreen />, { role: 'lead' });
    const link = await screen.findByRole('link', { name: 'Add a lathe' });
    expect(link).toHaveAttribute('href', `/shops/${SHOP_ID}/machines/lathes/new`);
    expect(screen.getAllByText('to do')).toHaveLength(4);
    expect(screen.queryByText('New setup')).toBeNull();
  });

  it('leads on to the next thing once one is there', async () => {
    answers([lathe]);
    showInShop(<BenchScreen />, { role: 'lead' });
    const link = await screen.findByRole('link', { name: 'Add a grinder' });
    expect(link).toHaveAttribute('href', `/shops/${SHOP_ID}/machines/grinders/new`);
    expect(screen.getAllByText('done')).toHaveLength(1);
  });

  it('offers an apprentice nothing that would be refused', async () => {
    answers([]);
    showInShop(<BenchScreen />, { role: 'apprentice' });
    expect(await screen.findByText(/lead or machinist adds machines/)).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'Add a lathe' })).toBeNull();
  });
});

it('offers to try again when the server cannot be reached', async () => {
  serve(() => 'no network');
  showInShop(<BenchScreen />);
  expect(await screen.findByText(/server cannot be reached/)).toBeInTheDocument();
  expect(screen.getByText('Try again')).toBeInTheDocument();
});
