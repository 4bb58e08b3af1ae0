import { fireEvent, screen, waitFor, within } from '@testing-library/react';

import { SetupsScreen } from '@/features/setups/setups-screen';
import type { SetupSummary } from '@/shared/contracts/setups';

import { refusal, serve, showInShop, type Asked } from '../../support/in-shop';
import { addressParams, openAddress, visited } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const summary = (number: number, change: Partial<SetupSummary> = {}): SetupSummary => ({
  id: `0190a000-0000-7000-8000-00000000010${number}`,
  name: `Job ${number}`,
  operation: 'jaws',
  state: 'draft',
  verdict: 'clear',
  count: 0,
  version: 2,
  updatedAt: '2026-02-28T09:05:00Z',
  updatedByName: 'Ada Quill',
  ...change,
});

const page = (items: SetupSummary[], next: string | null = null) => ({ body: { items, next } });
const queries = (log: Asked[]) => log.map(({ path }) => path);

beforeEach(() => openAddress());

it('names each setup with its operation, verdict, person and day', async () => {
  serve(() => page([summary(1, { verdict: 'check', count: 2 }), summary(2, { verdict: 'stop' })]));
  showInShop(<SetupsScreen />);
  const [first, second] = await screen.findAllByRole('listitem');
  for (const words of ['Job 1', 'Chuck jaws', 'Check 2', '28 Feb 2026, Ada Quill'])
    expect(within(first as HTMLElement).getByText(words)).toBeInTheDocument();
  expect(within(second as HTMLElement).getByText('Stop')).toBeInTheDocument();
});

it('asks the server for the words and the operation that stand in the address', async () => {
  openAddress({ search: 'pump', operation: 'bore' });
  const log = serve(() => page([]));
  showInShop(<SetupsScreen />);
  expect(await screen.findByText('No setup found')).toBeInTheDocument();
  expect(queries(log)).toEqual(['/setups?search=pump&operation=bore']);
  expect(screen.getByLabelText('Search')).toHaveValue('pump');
});

it('searches when typing pauses, once, and keeps the words in the address', async () => {
  const log = serve(() => page([summary(1)]));
  showInShop(<SetupsScreen />);
  await screen.findByText('Job 1');
  for (const text of ['p', 'pu', 'pump'])
    fireEvent.change(screen.getByLabelText('Search'), { target: { value: text } });
  await waitFor(() => expect(addressParams().search).toBe('pump'));
  await waitFor(() => expect(queries(log)).toEqual(['/setups?', '/setups?search=pump']));
});

it('leaves retired setups out until they are asked for', async () => {
  const log = serve(({ path }) =>
    page(
      path.includes('retired')
        ? [summary(2, { state: 'retired' })]
        : [summary(1), summary(2, { state: 'retired' })],
    ),
  );
  showInShop(<SetupsScreen />);
  await screen.findByText('Job 1');
  expect(screen.queryByText('Job 2')).toBeNull();
  fireEvent.click(screen.getByRole('button', { name: 'Retired' }));
  expect(await screen.findByText('Job 2')).toBeInTheDocument();
  expect(queries(log).at(-1)).toBe('/setups?state=retired');
});

it('goes on past a page that holds nothing but retired setups', async () => {
  serve(({ path }) =>
    path.includes('after=next')
      ? page([summary(3)])
      : page([summary(1, { state: 'retired' })], 'next'),
  );
  showInShop(<SetupsScreen />);
  expect(await screen.findByText('Job 3')).toBeInTheDocument();
});

it('shows the next page when asked, and says why it did not come', async () => {
  let down = true;
  serve(({ path }) => {
    if (!path.includes('after=next')) return page([summary(1)], 'next');
    return down ? 'no network' : page([summary(2)]);
  });
  showInShop(<SetupsScreen />);
  fireEvent.click(await screen.findByText('Show more setups'));
  expect(await screen.findByText(/server cannot be reached/)).toBeInTheDocument();
  down = false;
  fireEvent.click(screen.getByText('Show more setups'));
  expect(await screen.findByText('Job 2')).toBeInTheDocument();
  expect(screen.queryByText('Show more setups')).toBeNull();
});

it('copies a setup from its row, under a name that fits', async () => {
  const name = 'J'.repeat(80);
  const log = serve(({ method }) =>
    method === 'POST'
      ? refusal(403, 'forbidden', { detail: 'Not today.' })
      : page([summary(1, { name })]),
  );
  showInShop(<SetupsScreen />);
  fireEvent.click(await screen.findByLabelText(`More for ${name}`));
  fireEvent.click(await screen.findByText('Make a copy'));
  expect(await screen.findByText('Not today.')).toBeInTheDocument();
  const body = log.find(({ method }) => method === 'POST')?.body as { name: string };
  expect(body.name).toBe(`${'J'.repeat(74)}, copy`);
});

it('retires a setup at the version that was seen, after asking once more', async () => {
  const log = serve(({ method }) =>
    method === 'POST' ? refusal(409, 'stale-version', { current: null }) : page([summary(1)]),
  );
  showInShop(<SetupsScreen />);
  fireEvent.click(await screen.findByLabelText('More for Job 1'));
  fireEvent.click(await screen.findByText('Retire'));
  expect(log.some(({ method }) => method === 'POST')).toBe(false);
  fireEvent.click(screen.getByText('Retire it'));
  expect(await screen.findByText(/edited this setup in the meantime/)).toBeInTheDocument();
  expect(log.find(({ method }) => method === 'POST')).toMatchObject({
    path: `/setups/${summary(1).id}/retire`,
    body: { version: 2 },
  });
});

it('starts a setup by asking for the operation, under an address of its own', async () => {
  serve(() => page([]));
  showInShop(<SetupsScreen />);
  fireEvent.click(await screen.findByText('New setup'));
  fireEvent.click(await screen.findByText('A shaft or journal, true and to size'));
  expect(visited()[0]).toMatch(/\/setups\/[\da-f-]{36}\?operation=outside$/);
});
