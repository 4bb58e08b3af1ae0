import { screen, waitFor } from '@testing-library/react';

import { recordEntryRequest, type WheelLife } from '@/shared/contracts/wheel-entries';

import { refusal } from '../../support/in-shop';
import { openAddress } from '../../support/router';
import { button, fill, sent, show, taking } from '../../support/show-wheel-page';
import {
  entry,
  mountedLife,
  OTHER_PERSON,
  QUILL_ID,
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
