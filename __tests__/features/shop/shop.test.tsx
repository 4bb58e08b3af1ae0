import { fireEvent, screen, waitFor } from '@testing-library/react';

import { ShopScreen } from '@/features/shop/shop-screen';
import { updateShopRequest } from '@/shared/contracts/shops';
import { shopSchema, toRequest, valuesOf } from '@/features/shop/form';

import { refusal, serve, shop, SHOP_ID, showInShop } from '../../support/in-shop';
import { openAddress, visited } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const OTHER = '0190a000-0000-7000-8000-0000000000f2';
const members = {
  items: [
    { personId: '0190a000-0000-7000-8000-000000000002', name: 'Ada Quill', role: 'lead' },
    { personId: '0190a000-0000-7000-8000-000000000003', name: 'Bo Lathe', role: 'apprentice' },
  ],
};

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

it('names the people with their roles, and oneself', async () => {
  serve(() => ({ body: members }));
  showInShop(<ShopScreen />, { role: 'lead' });
  expect(await screen.findByText('Ada Quill (you)')).toBeInTheDocument();
  expect(screen.getByText('Bo Lathe')).toBeInTheDocument();
  expect(screen.getByText('Apprentice')).toBeInTheDocument();
});

it('lets the lead alone edit the shop, also by its address', () => {
  serve(() => ({ body: members }));
  openAddress({ edit: 'yes' });
  const page = showInShop(<ShopScreen />, { role: 'machinist' });
  expect(screen.queryByText('Save the shop')).toBeNull();
  expect(screen.queryByLabelText('Edit the shop')).toBeNull();
  page.unmount();
  showInShop(<ShopScreen />, { role: 'lead' });
  expect(screen.getByText('Save the shop')).toBeInTheDocument();
});

it("saves the shop's name at the version that was seen", async () => {
  openAddress({ edit: 'yes' });
  const log = serve(({ method }) =>
    method === 'PATCH' ? refusal(403, 'forbidden', { detail: 'Not allowed.' }) : { body: members },
  );
  showInShop(<ShopScreen />, { role: 'lead' });
  fireEvent.change(screen.getByLabelText('Name', { selector: 'input' }), {
    target: { value: 'Larkrise Two' },
  });
  fireEvent.click(screen.getByText('Save the shop'));
  expect(await screen.findByText('Not allowed.')).toBeInTheDocument();
  expect(log.find(({ method }) => method === 'PATCH')?.body).toEqual({
    version: 1,
    name: 'Larkrise Two',
    units: 'mm',
    timeZone: 'Europe/London',
  });
});

it.each([
  ['', false],
  [' ', false],
  ['L', true],
  ['L'.repeat(80), true],
  ['L'.repeat(81), false],
])('agrees with the contract on a name of %j', (name, verdict) => {
  const values = { ...valuesOf(shop, 'mm'), name };
  expect(shopSchema().isValidSync(values)).toBe(verdict);
  expect(updateShopRequest.safeParse({ version: 1, ...toRequest(values) }).success).toBe(verdict);
});

it('switches between shops, for people with more than one', async () => {
  serve(() => ({ body: members }));
  const one = { shopId: SHOP_ID, shopName: shop.name, role: 'lead' as const };
  const page = showInShop(<ShopScreen />, { role: 'lead' });
  expect(screen.queryByText('Switch shop')).toBeNull();
  page.unmount();
  showInShop(<ShopScreen />, {
    role: 'lead',
    shops: [one, { shopId: OTHER, shopName: 'Second Works', role: 'apprentice' }],
  });
  fireEvent.click(screen.getByText('Switch shop'));
  fireEvent.click(await screen.findByText('Second Works'));
  await waitFor(() => expect(visited()).toEqual([`/shops/${OTHER}`]));
});

it('keeps the units of a person, and leaves those of the shop', () => {
  const log = serve(() => ({ body: members }));
  showInShop(<ShopScreen />, { role: 'machinist' });
  fireEvent.click(screen.getByRole('radio', { name: 'Inches' }));
  expect(screen.getByRole('radio', { name: 'Inches' })).toBeChecked();
  expect(log.every(({ method }) => method === 'GET')).toBe(true);
});
