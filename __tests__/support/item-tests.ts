import { v7 as uuidv7 } from 'uuid';
import type * as z from 'zod';

import { problemDetails } from '@/shared/contracts/problem';

import { auditOf, makeShop, startApi, visitorOf, type Api, type TestShop } from './api';
import { dotted, leavesOf, withValue } from './field-paths';

interface ItemKind<B extends { id: string }> {
  /** Where the shop keeps them: the last part of the path. */
  place: string;
  subject: string;
  /** Of one of them, as the server answers. */
  contract: z.ZodType;
  /** A request that is accepted, another one each time. */
  body(): B;
  /** The request with something of it changed. */
  edited(body: B): B;
  /** Parts of a request that are for its making alone: no edit has them, and no answer. */
  onlyAtFirst?: (keyof B)[];
  /** Values outside what a field takes, by its dotted path. */
  wrong: Record<string, unknown>;
}

export function problemOf(response: { type: string; body: unknown }) {
  expect(response.type).toBe('application/problem+json');
  return problemDetails.parse(response.body);
}

const atOrBelow = (path: string) =>
  expect.stringMatching(new RegExp(`^${path.replaceAll('.', '\\.')}(\\.|$)`));

/** What holds for every kind of thing a shop keeps: creating, reading, editing, and each refusal. */
export function describeItem<B extends { id: string }>(kind: ItemKind<B>): void {
  const { place, subject, contract, body, edited, wrong, onlyAtFirst = [] } = kind;
  let api: Api;
  let shop: TestShop;
  let stranger: TestShop;
  const all = () => `${shop.path}/${place}`;
  const lasting = (request: B): Partial<B> => {
    const content: Partial<B> = { ...request };
    for (const key of onlyAtFirst) delete content[key];
    return content;
  };
  const without = (request: B): Partial<B> => ({ ...lasting(request), id: undefined });
  const one = (id: string) => `${all()}/${id}`;

  beforeAll(async () => {
    api = await startApi();
    shop = await makeShop(api);
    stranger = await makeShop(api, 'Another shop');
  });
  afterAll(() => api.stop());

  const made = async () => {
    const request = body();
    const { body: item } = await shop.as.lead.post(all()).send(request).expect(201);
    return { request, item };
  };

  describe(`creating a ${subject}`, () => {
    it('stores it, answers with it, and leaves an audit row', async () => {
      const { request, item } = await made();
      expect(contract.parse(item)).toMatchObject({ ...lasting(request), version: 1 });
      const { body: read } = await shop.as.apprentice.get(one(request.id)).expect(200);
      expect(contract.parse(read)).toEqual(item);
      expect(await auditOf(api, request.id)).toMatchObject([
        { person_id: shop.ids.lead, action: 'create', subject, before: null },
      ]);
    });

    it('answers the same request sent again with the same row, also after an edit', async () => {
      const { request, item } = await made();
      const again = await shop.as.lead.post(all()).send(request).expect(200);
      expect(again.body).toEqual(item);
      const edit = { version: 1, ...without(edited(request)) };
      const { body: newer } = await shop.as.lead.put(one(request.id)).send(edit).expect(200);
      const later = await shop.as.lead.post(all()).send(request).expect(200);
      expect(later.body).toEqual(newer);
      expect((await auditOf(api, request.id)).map(({ action }) => action)).toEqual([
        'create',
        'update',
      ]);
    });

    it('makes one row of the same request sent many times at once', async () => {
      const request = body();
      const answers = await Promise.all(
        Array.from({ length: 6 }, () => shop.as.lead.post(all()).send(request)),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 200, 201]);
      expect(new Set(answers.map((answer) => JSON.stringify(answer.body))).size).toBe(1);
      expect(await auditOf(api, request.id)).toHaveLength(1);
    });

    it('refuses the same id with another body', async () => {
      const { request } = await made();
      const response = await shop.as.lead.post(all()).send(edited(request)).expect(409);
      expect(problemOf(response).code).toBe('id-reused');
    });

    it('takes an id that another shop uses for a thing of its own', async () => {
      const { request } = await made();
      await stranger.as.lead.post(`${stranger.path}/${place}`).send(request).expect(201);
    });

    it.each(leavesOf(body()).map((path) => [dotted(path), path] as const))(
      'names %s when it is of the wrong kind',
      async (name, path) => {
        const response = await shop.as.lead
          .post(all())
          .send(withValue(body(), path, { not: 'this' }))
          .expect(400);
        const { code, errors } = problemOf(response);
        expect(code).toBe('invalid-body');
        expect(errors?.map((error) => error.path)).toContainEqual(atOrBelow(name));
      },
    );

    it.each(Object.entries(wrong))('names %s when it cannot be %j', async (name, value) => {
      const response = await shop.as.lead
        .post(all())
        .send(withValue(body(), name.split('.'), value))
        .expect(400);
      expect(problemOf(response).errors?.map((error) => error.path)).toContainEqual(
        atOrBelow(name),
      );
    });

    it('names an unknown field', async () => {
      const response = await shop.as.lead
        .post(all())
        .send({ ...body(), colour: 'green' })
        .expect(400);
      expect(problemOf(response).errors).toEqual([{ path: 'colour', message: 'Unknown field.' }]);
    });
  });

  describe(`editing a ${subject}`, () => {
    it('stores the edit under the next version, and leaves an audit row of both', async () => {
      const { request, item } = await made();
      const content = without(edited(request));
      const { body: newer } = await shop.as.lead
        .put(one(request.id))
        .send({ version: 1, ...content })
        .expect(200);
      expect(contract.parse(newer)).toMatchObject({ ...content, id: request.id, version: 2 });
      expect(newer.createdAt).toBe(item.createdAt);
      const [, row] = await auditOf(api, request.id);
      expect(row).toMatchObject({
        person_id: shop.ids.lead,
        action: 'update',
        before: { version: 1 },
        after: { version: 2 },
      });
    });

    it('refuses an edit of an older version, shows the current one, and changes nothing', async () => {
      const { request } = await made();
      const edit = { version: 1, ...without(edited(request)) };
      const { body: newer } = await shop.as.lead.put(one(request.id)).send(edit).expect(200);
      const stale = { version: 1, ...without(request) };
      const response = await shop.as.machinist.put(one(request.id)).send(stale).expect(409);
      const problem = problemOf(response);
      expect(problem.code).toBe('stale-version');
      expect(problem.current).toEqual(newer);
      const { body: read } = await shop.as.lead.get(one(request.id)).expect(200);
      expect(read).toEqual(newer);
    });

    it('lets one of two edits of the same version through', async () => {
      const { request } = await made();
      const edit = { version: 1, ...without(edited(request)) };
      const both = await Promise.all([
        shop.as.lead.put(one(request.id)).send(edit),
        shop.as.machinist.put(one(request.id)).send(edit),
      ]);
      expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
    });

    it('wants to know the version', async () => {
      const { request } = await made();
      const response = await shop.as.lead.put(one(request.id)).send(without(request)).expect(400);
      expect(problemOf(response).errors?.map(({ path }) => path)).toContain('version');
    });
  });

  describe('refusing', () => {
    it('answers 401 to nobody', async () => {
      const { request } = await made();
      const nobody = visitorOf(api);
      const edit = { version: 1, ...without(request) };
      const answers = [
        await nobody.get(all()),
        await nobody.get(one(request.id)),
        await nobody.post(all()).send(body()),
        await nobody.put(one(request.id)).send(edit),
      ];
      for (const answer of answers) {
        expect(answer.status).toBe(401);
        expect(problemOf(answer).code).toBe('unauthenticated');
      }
    });

    it('answers 404 for what is not there, also for what is no id', async () => {
      const edit = { version: 1, ...without(body()) };
      for (const id of [uuidv7(), 'seven']) {
        expect(problemOf(await shop.as.lead.get(one(id)).expect(404)).code).toBe('not-found');
        await shop.as.lead.put(one(id)).send(edit).expect(404);
      }
    });

    it('shows nothing of one shop to a member of another', async () => {
      const { request } = await made();
      const theirs = stranger.as.lead;
      const edit = { version: 1, ...without(request) };
      await theirs.get(all()).expect(404);
      await theirs.get(one(request.id)).expect(404);
      await theirs.post(all()).send(body()).expect(404);
      await theirs.put(one(request.id)).send(edit).expect(404);
      // Nor when they ask for it in their own shop.
      await theirs.get(`${stranger.path}/${place}/${request.id}`).expect(404);
      await theirs.put(`${stranger.path}/${place}/${request.id}`).send(edit).expect(404);
      const { body: list } = await theirs.get(`${stranger.path}/${place}`).expect(200);
      const ids = list.items.map((item: { id: string }) => item.id);
      expect(ids).not.toContain(request.id);
    });
  });
}
