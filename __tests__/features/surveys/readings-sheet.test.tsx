import { fireEvent, screen, within } from '@testing-library/react';

import { ReadingsSheet } from '@/features/surveys';

import { showInShop } from '../../support/in-shop';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));

const used = jest.fn();
const NEAR_AND_FAR = [
  { id: 'near', label: 'Near, at 20 mm' },
  { id: 'far', label: 'Far' },
];

function show(props: Partial<Parameters<typeof ReadingsSheet>[0]> = {}) {
  return showInShop(
    <ReadingsSheet
      open
      onClose={() => undefined}
      planes={NEAR_AND_FAR}
      side="outside"
      counting="Angles count from jaw 1."
      uses="offset"
      keptAs="readings:one"
      onUse={used}
      {...props}
    />,
  );
}

const field = () => screen.getByLabelText('Readings', { selector: 'textarea' });
const type = (text: string) => fireEvent.change(field(), { target: { value: text } });
const readout = (label: string) =>
  screen.getByRole('button', { name: new RegExp(`^${label.replace(/[()]/g, '\\$&')}: `) });

/** Read every 30 degrees, in hundredths of a millimetre: worked out in the rules' published checks. */
const WORKED = '1.11; 1.12; 1.09; 1.07; 1.04; .96; .89; .88; .91; .93; .96; 1.04';

beforeEach(() => {
  window.localStorage.clear();
  used.mockClear();
});

it('shows the circle of the worked readings: 0.1176 off centre, 0.0427 out of round', () => {
  show();
  type(WORKED);
  expect(readout('Eccentricity')).toHaveAccessibleName(/0\.118.mm/);
  expect(readout('Out-of-round')).toHaveAccessibleName(/0\.043.mm/);
  expect(readout('High spot')).toHaveAccessibleName(/: 39°/);
  expect(readout('Run-out of the circle (TIR)')).toHaveAccessibleName(/0\.235.mm/);
  expect(readout('Whole swing as read (TIR)')).toHaveAccessibleName(/0\.24.mm/);
  expect(
    screen.getByText(
      /^12 readings, lowest 0\.880.mm at 210°, highest 1\.120.mm at 30°\. .* at 39°\.$/,
    ),
  ).toBeInTheDocument();
});

it('opens the working of a figure', async () => {
  show();
  type(WORKED);
  fireEvent.click(readout('Run-out of the circle (TIR)'));
  expect(await screen.findByText('eccentricity of the fitted circle')).toBeInTheDocument();
});

it('gives the offset of the chosen plane to jaws, rounded up', () => {
  show();
  fireEvent.click(screen.getByRole('radio', { name: 'Far' }));
  type(WORKED);
  fireEvent.click(screen.getByRole('button', { name: 'Use 0.236 mm at 39°' }));
  expect(used).toHaveBeenCalledWith({ plane: 'far', runOut: '0.236', highSpot: '39' });
});

it('gives round work the larger of what was read and what the circle shows', () => {
  show({ planes: [{ id: 'worst', label: 'Worst' }], uses: 'whole swing' });
  expect(screen.queryByRole('radiogroup', { name: 'Plane' })).toBeNull();
  type(WORKED);
  expect(screen.getByRole('button', { name: 'Use 0.24 mm' })).toBeInTheDocument();
  type('0.1; 0; 0');
  // 0.1 was read; the circle through the three runs out by 0.1333.
  expect(screen.getByRole('button', { name: 'Use 0.134 mm' })).toBeInTheDocument();
});

it('says that three readings leave nothing to judge roundness by', () => {
  show();
  type('0.1; 0; 0');
  expect(readout('Out-of-round')).toHaveAccessibleName(/not known yet/);
  expect(screen.getByText(/take four or more/)).toBeInTheDocument();
});

it('asks for more readings, and for readings that are spread', () => {
  show();
  type('0.1; 0');
  expect(screen.getByText(/A circle needs three readings/)).toBeInTheDocument();
  type('0: 0.1; 0: 0; 180: 0.2');
  expect(screen.getByText(/too close together/)).toBeInTheDocument();
  expect(screen.queryByRole('button', { name: /^Use / })).toBeNull();
});

it('turns the high spot round for an indicator inside a bore', () => {
  show();
  type(WORKED);
  fireEvent.click(screen.getByRole('button', { name: /^How they were taken/ }));
  const sides = screen.getByRole('radiogroup', { name: 'The indicator touches the surface' });
  fireEvent.click(within(sides).getByRole('radio', { name: 'inside a bore' }));
  expect(readout('High spot')).toHaveAccessibleName(/: 219°/);
  expect(screen.getByText(/^Signs are turned round below/)).toBeInTheDocument();
});

it('says at the field what cannot be read, and keeps it', () => {
  show();
  type('0.1; so');
  expect(field()).toHaveValue('0.1; so');
  expect(field()).toHaveAccessibleDescription(/Reading 2 is a number/);
});

it('still has what was typed after it was closed, in the unit it was typed in', () => {
  const { unmount } = show();
  type(WORKED);
  unmount();
  show();
  expect(field()).toHaveValue(WORKED);
});
