import { fireEvent, screen, waitFor } from '@testing-library/react';

import { GrinderForm } from '@/features/machines/grinder-form';
import { GrinderScreen } from '@/features/machines/grinder-screen';
import { LatheForm } from '@/features/machines/lathe-form';
import type { CreateGrinderRequest, CreateLatheRequest } from '@/shared/contracts/machines';

import { serve, SHOP_ID, showInShop, stored, type Asked } from '../../support/in-shop';
import { openAddress, visited } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const backTo = { pathname: '/shops/[shopId]/machines', params: { shopId: SHOP_ID } } as const;
const MACHINES = `/shops/${SHOP_ID}/machines`;

const fields = (name: string) => screen.getAllByLabelText(name, { selector: 'input, textarea' });
const fill = (name: string, text: string, at = 0) =>
  fireEvent.change(fields(name)[at] as HTMLElement, { target: { value: text } });
const storing = ({ method, body }: Asked) =>
  method === 'GET' ? { body: { items: [] } } : { body: { ...(body as object), ...stored } };
const sent = <T,>(log: Asked[]) => log.find(({ method }) => method === 'POST')?.body as T;

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

function fillGrinder() {
  fill('Name', 'Post grinder B');
  fill('Motor, no load', '2850');
  fill('Motor power', '370');
  fill('Pulley on the motor', '130');
  fill('Pulley on the spindle', '24');
  fill('Belt thickness', '2');
}

it('shows what each step gives as its pulleys are typed', () => {
  serve(storing);
  showInShop(<GrinderForm grinder={null} backTo={backTo} />);
  fillGrinder();
  // Against the limits 2850 x 130/24 = 15 437.5; with the belt 2850 x 132/26 = 14 469.2 (Khurmi ch. 33).
  expect(screen.getByLabelText(/^Held against the limits: 15\s438/)).toBeInTheDocument();
  expect(screen.getByLabelText(/^To be expected: 14\s469/)).toBeInTheDocument();
});

it('moves the focus to a new row, and back to its button when the row is gone', async () => {
  serve(storing);
  showInShop(<GrinderForm grinder={null} backTo={backTo} />);
  fillGrinder();
  fireEvent.click(screen.getByText('Add a belt step'));
  await waitFor(() => expect(fields('Step')[1]).toHaveFocus());
  expect(fields('Step')[1]).toHaveValue('B');
  expect(fields('Belt thickness')[1]).toHaveValue('2');
  fireEvent.click(screen.getByLabelText('Remove belt step B'));
  await waitFor(() => expect(screen.getByText('Add a belt step').closest('button')).toHaveFocus());
  expect(fields('Step')).toHaveLength(1);
});

it('opens a fold that holds a mistake, and asks for the whole measurement', async () => {
  const log = serve(storing);
  showInShop(<GrinderForm grinder={null} backTo={backTo} />);
  fillGrinder();
  fireEvent.click(screen.getByText('Measured'));
  fill('Measured rpm', '14400');
  fireEvent.click(screen.getByText('Measured'));
  expect(screen.queryByLabelText('Measured on')).toBeNull();
  fireEvent.click(screen.getByText('Save the grinder'));
  expect(
    (await screen.findAllByText(/the day on which the rpm was measured/)).length,
  ).toBeGreaterThan(1);
  expect(screen.getByLabelText('Measured on')).toBeInTheDocument();
  expect(sent(log)).toBeUndefined();
});

it('sends steps and quills with their sections from the wheel end', async () => {
  const log = serve(storing);
  showInShop(<GrinderForm grinder={null} backTo={backTo} />);
  fillGrinder();
  fireEvent.click(screen.getByText('Add a quill or arbor'));
  fill('Name', 'Stepped quill', 1);
  fill('Seat', '10');
  fill('Length 1', '30');
  fill('Diameter 1', '10');
  fireEvent.click(screen.getByText('Add a section'));
  fill('Length 2', '50');
  fill('Diameter 2', '20');
  fireEvent.click(screen.getByText('Save the grinder'));
  await waitFor(() => expect(visited()).toEqual([MACHINES]));
  const body = sent<CreateGrinderRequest>(log);
  expect(body.data.beltSteps).toMatchObject([
    { name: 'A', drivingPulleyMm: 130, drivenPulleyMm: 24, beltThicknessMm: 2, measured: null },
  ]);
  expect(body.quills).toMatchObject([
    {
      name: 'Stepped quill',
      data: {
        segments: [
          { lengthMm: 30, diameterMm: 10 },
          { lengthMm: 50, diameterMm: 20 },
        ],
        threadHand: null,
      },
    },
  ]);
});

it('sends speeds and feeds as they were read', async () => {
  const log = serve(storing);
  showInShop(<LatheForm lathe={null} backTo={backTo} />);
  fill('Name', 'Lathe 3');
  fill('Spindle speeds', '45, 70');
  fill('Feeds', '0,05; 0,1');
  fill('One division of the cross-slide', '0.02');
  fireEvent.click(screen.getByText('Save the lathe'));
  expect((await screen.findAllByText(/may be one number or several/)).length).toBeGreaterThan(0);
  fill('Spindle speeds', '70\n45');
  fireEvent.click(screen.getByText('Save the lathe'));
  await waitFor(() => expect(visited()).toEqual([MACHINES]));
  expect(sent<CreateLatheRequest>(log).data).toMatchObject({
    spindleSpeedsRpm: [45, 70],
    feedsMmPerRev: [0.05, 0.1],
    crossSlideDivisionMm: 0.02,
    compoundZero: null,
  });
});

it('shows an apprentice the facts of a grinder and no field', async () => {
  const grinderId = '0190a000-0000-7000-8000-0000000000b1';
  const grinder = {
    ...stored,
    id: grinderId,
    name: 'Post grinder B',
    typed: {},
    data: {
      motorNoLoadRpm: 2850,
      motorPowerW: 370,
      spindleMaximumRpm: null,
      beltSteps: [
        {
          id: '0190a000-0000-7000-8000-0000000000b2',
          name: 'A',
          drivingPulleyMm: 130,
          drivenPulleyMm: 24,
          beltThicknessMm: 2,
          measured: { rpm: 14400, measuredOn: '2026-02-01', instrument: 'Tachometer 2' },
        },
      ],
      guard: 'none',
      postStiffnessNPerMm: null,
      wheelRotation: null,
      shimsMm: [],
    },
    quills: [],
  };
  openAddress({ grinderId });
  serve(() => ({ body: { items: [grinder] } }));
  showInShop(<GrinderScreen />, { role: 'apprentice' });
  expect(
    await screen.findByText(
      /130\smm to 24\smm, belt 2\smm, measured 14\s400\srpm \(Tachometer 2, 1 Feb 2026\)/,
    ),
  ).toBeInTheDocument();
  expect(document.querySelector('input, textarea')).toBeNull();
  expect(screen.queryByText('Save the grinder')).toBeNull();
});
