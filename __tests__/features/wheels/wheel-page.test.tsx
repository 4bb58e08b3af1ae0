import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { PlanReader } from '@/features/plan';
import { WheelPage } from '@/features/wheels/components/wheel-page';
import { recordEntryRequest, type WheelLife } from '@/shared/contracts/wheel-entries';
import type { Role } from '@/shared/domain/people';

import { refusal, serve, showInShop, type Asked } from '../../support/in-shop';
import { openAddress } from '../../support/router';
import {
  entry,
  mountedLife,
  OTHER_PERSON,
  QUILL_ID,
  rackWheel,
  WHEEL_ID,
  wheelLife,
} from '../../support/wheel-page';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

const other = { personId: OTHER_PERSON, name: 'Bo Lathe' };

/** Answers with a life, and takes every entry. */
const taking =
  (life: WheelLife) =>
  ({ method, body }: Asked) => {
    if (method === 'GET') return { body: life };
    const { id, step } = body as {
      id: string;
      step: WheelLife['entries']['items'][number]['step'];
    };
    return { status: 201, body: { wheel: life.wheel, entry: { ...entry(9, step), id } } };
  };

async function show(
  life: WheelLife,
  role: Role = 'machinist',
  api: Parameters<typeof serve>[0] = taking(life),
) {
  const log = serve(api);
  showInShop(
    <PlanReader units="mm">
      <WheelPage wheelId={WHEEL_ID} />
    </PlanReader>,
    { role },
  );
  await screen.findByRole('heading', { name: 'Next' });
  return { log, user: userEvent.setup() };
}

const button = (name: string | RegExp) => screen.getByRole('button', { name });
const sent = (log: Asked[]) => log.filter(({ method }) => method === 'POST');
const fill = (name: string, text: string) =>
  fireEvent.change(screen.getByRole('textbox', { name }), { target: { value: text } });

