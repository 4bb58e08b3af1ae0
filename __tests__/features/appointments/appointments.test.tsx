import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { AppointmentsScreen } from '@/features/appointments/appointments-screen';
import { appointmentSchema, newAppointment, toRequest } from '@/features/appointments/form';
import { createAppointmentRequest, type Appointment } from '@/shared/contracts/appointments';

import { PERSON_ID, serve, showInShop, stored, type Asked } from '../../support/in-shop';
import { openAddress } from '../../support/router';

jest.mock('expo-router', () => jest.requireActual('../../support/router'));
jest.mock('expo-router/head', () => () => null);

const MACHINIST = '0190a000-0000-7000-8000-000000000003';
const APPRENTICE = '0190a000-0000-7000-8000-000000000004';
const members = {
  items: [
    { personId: PERSON_ID, name: 'Ada Quill', role: 'lead' },
    { personId: MACHINIST, name: 'Bo Lathe', role: 'machinist' },
    { personId: APPRENTICE, name: 'Cy Arbor', role: 'apprentice' },
  ],
};

const holding: Appointment = {
  ...stored,
  id: '0190a000-0000-7000-8000-0000000000d1',
  version: 2,
  personId: MACHINIST,
  personName: 'Bo Lathe',
  tasks: ['mount', 'dress'],
  wheelClass: 'vitrified wheels up to 150 mm',
  from: '2026-01-05',
  until: null,
  appointedBy: { personId: PERSON_ID, name: 'Ada Quill' },
  endedAt: null,
  holds: true,
};
const ended: Appointment = {
  ...holding,
  id: '0190a000-0000-7000-8000-0000000000d2',
  personName: 'Di Blotter',
  endedAt: '2026-02-01T10:00:00Z',
  holds: false,
};

const api =
  (items: Appointment[]) =>
  ({ method, path }: Asked) => {
    if (path === '/members') return { body: members };
    return { body: method === 'GET' ? { items } : holding };
  };
const posts = (log: Asked[]) => log.filter(({ method }) => method === 'POST');
const button = (name: string | RegExp) => screen.getByRole('button', { name });

beforeEach(() => {
  window.localStorage.clear();
  openAddress();
});

it('names who holds what, with which wheels, by whom and until when; the ended ones apart', async () => {
  serve(api([holding, ended]));
  showInShop(<AppointmentsScreen />, { role: 'machinist' });
  const now = within(await screen.findByRole('list', { name: 'Appointed now' }));
  expect(now.getByText('Bo Lathe')).toBeInTheDocument();
  expect(now.getByText('May mount and dress')).toBeInTheDocument();
  expect(now.getByText('From 5 Jan 2026, by Ada Quill')).toBeInTheDocument();
  const before = within(screen.getByRole('list', { name: 'Ended, or not begun' }));
  expect(before.getByText(/by Ada Quill, ended 1 Feb 2026/)).toBeInTheDocument();
});

it('is read and not changed by anybody but a lead', async () => {
  serve(api([holding]));
  showInShop(<AppointmentsScreen />, { role: 'apprentice' });
  expect(await screen.findByText(/A lead appoints people/)).toBeInTheDocument();
  expect(screen.queryByRole('button', { name: /Appoint|End/ })).toBeNull();
});

it('says what the register is for while nobody stands in it', async () => {
  serve(api([]));
  showInShop(<AppointmentsScreen />, { role: 'lead' });
  expect(await screen.findByText('Nobody is appointed yet')).toBeInTheDocument();
});

it('appoints a lead or a machinist, never an apprentice', async () => {
  const log = serve(api([]));
  const user = userEvent.setup();
  showInShop(<AppointmentsScreen />, { role: 'lead' });
  await user.click(await screen.findByRole('button', { name: 'Appoint somebody' }));
  await user.click(button('Appoint'));
  expect(await screen.findByRole('heading', { name: '2 things to put right' })).toBeInTheDocument();
  expect(posts(log)).toEqual([]);
  expect(screen.queryByRole('radio', { name: /Cy Arbor/ })).toBeNull();
  await user.click(await screen.findByRole('radio', { name: /Bo Lathe/ }));
  await user.click(screen.getByRole('checkbox', { name: 'Dress wheels' }));
  fireEvent.change(screen.getByRole('textbox', { name: 'Class of wheel' }), {
    target: { value: ' mounted wheels ' },
  });
  await user.click(button('Appoint'));
  await waitFor(() => expect(posts(log)).toHaveLength(1));
  expect(createAppointmentRequest.parse(posts(log)[0]?.body)).toMatchObject({
    personId: MACHINIST,
    tasks: ['mount', 'trial run'],
    wheelClass: 'mounted wheels',
    until: null,
  });
});

it('ends an appointment at the version that was seen', async () => {
  const log = serve(api([holding]));
  const user = userEvent.setup();
  showInShop(<AppointmentsScreen />, { role: 'lead' });
  await user.click(await screen.findByRole('button', { name: 'End the appointment of Bo Lathe' }));
  await user.click(button('End it now'));
  await waitFor(() => expect(posts(log)).toHaveLength(1));
  expect(posts(log)[0]).toMatchObject({
    path: `/appointments/${holding.id}/end`,
    body: { version: 2 },
  });
});

it.each([
  ['whole', {}, true],
  ['one day', { from: '2026-03-02', until: '2026-03-02' }, true],
  ['ends before it begins', { from: '2026-03-02', until: '2026-03-01' }, false],
  ['no task', { tasks: [] }, false],
  ['no class', { wheelClass: ' ' }, false],
  ['a class of 121 letters', { wheelClass: 'x'.repeat(121) }, false],
] as const)('form and contract agree: %s', (_, change, verdict) => {
  const values = {
    ...newAppointment('2026-03-02'),
    personId: MACHINIST,
    wheelClass: 'all wheels',
    ...change,
    tasks: 'tasks' in change ? [] : newAppointment('2026-03-02').tasks,
  };
  expect(appointmentSchema.isValidSync(values)).toBe(verdict);
  expect(createAppointmentRequest.safeParse(toRequest(values, '2026-03-02')).success).toBe(verdict);
});
