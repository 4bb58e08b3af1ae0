import { fireEvent, screen, waitFor, within } from '@testing-library/react';

import { newValues } from '@/features/setups/form';
import { Planner } from '@/features/setups/planner';
import type { Grinder, Lathe } from '@/shared/contracts/machines';
import type { SetupInputs } from '@/shared/domain/setups';

import { LATHE, SHAFT_GRINDER, taperInput } from '../../support/plan-inputs';
import { serve, showInShop, stored } from '../../support/in-shop';
import { openAddress } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const SETUP_ID = '0190a000-0000-7000-8000-000000000901';
const LATHE_ID = '0190a000-0000-7000-8000-000000000902';
const GRINDER_ID = '0190a000-0000-7000-8000-000000000903';

const lathe = (data: Partial<Lathe['data']> = {}): Lathe => ({
  id: LATHE_ID,
  ...stored,
  name: 'Bench lathe',
  data: { ...LATHE, ...data },
  typed: {},
});
const grinder: Grinder = {
  id: GRINDER_ID,
  ...stored,
  name: 'Post grinder',
  data: {
    ...SHAFT_GRINDER,
    beltSteps: SHAFT_GRINDER.beltSteps.map((step, index) => ({
      ...step,
      id: `0190a000-0000-7000-8000-00000000091${index}`,
    })),
    shimsMm: [0.5, 1],
  },
  typed: {},
  quills: [],
};

/** Opens a taper on the machines; `work` and `machine` change what is answered. */
function showTaper(
  change: { work?: Partial<SetupInputs['work']>; lathe?: Partial<Lathe['data']> } = {},
) {
  const { work } = taperInput();
  const values = newValues('taper', 'mm');
  serve(({ path }) => {
    if (path.startsWith('/lathes')) return { body: { items: [lathe(change.lathe)] } };
    if (path.startsWith('/grinders')) return { body: { items: [grinder] } };
    return { status: 404 };
  });
  const inputs: SetupInputs = {
    ...values.inputs,
    work: { ...work, ...change.work },
    machine: { ...values.inputs.machine, latheId: LATHE_ID, grinderId: GRINDER_ID },
  };
  showInShop(
    <Planner
      setupId={SETUP_ID}
      start={{
        values: { ...values, inputs },
        version: null,
        savedAt: null,
        unsent: false,
        theirs: null,
      }}
    />,
  );
}

const tab = (name: string) => fireEvent.click(screen.getByRole('tab', { name: new RegExp(name) }));
const row = (name: RegExp) => screen.findByRole('button', { name });

beforeEach(() => {
  // A phone's width, at which the parts are tabs.
  Object.defineProperty(document.documentElement, 'clientWidth', {
    value: 390,
    configurable: true,
  });
  openAddress();
});

it('reads the compound as this lathe marks it, both ways while nobody has looked', async () => {
  showTaper({ work: { includedAngleDeg: 40 }, lathe: { compoundZero: 'spindle-axis' } });
  expect(await row(/Set the compound to.*along the bed.*20/)).toBeInTheDocument();
  await waitFor(() =>
    expect(screen.queryByRole('button', { name: /Set the compound to.*across/ })).toBeNull(),
  );
});

it('gives both readings while nobody has looked', async () => {
  showTaper({ work: { includedAngleDeg: 40 }, lathe: { compoundZero: null } });
  expect(await row(/Set the compound to.*across the bed.*70/)).toBeInTheDocument();
  expect(await row(/Set the compound to.*along the bed.*20/)).toBeInTheDocument();
});

it('takes a lathe centre in one press', async () => {
  showTaper({ work: { includedAngleDeg: null } });
  fireEvent.click(await screen.findByRole('button', { name: 'A lathe centre: 60°' }));
  expect(screen.getByLabelText('Included angle')).toHaveValue('60');
  expect(screen.queryByRole('button', { name: 'A lathe centre: 60°' })).toBeNull();
});

it('says at the field that a cone runs past its point', async () => {
  showTaper();
  const length = await screen.findByLabelText('Length along the axis');
  fireEvent.change(length, { target: { value: '22' } });
  expect(await screen.findByText(/run past its own point/)).toBeInTheDocument();
  fireEvent.change(length, { target: { value: '21' } });
  expect(screen.queryByText(/run past its own point/)).toBeNull();
});

it('reads a taper as a fraction, and asks for what the drawing gives', async () => {
  showTaper({ work: { includedAngleDeg: null } });
  fireEvent.click(await screen.findByRole('radio', { name: 'Taper', checked: false }));
  fireEvent.change(await screen.findByRole('textbox', { name: 'Taper' }), {
    target: { value: '1/20' },
  });
  expect(await row(/^The cone: 1\.43° to the axis/)).toBeInTheDocument();
});

it('names the shims that raise the wheel', async () => {
  showTaper();
  await screen.findByLabelText('Included angle');
  tab('Machine');
  fireEvent.click(await screen.findByRole('button', { name: /^Centre height/ }));
  fireEvent.change(screen.getByLabelText('Wheel axis below centre'), { target: { value: '1.5' } });
  expect(await screen.findByText(/kept with the grinder: 1.mm \+ 0\.5.mm/)).toBeInTheDocument();
});

it('moves the tailstock towards the wheel when the tail end is larger', async () => {
  showTaper({
    work: {
      taperMethod: 'tailstock',
      holding: 'centres',
      unsupportedLengthMm: 200,
      headEndMm: 25,
      tailEndMm: 25.02,
      endsApartMm: 100,
    },
  });
  const fold = await screen.findByRole('button', { name: /^Ends came out unlike/ });
  expect(fold).toHaveAccessibleName(/tailstock 0\.02.mm towards the wheel/);
  fireEvent.click(fold);
  expect(
    within(screen.getByRole('list', { name: 'Tailstock' })).getByText(/0\.02/),
  ).toBeInTheDocument();
});
