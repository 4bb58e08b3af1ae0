import { fireEvent, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { WheelForm } from '@/features/wheels/wheel-form';
import type { Wheel } from '@/shared/contracts/wheels';

import {
  PERSON_ID,
  refusal,
  serve,
  SHOP_ID,
  showInShop,
  stored,
  type Asked,
} from '../../support/in-shop';
import { openAddress, visited } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const RACK = `/shops/${SHOP_ID}/wheels`;
const backTo = { pathname: '/shops/[shopId]/wheels', params: { shopId: SHOP_ID } } as const;

const field = (name: string) => screen.getByLabelText(name, { selector: 'input' });

const SAVED = `${RACK}/0190a000-0000-7000-8000-0000000000a1`;
const save = () => screen.getByRole('button', { name: 'Save the wheel' });

const wheel: Wheel = {
  ...stored,
  id: '0190a000-0000-7000-8000-0000000000a1',
  version: 4,
  tag: 'R-14',
  typed: {},
  data: {
    marking: 'A 60 K 7 V',
    diameterNewMm: 32,
    diameterNowMm: 31,
    widthMm: 16,
    holeMm: 10,
    markedRpm: null,
    markedSpeedMPerS: 25,
    markingReadOn: 'box',
    mounted: null,
    looked: 'sound',
    rung: 'silent',
    expiresOn: null,
    state: 'on the rack',
    setAsideReason: null,
    unsigned: false,
    shape: '1',
    smallestUsableMm: 20,
    madeOn: null,
    place: 'Peg 4',
    notes: null,
  },
  life: {
    receivedOn: '2026-01-05',
    onSpindle: null,
    due: null,
    limitRpm: 14_920,
    usable: true,
  },
};

/** Stores what it is sent. */
const storing = ({ method, path, body }: Asked) => {
  if (path.startsWith('/grinders')) return { body: { items: [] } };
  if (method === 'GET') return { body: wheel };
  const { tag, data } = body as Pick<Wheel, 'tag' | 'data'>;
  return { body: { ...wheel, tag, data: { ...wheel.data, ...data }, version: 5 } };
};

const writes = (log: Asked[]) => log.filter(({ method }) => method !== 'GET');

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

/** As if pasted: keystroke by keystroke a long form takes jsdom minutes. */
const fill = (name: string, text: string) =>
  fireEvent.change(field(name), { target: { value: text } });

function fillNew() {
  fill('Tag', 'R-15');
  fill('Diameter when new', '1 1/4 in');
  fill('Width', '16');
  fill('Hole', '10');
  fill('Marked speed', '25');
}

it('says what is missing, leads to the field, and sends nothing', async () => {
  const log = serve(storing);
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  await user.click(save());
  expect(await screen.findByRole('heading', { name: /4 things to put right/ })).toBeInTheDocument();
  await user.click(screen.getByRole('link', { name: /^Enter diameter when new/ }));
  expect(field('Diameter when new')).toHaveFocus();
  expect(writes(log)).toEqual([]);
});

it('shows the limit while the wheel is typed in, from the diameter when new', () => {
  serve(storing);
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  fillNew();
  // 60 000 x 25 / (pi x 31.75) = 15 038.7, rounded down (29 CFR 1910.215(d)(1)).
  expect(screen.getByRole('button', { name: /^Limit: 15\s038/ })).toBeInTheDocument();
  fireEvent.click(screen.getByRole('button', { name: /^When it came/ }));
  fill('Diameter now', '20');
  expect(screen.getByRole('button', { name: /^Limit: 15\s038/ })).toBeInTheDocument();
});

it('stores a new wheel once, in SI and as it was typed, and leads to its page', async () => {
  const log = serve(storing);
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  fillNew();
  await user.click(save());
  await waitFor(() => expect(visited()).toEqual([SAVED]));
  expect(writes(log)).toEqual([
    {
      method: 'POST',
      path: '/wheels',
      body: expect.objectContaining({
        tag: 'R-15',
        data: expect.objectContaining({ diameterNewMm: 31.75, widthMm: 16 }),
        received: { on: null, diameterMm: null, looked: null, rung: null },
        typed: expect.objectContaining({ diameterNewMm: '1 1/4 in', '@units': 'mm' }),
      }),
    },
  ]);
  expect(window.localStorage).toHaveLength(0);
});

it("puts the server's error on its field, and asks again once it is changed", async () => {
  const words = 'Another wheel of this shop has this tag.';
  let taken = true;
  const log = serve((asked) =>
    asked.method === 'POST' && taken
      ? refusal(409, 'name-taken', { errors: [{ path: 'tag', message: words }] })
      : storing(asked),
  );
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  fillNew();
  await user.click(save());
  expect(await screen.findByRole('link', { name: words })).toBeInTheDocument();
  expect(field('Tag')).toBeInvalid();
  taken = false;
  fill('Tag', 'R-15b');
  await user.click(save());
  await waitFor(() => expect(visited()).toEqual([SAVED]));
  const [first, second] = writes(log).map(({ body }) => (body as { id: string }).id);
  expect(second).toBe(first);
});

it('keeps what was typed when the server is gone and the page is loaded anew', async () => {
  serve(({ method }) => (method === 'GET' ? { body: { items: [] } } : 'no network'));
  const user = userEvent.setup();
  const page = showInShop(<WheelForm wheel={null} backTo={backTo} />);
  fillNew();
  await user.click(save());
  expect(await screen.findByText(/server cannot be reached/)).toBeInTheDocument();
  expect(visited()).toEqual([]);
  page.unmount();
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  expect(field('Diameter when new')).toHaveValue('1 1/4 in');
  await user.click(screen.getByRole('button', { name: 'Discard them' }));
  expect(field('Diameter when new')).toHaveValue('');
});

it('keeps nothing on the device while nothing is typed', () => {
  serve(storing);
  showInShop(<WheelForm wheel={wheel} backTo={backTo} />);
  expect(window.localStorage).toHaveLength(0);
});

it('shows both versions after somebody else saved, and saves what is chosen', async () => {
  const theirs: Wheel = {
    ...wheel,
    version: 5,
    data: { ...wheel.data, marking: 'A 46 K 8 V', widthMm: 15 },
  };
  const log = serve((asked) =>
    asked.method === 'PUT' && (asked.body as Wheel).version === 4
      ? refusal(409, 'stale-version', { current: theirs })
      : storing(asked),
  );
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={wheel} backTo={backTo} />);
  fill('Width', '14');
  await user.click(save());
  expect(
    await screen.findByRole('heading', { name: 'Changed in the meantime' }),
  ).toBeInTheDocument();
  // Only they touched the marking; both touched the width.
  expect(screen.getByRole('radio', { name: /A 46 K 8 V/ })).toBeChecked();
  expect(screen.getByRole('radio', { name: /^14\smm/ })).toBeChecked();
  await user.click(screen.getByRole('button', { name: 'Save what is chosen' }));
  await waitFor(() => expect(visited()).toEqual([SAVED]));
  expect(writes(log).at(-1)?.body).toMatchObject({
    version: 5,
    data: { marking: 'A 46 K 8 V', diameterNewMm: 32, widthMm: 14 },
  });
});

