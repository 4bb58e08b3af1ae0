import {
  makeShop,
  startApi,
  visitorOf,
  type Api,
  type TestShop,
  type Visitor,
} from '../support/api';
import { appointmentBody, grinderBody, latheBody, setupBody, wheelBody } from '../support/bodies';
import { problemOf } from '../support/item-tests';
import { CALLERS, ROLE_MATRIX, type CallerName } from './role-matrix';

const BODIES = {
  lathes: () => latheBody(),
  grinders: () => grinderBody(),
  wheels: () => wheelBody(),
  setups: () => setupBody(),
  appointments: ({ lead }: { lead: string }) => appointmentBody(lead),
} as const;

/** A session that such an operation ends or replaces is not one that others go on to use. */
const ENDS_SESSION = new Set(['/session', '/sign-up']);

describe('who may do what', () => {
  let api: Api;
  let shop: TestShop;
  let stranger: TestShop;
  beforeAll(async () => {
    api = await startApi();
    shop = await makeShop(api);
    stranger = await makeShop(api, 'Another shop');
  });
  afterAll(() => api.stop());

  const visitorFor = (caller: CallerName): Visitor => {
    if (caller === 'anonymous') return visitorOf(api);
    return caller === 'stranger' ? stranger.as.lead : shop.as[caller];
  };

  const make = async (of: keyof typeof BODIES): Promise<string> => {
    const body = BODIES[of](shop.ids);
    await shop.as.lead.post(`${shop.path}/${of}`).send(body).expect(201);
    return body.id;
  };

  it('is laid down for every route there is, and for no other', () => {
    const named = ({ method, path }: { method: string; path: string }) => `${method} ${path}`;
    expect(ROLE_MATRIX.map(named).sort()).toEqual(api.routes.map(named).sort());
  });

  it.each(ROLE_MATRIX.map((operation) => [operation.method, operation.path, operation] as const))(
    '%s %s',
    async (method, path, { of, body, answers }) => {
      for (const [index, caller] of CALLERS.entries()) {
        if (caller === 'stranger' && ENDS_SESSION.has(path)) continue;
        const where = path.replace(':shopId', shop.shopId).replace(':id', of ? await make(of) : '');
        const version = of ? undefined : await shopVersion();
        const sent = body && { ...body(shop.ids), ...(method === 'patch' ? { version } : {}) };
        const response = await visitorFor(caller)[method](`/api${where}`).send(sent);
        expect([caller, response.status]).toEqual([caller, answers[index]]);
        if (response.status >= 400) problemOf(response);
        if (ENDS_SESSION.has(path)) shop = await makeShop(api);
      }
    },
  );

  const shopVersion = async (): Promise<number> =>
    (await shop.as.lead.get(shop.path).expect(200)).body.version;
});
