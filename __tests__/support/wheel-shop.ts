import {
  recordedEntry,
  wheelLife,
  type RecordEntryRequest,
} from '@/shared/contracts/wheel-entries';
import { wheel, type Wheel } from '@/shared/contracts/wheels';
import type { Role } from '@/shared/domain/people';

import { makeShop, startApi } from './api';
import { entryBody, grinderBody, wheelBody } from './bodies';
import { problemOf } from './item-tests';

export type Step = RecordEntryRequest['step'];

export const TODAY = '2026-03-02';
export const LOOK: Step = { kind: 'inspected', look: 'sound', diameterMm: null };
export const RING: Step = { kind: 'ring test', ring: 'clear' };
export const TRIAL_RUN: Step = { kind: 'trial run', minutes: 3, spindleRpm: 9000 };
export const DRESSED: Step = { kind: 'dressed', depthMm: 0.02, passes: 5 };
export const TAKEN_OFF: Step = { kind: 'taken off' };
export const SET_ASIDE: Step = { kind: 'set aside', reason: 'A chip at the edge.' };

/** A shop with a grinder, on a day of its own, and what people do to its wheels. */
export async function wheelShop() {
  const api = await startApi({ now: () => new Date(`${TODAY}T10:00:00Z`) });
  const shop = await makeShop(api);
  const grinder = grinderBody();
  const [quill] = grinder.quills;
  if (!quill) throw new Error('a grinder with a quill');
  // Nothing of the quill is lower than what the wheel allows.
  quill.data = { ...quill.data, measuredFrequencyHz: null, markedMaximumRpm: null };
  await shop.as.lead.post(`${shop.path}/grinders`).send(grinder).expect(201);
  const mounted = { kind: 'mounted' as const, grinderId: grinder.id, quillId: quill.id };

  const at = (id: string, part = '') => `${shop.path}/wheels/${id}${part}`;
  const read = async (id: string): Promise<Wheel> =>
    wheel.parse((await shop.as.lead.get(at(id)).expect(200)).body);
  const post = (id: string, request: RecordEntryRequest, role: Role = 'lead') =>
    shop.as[role].post(at(id, '/entries')).send(request);
  /** Records a step on the wheel as it stands. */
  const record = async (id: string, step: Step, role: Role = 'lead') =>
    post(id, entryBody(step, { version: (await read(id)).version, happenedOn: TODAY }), role);

  return {
    api,
    shop,
    mounted,
    at,
    read,
    post,
    record,
    lifeOf: async (id: string, role: Role = 'lead') =>
      wheelLife.parse((await shop.as[role].get(at(id, '/life')).expect(200)).body),

    async recorded(id: string, step: Step, role: Role = 'lead') {
      return recordedEntry.parse((await record(id, step, role)).body);
    },

    /** A wheel of 24.5 mm that came with these results, after these steps. */
    async make(
      steps: Step[] = [],
      received: Partial<ReturnType<typeof wheelBody>['received']> = {},
    ) {
      const body = wheelBody();
      body.received = { ...body.received, on: '2026-01-05', ...received };
      await shop.as.lead.post(`${shop.path}/wheels`).send(body).expect(201);
      for (const step of steps) {
        const { status, body: answer } = await record(body.id, step);
        if (status !== 201) throw new Error(`${step.kind}: ${JSON.stringify(answer)}`);
      }
      return body.id;
    },

    /** Status and rule by which a step is refused. */
    async refusalOf(id: string, step: Step, role: Role = 'lead') {
      const { status, rule } = problemOf(await record(id, step, role));
      return [status, rule];
    },
  };
}