describe('what is next', () => {
  it('offers what is allowed, and says of the rest why not, each reason once', async () => {
    await show(wheelLife());
    for (const name of ['Close look', 'Ring test', 'Mount', 'Scrap'])
      expect(button(name)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Dress' })).toBeNull();
    expect(screen.getByText('Trial run, Dress, Used, Take off:')).toBeInTheDocument();
    expect(screen.getAllByText(/The wheel is not mounted\./)).toHaveLength(1);
  });

  it('records a ring test under an id of its own, on the version that was looked at', async () => {
    const { log, user } = await show(wheelLife());
    await user.click(button('Ring test'));
    expect(screen.getByText(/about 45 degrees either side/)).toBeInTheDocument();
    await user.click(button('Record it'));
    expect(await screen.findAllByText('Choose how the wheel rang.')).not.toHaveLength(0);
    expect(sent(log)).toEqual([]);
    await user.click(screen.getByRole('radio', { name: 'Does not ring' }));
    await user.click(button('Record it'));
    expect(await screen.findByText(/^Recorded: Ring test: does not ring\./)).toBeInTheDocument();
    const [{ path, body } = { path: '', body: null }] = sent(log);
    expect(path).toBe(`/wheels/${WHEEL_ID}/entries`);
    expect(recordEntryRequest.parse(body)).toMatchObject({
      version: 4,
      step: { kind: 'ring test', ring: 'silent' },
    });
  });

  it('mounts on a spindle that takes the wheel, and locks the others with the reason', async () => {
    const { log, user } = await show(wheelLife());
    await user.click(button('Mount'));
    const locked = screen.getByRole('radio', { name: /Arbor 12\.7.*does not go on it/ });
    expect(locked).toHaveAttribute('aria-disabled', 'true');
    await user.click(screen.getByRole('radio', { name: /Quill 18/ }));
    await user.click(button('Record it'));
    await waitFor(() => expect(sent(log)).toHaveLength(1));
    expect(recordEntryRequest.parse(sent(log)[0]?.body).step).toMatchObject({ quillId: QUILL_ID });
  });

  it('shows what dressing leaves while it is typed, and sends millimetres', async () => {
    const { log, user } = await show(mountedLife());
    await user.click(button('Dress'));
    fill('Depth of a pass', '0,02');
    fill('Passes', '5');
    // 31 - 2 x 5 x 0.02.
    expect(screen.getByText(/this leaves 30\.8.mm\. Smallest usable: 22.mm/)).toBeInTheDocument();
    await user.click(button('Record it'));
    await waitFor(() => expect(sent(log)).toHaveLength(1));
    expect(recordEntryRequest.parse(sent(log)[0]?.body).step).toEqual({
      kind: 'dressed',
      depthMm: 0.02,
      passes: 5,
    });
  });

  it('puts the speed of a belt step into the field, and locks one that is too fast', async () => {
    const { user } = await show(mountedLife());
    await user.click(button('Trial run'));
    expect(screen.getByRole('radio', { name: /^B, 15.438.rpm.*Locked out/ })).toHaveAttribute(
      'aria-disabled',
      'true',
    );
    await user.click(screen.getByRole('radio', { name: /^A, 6.000.rpm/ }));
    expect(screen.getByRole('textbox', { name: 'Spindle speed' })).toHaveValue('6000');
  });

  it('says a refusal in words, loses nothing, and sends the same entry again', async () => {
    const life = mountedLife();
    let tries = 0;
    const { log, user } = await show(life, 'machinist', (asked) => {
      if (asked.method === 'GET') return taking(life)(asked);
      tries += 1;
      if (tries === 1) return 'no network';
      const detail = 'Dressing would leave 20 mm.';
      return refusal(422, 'refused-by-rule', {
        detail,
        errors: [{ path: 'step', message: detail }],
      });
    });
    await user.click(button('Dress'));
    fill('Depth of a pass', '0.02');
    fill('Passes', '5');
    await user.click(button('Record it'));
    expect(await screen.findByText(/server cannot be reached/)).toBeInTheDocument();
    await user.click(button('Record it'));
    expect(await screen.findByText('Dressing would leave 20 mm.')).toBeInTheDocument();
    const [first, second] = sent(log);
    expect(second?.body).toEqual(first?.body);
    // Closed and opened again, on this device the form is as it was left.
    await user.click(button('Close'));
    await user.click(button('Dress'));
    expect(screen.getByRole('textbox', { name: 'Passes' })).toHaveValue('5');
  });

  it('tells that somebody else was first, and sends on the newer version', async () => {
    let life = mountedLife();
    const { log, user } = await show(life, 'machinist', (asked) => {
      if (asked.method === 'GET') return { body: life };
      if ((asked.body as { version: number }).version === 5) return taking(life)(asked);
      life = { ...life, wheel: { ...life.wheel, version: 5 } };
      return refusal(409, 'stale-version', { current: life.wheel });
    });
    await user.click(button('Take off'));
    await user.click(button('It is off'));
    expect(await screen.findByText(/Somebody recorded another step/)).toBeInTheDocument();
    await waitFor(() => expect(log.at(-1)?.method).toBe('GET'));
    await user.click(button('It is off'));
    expect(await screen.findByText(/^Recorded: Taken off/)).toBeInTheDocument();
  });
});

describe('signatures', () => {
  const rung = entry(2, { kind: 'ring test', ring: 'clear' }, { needs: 'skilled', person: other });
  const waiting = (refused: string | null): WheelLife => {
    const life = wheelLife({ entries: { items: [rung], next: null } });
    const { standing } = life;
    return {
      ...life,
      standing: {
        ...standing,
        waiting: [
          {
            entryId: rung.id,
            kind: 'ring test',
            personId: OTHER_PERSON,
            needs: 'skilled',
            refusal: refused === null ? null : { code: 'not-skilled', words: refused },
          },
        ],
      },
    };
  };

  it('are given by those who may', async () => {
    const { log, user } = await show(waiting(null));
    await user.click(button(/^Sign for Ring test/));
    await user.click(button('I sign for this'));
    await waitFor(() => expect(sent(log)).toHaveLength(1));
    expect(recordEntryRequest.parse(sent(log)[0]?.body).step).toEqual({
      kind: 'countersigned',
      entryId: rung.id,
    });
  });

  it('are awaited by those who may not, with the reason', async () => {
    await show(waiting('A lead or a machinist signs for it.'), 'apprentice');
    expect(screen.getByText(/A lead or a machinist signs for it\./)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /^Sign for/ })).toBeNull();
  });
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
    expect(list.getByText('Dressed, 5 × 0.02\u00a0mm')).toHaveStyle(
      'text-decoration-line: line-through',
    );
    expect(list.getByText('Taken back by no.\u00a03: another wheel')).toBeInTheDocument();
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
