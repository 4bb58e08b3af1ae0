import { screen, waitFor, within } from '@testing-library/react';

import { recordEntryRequest } from '@/shared/contracts/wheel-entries';

import { openAddress } from '../../support/router';
import { button, fill, sent, show } from '../../support/show-wheel-page';
import { entry, mountedLife, QUILL_ID, rackWheel, wheelLife } from '../../support/wheel-page';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

describe('its life', () => {
  const correction = entry(3, {
    kind: 'correction',
    entryId: entry(2, { kind: 'taken off' }).id,
    reason: 'another wheel',
  });
  const taken = entry(
    2,
    { kind: 'dressed', depthMm: 0.02, passes: 5 },
    { correctedBy: correction.id },
  );
  const received = entry(1, { kind: 'received', diameterMm: 32 });
  const life = mountedLife({ entries: { items: [correction, taken, received], next: null } });

  it('shows what was taken back struck through, with the reason and where it was taken back', async () => {
    await show(life);
    const list = within(screen.getByRole('list', { name: 'Its life' }));
    expect(list.getByRole('deletion')).toHaveTextContent(/^Dressed, 5 × 0\.02\smm$/);
    expect(list.getByText(/^Taken back by no\.\s3: another wheel$/)).toBeInTheDocument();
    expect(
      list.getByText(/^Takes back no\.\s2, dressed, 5 × 0\.02\smm: another wheel$/),
    ).toBeInTheDocument();
  });

  it('says why an entry is not corrected, and takes no reason for it', async () => {
    const { log, user } = await show(life);
    await user.click(button(/^Correct no\. 1: Received/));
    expect(await screen.findByText(/How the wheel was received stays/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Take it back' })).toBeNull();
    expect(sent(log)).toEqual([]);
  });

  it('takes an entry back with a reason', async () => {
    const used = entry(4, { kind: 'used', minutes: 20, diameterMm: null });
    const mounted = entry(3, { kind: 'mounted', grinderId: null, quillId: QUILL_ID });
    const { log, user } = await show(
      mountedLife({ entries: { items: [used, mounted, received], next: null } }),
    );
    await user.click(button(/^Correct no\. 4: Used/));
    fill('Reason', 'did not happen.');
    await user.click(button('Take it back'));
    await waitFor(() => expect(sent(log)).toHaveLength(1));
    expect(recordEntryRequest.parse(sent(log)[0]?.body).step).toEqual({
      kind: 'correction',
      entryId: used.id,
      reason: 'did not happen',
    });
  });
});

it('draws the life of the wheel with the same in words', async () => {
  const dressed = entry(2, { kind: 'dressed', depthMm: 0.05, passes: 10 });
  const items = [dressed, entry(1, { kind: 'received', diameterMm: 32 })];
  const { user } = await show(mountedLife({ entries: { items, next: null } }));
  expect(screen.getByRole('heading', { name: 'How much is left: 90\u00a0%' })).toBeInTheDocument();
  await user.click(button(/^Every size on record/));
  const table = within(screen.getByRole('table', { name: /Sizes of the wheel/ }));
  expect(table.getAllByRole('row').map((row) => row.textContent)).toEqual([
    expect.stringContaining('Diameter'),
    expect.stringMatching(/Dressed, 10 × 0\.05.mm31$/),
    expect.stringMatching(/Received, 32.mm32$/),
  ]);
});

it('says where it may run and where not', async () => {
  await show(wheelLife());
  expect(screen.getByText(/^belt step A, not B: 15.438.rpm$/)).toBeInTheDocument();
  expect(screen.getByText('The hole does not go on it.')).toBeInTheDocument();
});

describe('setting aside', () => {
  const setup = (id: number, verdict: 'stop' | 'clear') => ({
    id: `0190a000-0000-7000-8000-00000000020${id}`,
    name: `Jaws ${id}`,
    operation: 'jaws' as const,
    state: 'draft' as const,
    verdict,
    count: 1,
    version: 1,
    updatedAt: '2026-03-01T10:00:00Z',
    updatedByName: 'Ada Quill',
  });

  it('takes two presses, asks for no version, and says how many setups stopped', async () => {
    let life = wheelLife({ setups: [setup(1, 'clear'), setup(2, 'clear')] });
    const { log, user } = await show(life, 'apprentice', (asked) => {
      if (asked.method === 'GET') return { body: life };
      const wheel = rackWheel({ state: 'set aside', setAsideReason: 'Dull ring' });
      life = { ...life, wheel, setups: [setup(1, 'stop'), setup(2, 'stop')] };
      const { step } = recordEntryRequest.parse(asked.body);
      return { status: 201, body: { wheel, entry: entry(9, step) } };
    });
    await user.click(button('Set R-14 aside'));
    await user.click(button('Dull ring'));
    expect(
      await screen.findByText('Dull ring. All 2 setups that use it are stopped.'),
    ).toBeInTheDocument();
    expect(recordEntryRequest.parse(sent(log)[0]?.body)).toMatchObject({
      version: null,
      step: { kind: 'set aside', reason: 'Dull ring' },
    });
  });

  it('takes a reason of one’s own, and asks for it', async () => {
    const { log, user } = await show(wheelLife());
    await user.click(button('Set R-14 aside'));
    await user.click(button('Another reason'));
    await user.click(button('Set aside'));
    expect(await screen.findByText(/Enter why/)).toBeInTheDocument();
    expect(sent(log)).toEqual([]);
    fill('Reason', 'Soaked in oil.');
    await user.click(button('Set aside'));
    await waitFor(() => expect(sent(log)).toHaveLength(1));
    expect(recordEntryRequest.parse(sent(log)[0]?.body).step).toEqual({
      kind: 'set aside',
      reason: 'Soaked in oil',
    });
  });
});
