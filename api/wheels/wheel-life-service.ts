import type {
  RecordedEntry,
  RecordEntryRequest,
  WheelEntryPage,
  WheelEntryView,
  WheelLife,
} from '@/shared/contracts/wheel-entries';
import type { Wheel } from '@/shared/contracts/wheels';
import type { WheelEntry, WheelStep } from '@/shared/domain/wheel-life';
import { can } from '@/shared/roles/roles';
import { foldWheelLife } from '@/shared/rules/wheel-life';
import { signerFor } from '@/shared/rules/wheel-signatures';
import { roleRefusal, stepRefusal } from '@/shared/rules/wheel-steps';

import type { AuditedWrite } from '../audit/audit-trail';
import { demand, idReused, refusedByRule, staleVersion } from '../refusals';
import type { Recompute } from '../setups/recompute';
import type { Caller, InShop, ShopScope } from '../shop-scope';
import { digestOf, existing, type Creation } from '../stored-items';
import { casesOf, stepForbidden, type CaseReader } from './wheel-cases';
import { lifeView } from './wheel-life-view';

const FIRST_ENTRIES = 30;
const SETUPS_SHOWN = 50;

interface LifeContext {
  inShop: InShop;
  recompute: Recompute;
  now: () => Date;
}

export const wheelLifeService = ({ inShop, recompute, now }: LifeContext) => {
  const record = async (
    scope: ShopScope,
    wheelId: string,
    request: RecordEntryRequest,
  ): Promise<Creation<RecordedEntry>> => {
    const before = await existing(scope.wheels.find(wheelId, 'no key update'));
    const digest = digestOf({ wheelId, ...request });
    const earlier = await scope.wheelEntries.creationDigest(request.id);
    if (earlier !== null) {
      if (earlier !== digest) throw idReused();
      const entry = await existing(scope.wheelEntries.find(request.id));
      return { isNew: false, item: { wheel: before, entry } };
    }
    const { step, happenedOn, note, version } = request;
    const cases = await casesOf(scope, now());
    const byRole = roleRefusal(step.kind, cases.actor);
    if (byRole !== null) throw stepForbidden(byRole, cases.units);
    if (version !== null && version !== before.version) throw staleVersion(before);

    const entries = await scope.wheelEntries.of(wheelId);
    const given = await caseFor(cases, { wheel: before, entries, step, happenedOn });
    const refusal = stepRefusal(step, given);
    if (refusal !== null) throw stepForbidden(refusal, cases.units);

    const entry: WheelEntry = {
      id: request.id,
      number: entries.length + 1,
      personId: scope.personId,
      happenedOn,
      needs: signerFor(step.kind, cases.actor),
      step,
    };
    await scope.wheelEntries.add({ ...entry, wheelId, note, creationDigest: digest });
    const standing = foldWheelLife(before.data, [...entries, entry]);
    demandPossibleDiameter(before, standing.diameterNowMm);
    const wheel = await scope.wheels.update(wheelId, before, standing);
    const view = await existing(scope.wheelEntries.find(entry.id));
    await scope.audit.record(recorded({ before, after: { ...wheel, entry: view } }));
    await recompute(scope, { wheelId });
    return { isNew: true, item: { wheel, entry: view } };
  };

  return {
    record: (caller: Caller, wheelId: string, request: RecordEntryRequest) =>
      inShop(caller, (scope) => record(scope, wheelId, request)),

    entries: (
      caller: Caller,
      wheelId: string,
      query: { after?: string | undefined; limit: number },
    ): Promise<WheelEntryPage> =>
      inShop(caller, async ({ role, wheels, wheelEntries }) => {
        demand(can(role, 'wheel:read'));
        await existing(wheels.find(wheelId));
        return wheelEntries.page(wheelId, query);
      }),

    get: (caller: Caller, wheelId: string): Promise<WheelLife> =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'wheel:read'));
        const wheel = await existing(scope.wheels.find(wheelId));
        const cases = await casesOf(scope, now());
        const given = await cases.of({
          wheel: wheel.data,
          entries: await scope.wheelEntries.of(wheelId),
          happenedOn: cases.today,
        });
        return {
          wheel,
          ...lifeView(given, { grinders: cases.grinders, units: cases.units }),
          setups: (await scope.setups.list({ wheelId, limit: SETUPS_SHOWN })).items,
          entries: await scope.wheelEntries.page(wheelId, { limit: FIRST_ENTRIES }),
        };
      }),
  };
};

export type WheelLifeService = ReturnType<typeof wheelLifeService>;

const recorded = (change: {
  before: Wheel;
  after: Wheel & { entry: WheelEntryView };
}): AuditedWrite => ({
  action: 'record',
  subject: 'wheel',
  subjectId: change.before.id,
  ...change,
});

interface Asked {
  wheel: Wheel;
  entries: WheelEntry[];
  step: WheelStep;
  happenedOn: string;
}

/** A mounting names its spindle; that the shop has it is asked before anything else of it. */
async function caseFor(cases: CaseReader, { wheel, entries, step, happenedOn }: Asked) {
  const given = cases.of({ wheel: wheel.data, entries, happenedOn });
  if (step.kind !== 'mounted') return given;
  const grinder = cases.grinders.find(({ id }) => id === step.grinderId);
  if (!grinder) throw refusedByRule('step.grinderId', 'This grinder is not one of the shop’s.');
  const quill = grinder.quills.find(({ id }) => id === step.quillId);
  if (!quill) throw refusedByRule('step.quillId', 'This quill is not one of the grinder’s.');
  return { ...given, spindle: { grinder: grinder.data, quill: quill.data } };
}

/** A correction gives back what it took away, and may so leave a size that nobody checked. */
function demandPossibleDiameter({ data }: Wheel, diameterNowMm: number): void {
  if (diameterNowMm <= data.holeMm || diameterNowMm > data.diameterNewMm)
    throw refusedByRule('step', 'The entries that are left do not add up to a wheel.');
}
