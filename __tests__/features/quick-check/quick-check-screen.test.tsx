import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { QuickCheckScreen } from '@/features/quick-check/quick-check-screen';

jest.mock('expo-router', () => ({
  ...jest.requireActual('expo-router'),
  useRouter: () => ({ dismissTo: jest.fn() }),
}));
jest.mock('expo-router/head', () => () => null);

function show() {
  const client = new QueryClient({ defaultOptions: { queries: { enabled: false } } });
  return render(
    <QueryClientProvider client={client}>
      <QuickCheckScreen />
    </QueryClientProvider>,
  );
}

const field = (label: string) => screen.getByRole('textbox', { name: label });
const verdict = () =>
  screen
    .getAllByRole('status')
    .map((node) => node.textContent)
    .join(' ');

beforeEach(() => window.localStorage.clear());

it('says neutrally what an empty check needs', () => {
  show();
  expect(verdict()).toContain('Needs 3 things');
  expect(screen.queryByRole('alert')).toBeNull();
});

it('stops a wheel that would run above its marking, with both figures', async () => {
  const user = userEvent.setup();
  show();
  await user.click(screen.getByRole('radio', { name: 'inch' }));
  await user.type(field('Wheel diameter, new'), '1 1/4');
  await user.type(field('Marked limit'), '25');
  await user.click(screen.getByRole('radio', { name: 'motor and pulleys' }));
  await user.type(field('Motor, no load'), '2850');
  await user.type(field('Pulley on the motor'), '130 mm');
  await user.type(field('Pulley on the spindle'), '24 mm');
  // 60 000 x 25 / (pi x 31.75) = 15 038; 2850 x 130 / 24 = 15 437.5 (29 CFR 1910.215(d)(1); Khurmi ch. 33).
  expect(verdict()).toContain('Stop');
  expect(screen.getAllByText(/15\s038/).length).toBeGreaterThan(0);
  expect(screen.getAllByText(/15\s438/).length).toBeGreaterThan(0);
});

it('opens the working of a figure', async () => {
  const user = userEvent.setup();
  show();
  await user.type(field('Wheel diameter, new'), '31.75');
  await user.type(field('Marked limit'), '25');
  await user.click(screen.getByRole('button', { name: /^Limit: / }));
  expect(await screen.findByText(/Title 8, s\. 3580/)).toBeInTheDocument();
});

it('names the field and keeps what was typed when it cannot be read', async () => {
  const user = userEvent.setup();
  const { unmount } = show();
  await user.type(field('Wheel diameter, new'), 'big');
  await user.tab();
  expect(screen.getByText(/Wheel diameter, new is a number/)).toBeInTheDocument();
  unmount();
  show();
  expect(field('Wheel diameter, new')).toHaveValue('big');
});

it('shows the same wheel in other units', async () => {
  const user = userEvent.setup();
  show();
  await user.type(field('Wheel diameter, new'), '25.4');
  await user.click(screen.getByRole('radio', { name: 'inch' }));
  expect(field('Wheel diameter, new')).toHaveValue('1');
});
