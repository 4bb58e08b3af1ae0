import { fireEvent, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { WheelForm } from '@/features/wheels/wheel-form';

import { serve, SHOP_ID, showInShop } from '../../support/in-shop';
import { openAddress } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

const backTo = { pathname: '/shops/[shopId]/wheels', params: { shopId: SHOP_ID } } as const;
const field = (name: string) => screen.getByLabelText(name, { selector: 'input' });
const fill = (name: string, text: string) =>
  fireEvent.change(field(name), { target: { value: text } });
const show = () => {
  serve(() => ({ body: { items: [] } }));
  showInShop(<WheelForm wheel={null} backTo={backTo} />);
};

it('reads all three sizes of a label from the first field, pasted or left', () => {
  show();
  const sizes = () =>
    ['Diameter when new', 'Width', 'Hole'].map((name) => (field(name) as HTMLInputElement).value);
  fill('Diameter when new', '25 x 20 × 8');
  expect(sizes()).toEqual(['25', '20', '8']);
  // Letter by letter nothing is read before the field is left: the hole may be 1 or 10.
  for (const typed of ['32 x 16 x', '32 x 16 x 1', '32 x 16 x 10'])
    fill('Diameter when new', typed);
  expect(sizes()).toEqual(['32 x 16 x 10', '20', '8']);
  fireEvent.blur(field('Diameter when new'));
  expect(sizes()).toEqual(['32', '16', '10']);
  fill('Diameter when new', '1 x 3/4 x 3/8 in');
  expect(sizes()).toEqual(['1 in', '3/4 in', '3/8 in']);
});

it('folds what few wheels need, and opens a fold that holds a mistake', async () => {
  const user = userEvent.setup();
  show();
  fill('Tag', 'R-15');
  fill('Diameter when new', '32 x 16 x 10');
  expect(screen.queryByLabelText('Smallest usable diameter')).toBeNull();
  await user.click(screen.getByRole('button', { name: /^Smallest usable diameter/ }));
  fill('Smallest usable diameter', '9');
  await user.click(screen.getByRole('button', { name: /^Smallest usable diameter/ }));
  await user.click(screen.getByRole('button', { name: 'Save the wheel' }));
  expect(
    await screen.findAllByText(/^Smallest usable diameter is above the hole, 10\smm\.$/),
  ).not.toHaveLength(0);
  expect(field('Smallest usable diameter')).toHaveValue('9');
});