it('finds what an unanswered attempt stored, instead of making a second wheel', async () => {
  const log = serve((asked) => {
    if (asked.method === 'POST') return refusal(409, 'id-reused');
    return storing(asked);
  });
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  fillNew();
  await user.click(save());
  await user.click(await screen.findByRole('button', { name: 'Save what is chosen' }));
  await waitFor(() => expect(visited()).toEqual([SAVED]));
  expect(writes(log).map(({ method }) => method)).toEqual(['POST', 'PUT']);
  expect(writes(log).at(-1)?.body).toMatchObject({ version: 4, tag: 'R-15' });
});

it('changes the units of what is shown and nothing of what is stored', async () => {
  const log = serve(storing);
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={wheel} backTo={backTo} />);
  await user.click(screen.getByRole('radio', { name: 'inch' }));
  expect(Number((field('Hole') as HTMLInputElement).value)).toBeCloseTo(10 / 25.4, 8);
  expect(field('Marked speed')).toHaveValue('25');
  await user.click(save());
  await waitFor(() => expect(visited()).toEqual([SAVED]));
  const sent = (writes(log).at(-1)?.body as Wheel).data;
  expect(wheel.data).toMatchObject(sent);
  expect(sent).toMatchObject({ holeMm: 10, shape: '1', smallestUsableMm: 20, place: 'Peg 4' });
});

it('asks of a wheel with entries for nothing that they say', () => {
  serve(storing);
  showInShop(<WheelForm wheel={wheel} backTo={backTo} />);
  expect(screen.queryByLabelText('Diameter now')).toBeNull();
  expect(screen.queryByText('Ring test')).toBeNull();
  expect(field('Diameter when new')).toHaveValue('32');
});

it('keeps the drafts of one person and one wheel apart from all others', async () => {
  serve(storing);
  const user = userEvent.setup();
  showInShop(<WheelForm wheel={wheel} backTo={backTo} />);
  await user.type(field('Marking'), 'x');
  expect(Object.keys(window.localStorage)).toEqual([
    `ringtrue:draft:${PERSON_ID}:${SHOP_ID}:wheel:${wheel.id}`,
  ]);
});

it('never says that the device keeps what the browser refuses to keep', () => {
  serve(storing);
  const refusing = jest.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
    throw new DOMException('full', 'QuotaExceededError');
  });
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
  fill('Tag', 'R-15');
  expect(screen.getByText(/keeps nothing: save before you leave/)).toBeInTheDocument();
  expect(screen.queryByText(/Kept on this device/)).toBeNull();
  refusing.mockRestore();
  fill('Tag', 'R-16');
  expect(screen.getByText(/Kept on this device/)).toBeInTheDocument();
});
