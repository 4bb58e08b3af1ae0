import type { Appointment, CreateAppointmentRequest } from '@/shared/contracts/appointments';
import { can } from '@/shared/roles/roles';
import { appointmentHolds } from '@/shared/rules/wheel-signatures';

import type { AuditTrail } from '../audit/audit-trail';
import { demand, refusedByRule, staleVersion } from '../refusals';
import { dateIn } from '../setups/planning';
import type { Caller, InShop, ShopScope } from '../shop-scope';
import { createItem, existing } from '../stored-items';
import type { StoredAppointment } from './appointments-repository';

const trail = (audit: AuditTrail) => ({ subject: 'appointment' as const, audit });

interface AppointmentsContext {
  inShop: InShop;
  now: () => Date;
}

export const appointmentsService = ({ inShop, now }: AppointmentsContext) => {
  /** Tells of each whether it holds today. */
  const judged = async ({ shop }: ShopScope) => {
    const today = dateIn((await existing(shop.find())).timeZone, now());
    return (appointment: StoredAppointment): Appointment => {
      const { from, until, endedAt } = appointment;
      const holds = appointmentHolds({ from, until, revoked: endedAt !== null }, today);
      return { ...appointment, holds };
    };
  };

  return {
    list: (caller: Caller) =>
      inShop(caller, async (scope) => {
        demand(can(scope.role, 'shop:read'));
        const items = (await scope.appointments.list()).map(await judged(scope));
        return { items: items.sort((a, b) => Number(b.holds) - Number(a.holds)) };
      }),

    create: (caller: Caller, request: CreateAppointmentRequest) =>
      inShop(caller, async (scope) => {
        const { role, personId: appointedBy, appointments, audit } = scope;
        demand(can(role, 'shop:appoint'));
        const repository = {
          ...appointments,
          insert: async (content: CreateAppointmentRequest, digest: string) => {
            await demandSkilled(scope, content.personId);
            return appointments.insert({ ...content, appointedBy }, digest);
          },
        };
        const { isNew, item } = await createItem(repository, request, trail(audit));
        return { isNew, item: (await judged(scope))(item) };
      }),

    /** From now on, whatever its last day was to be. */
    end: (caller: Caller, id: string, { version }: { version: number }) =>
      inShop(caller, async (scope) => {
        const { role, appointments, audit } = scope;
        demand(can(role, 'shop:appoint'));
        const before = await existing(appointments.find(id, 'no key update'));
        if (before.version !== version) throw staleVersion((await judged(scope))(before));
        if (before.endedAt !== null)
          throw refusedByRule('version', 'This appointment is ended already.');
        const after = await appointments.end(id);
        await audit.record({
          action: 'end',
          subject: 'appointment',
          subjectId: id,
          before,
          after,
        });
        return (await judged(scope))(after);
      }),
  };
};

export type AppointmentsService = ReturnType<typeof appointmentsService>;

async function demandSkilled({ members }: ShopScope, personId: string): Promise<void> {
  const member = await members.find(personId);
  if (!member) throw refusedByRule('personId', 'This person is not one of the shop’s.');
  if (member.role === 'apprentice')
    throw refusedByRule('personId', 'An apprentice works under somebody else’s signature.');
}
