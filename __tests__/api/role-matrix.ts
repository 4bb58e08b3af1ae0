import { v7 as uuidv7 } from 'uuid';

import {
  grinderBody,
  latheBody,
  setupBody,
  wheelBody,
  entryBody,
  appointmentBody,
} from '../support/bodies';

/** Who knocks: nobody, the three roles of the shop, and the lead of another shop. */
export const CALLERS = ['anonymous', 'apprentice', 'machinist', 'lead', 'stranger'] as const;
export type CallerName = (typeof CALLERS)[number];

interface Operation {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** As the route is declared, below /api. */
  path: string;
  /** What each caller is answered, in the order of CALLERS. */
  answers: readonly [number, number, number, number, number];
  /** What is sent; `id` is of a thing the shop has, in its first version. */
  body?: (ids: { lead: string }) => object;
  /** What the thing at `:id` is. */
  of?: 'lathes' | 'grinders' | 'wheels' | 'setups' | 'appointments';
}

const shop = '/shops/:shopId';
const renamed = ({ id: _id, ...content }: { id: string }) => ({ version: 1, ...content });
const editedWheel = () => {
  const { received: _received, ...body } = wheelBody();
  return renamed(body);
};

const READ = [401, 200, 200, 200, 404] as const;
const EDIT_BY_SKILLED = [401, 403, 200, 200, 404] as const;
const CREATE_BY_SKILLED = [401, 403, 201, 201, 404] as const;
const EDIT_BY_ALL = [401, 200, 200, 200, 404] as const;
const CREATE_BY_ALL = [401, 201, 201, 201, 404] as const;
const BY_LEAD = [401, 403, 403, 200, 404] as const;

/** Every operation of the API and who may do it: product.md's table, as the server answers it. */
export const ROLE_MATRIX: readonly Operation[] = [
  { method: 'get', path: '/health', answers: [200, 200, 200, 200, 200] },
  { method: 'get', path: '/ready', answers: [200, 200, 200, 200, 200] },
  { method: 'get', path: '/session', answers: [200, 200, 200, 200, 200] },
  {
    method: 'post',
    path: '/session',
    answers: [401, 401, 401, 401, 401],
    body: () => ({ email: `${uuidv7()}@example.test`, password: 'not anyone’s' }),
  },
  { method: 'delete', path: '/session', answers: [204, 204, 204, 204, 204] },
  {
    method: 'post',
    path: '/sign-up',
    answers: [201, 201, 201, 201, 201],
    body: () => ({
      personId: uuidv7(),
      shopId: uuidv7(),
      name: 'New Person',
      email: `${uuidv7()}@example.test`,
      password: 'seven slow barges pass',
      shopName: 'New Shop',
      units: 'mm',
      timeZone: 'UTC',
    }),
  },
  { method: 'get', path: shop, answers: READ },
  {
    method: 'patch',
    path: shop,
    answers: BY_LEAD,
    body: () => ({ version: 1, name: 'New name', units: 'mm', timeZone: 'UTC' }),
  },
  { method: 'get', path: `${shop}/members`, answers: READ },

  { method: 'get', path: `${shop}/lathes`, answers: READ },
  { method: 'post', path: `${shop}/lathes`, answers: CREATE_BY_SKILLED, body: () => latheBody() },
  { method: 'get', path: `${shop}/lathes/:id`, of: 'lathes', answers: READ },
  {
    method: 'put',
    path: `${shop}/lathes/:id`,
    of: 'lathes',
    answers: EDIT_BY_SKILLED,
    body: () => renamed(latheBody()),
  },

  { method: 'get', path: `${shop}/grinders`, answers: READ },
  {
    method: 'post',
    path: `${shop}/grinders`,
    answers: CREATE_BY_SKILLED,
    body: () => grinderBody(),
  },
  { method: 'get', path: `${shop}/grinders/:id`, of: 'grinders', answers: READ },
  {
    method: 'put',
    path: `${shop}/grinders/:id`,
    of: 'grinders',
    answers: EDIT_BY_SKILLED,
    body: () => renamed(grinderBody()),
  },

  { method: 'get', path: `${shop}/wheels`, answers: READ },
  { method: 'post', path: `${shop}/wheels`, answers: CREATE_BY_SKILLED, body: () => wheelBody() },
  { method: 'get', path: `${shop}/wheels/:id`, of: 'wheels', answers: READ },
  {
    method: 'put',
    path: `${shop}/wheels/:id`,
    of: 'wheels',
    answers: EDIT_BY_SKILLED,
    body: editedWheel,
  },
  { method: 'get', path: `${shop}/wheel-places`, answers: READ },
  { method: 'get', path: `${shop}/wheels/:id/life`, of: 'wheels', answers: READ },
  { method: 'get', path: `${shop}/wheels/:id/entries`, of: 'wheels', answers: READ },
  {
    method: 'post',
    path: `${shop}/wheels/:id/entries`,
    of: 'wheels',
    answers: CREATE_BY_ALL,
    body: () => entryBody({ kind: 'ring test', ring: 'clear' }),
  },

  { method: 'get', path: `${shop}/appointments`, answers: READ },
  {
    method: 'post',
    path: `${shop}/appointments`,
    answers: [401, 403, 403, 201, 404],
    body: ({ lead }) => appointmentBody(lead),
  },
  {
    method: 'post',
    path: `${shop}/appointments/:id/end`,
    of: 'appointments',
    answers: BY_LEAD,
    body: () => ({ version: 1 }),
  },

  { method: 'get', path: `${shop}/setups`, answers: READ },
  { method: 'post', path: `${shop}/setups`, answers: CREATE_BY_ALL, body: () => setupBody() },
  { method: 'get', path: `${shop}/setups/:id`, of: 'setups', answers: READ },
  {
    method: 'put',
    path: `${shop}/setups/:id`,
    of: 'setups',
    answers: EDIT_BY_ALL,
    body: () => renamed(setupBody()),
  },
  {
    method: 'post',
    path: `${shop}/setups/:id/duplicate`,
    of: 'setups',
    answers: CREATE_BY_ALL,
    body: () => ({ id: uuidv7(), name: 'A copy' }),
  },
  {
    method: 'post',
    path: `${shop}/setups/:id/retire`,
    of: 'setups',
    answers: EDIT_BY_ALL,
    body: () => ({ version: 1 }),
  },
];
