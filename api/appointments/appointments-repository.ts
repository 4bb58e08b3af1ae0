import { and, desc, eq, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';

import type { Transaction } from '@/db/client';
import { appointments, persons } from '@/db/schema';
import type { Appointment, CreateAppointmentRequest } from '@/shared/contracts/appointments';
import type { Appointment as Held } from '@/shared/domain/appointments';

import { storedFields, type Lock } from '../stored-items';

/** As it is kept; whether it holds depends on the day. */
export type StoredAppointment = Omit<Appointment, 'holds'>;

export const appointmentsRepository = (tx: Transaction, shopId: string) => {
  const appointer = alias(persons, 'appointer');
  const ofShop = eq(appointments.shopId, shopId);
  const one = (id: string) => and(ofShop, eq(appointments.id, id));

  const views = () =>
    tx
      .select({ row: appointments, name: persons.name, appointerName: appointer.name })
      .from(appointments)
      .innerJoin(persons, eq(persons.id, appointments.personId))
      .innerJoin(appointer, eq(appointer.id, appointments.appointedBy));

  const find = async (id: string, lock?: Lock): Promise<StoredAppointment | null> => {
    if (lock) await tx.select({ id: appointments.id }).from(appointments).where(one(id)).for(lock);
    const [found] = await views().where(one(id));
    return found ? toAppointment(found) : null;
  };

  return {
    find,

    /** Newest first. */
    async list(): Promise<StoredAppointment[]> {
      const rows = await views()
        .where(ofShop)
        .orderBy(desc(appointments.createdAt), desc(appointments.id));
      return rows.map(toAppointment);
    },

    async of(personId: string): Promise<Held[]> {
      const rows = await tx
        .select()
        .from(appointments)
        .where(and(ofShop, eq(appointments.personId, personId)));
      return rows.map(({ id, tasks, wheelClass, fromOn, untilOn, endedAt }) => ({
        id,
        personId,
        tasks,
        wheelClass,
        from: fromOn,
        until: untilOn,
        revoked: endedAt !== null,
      }));
    },

    async creationDigest(id: string): Promise<string | null> {
      const [row] = await tx
        .select({ digest: appointments.creationDigest })
        .from(appointments)
        .where(one(id));
      return row?.digest ?? null;
    },

    async insert(
      { from, until, ...request }: CreateAppointmentRequest & { appointedBy: string },
      creationDigest: string,
    ): Promise<StoredAppointment | null> {
      const rows = await tx
        .insert(appointments)
        .values({ shopId, ...request, fromOn: from, untilOn: until, creationDigest })
        .onConflictDoNothing({ target: [appointments.shopId, appointments.id] })
        .returning({ id: appointments.id });
      return rows.length > 0 ? find(request.id) : null;
    },

    async end(id: string): Promise<StoredAppointment> {
      await tx
        .update(appointments)
        .set({
          endedAt: sql`now()`,
          version: sql`${appointments.version} + 1`,
          updatedAt: sql`now()`,
        })
        .where(one(id));
      const ended = await find(id);
      if (!ended) throw new Error(`appointment ${id} is not there to end`);
      return ended;
    },
  };
};

export type AppointmentsRepository = ReturnType<typeof appointmentsRepository>;

interface Found {
  row: typeof appointments.$inferSelect;
  name: string;
  appointerName: string;
}

const toAppointment = ({ row, name, appointerName }: Found): StoredAppointment => ({
  ...storedFields(row),
  personId: row.personId,
  personName: name,
  tasks: row.tasks,
  wheelClass: row.wheelClass,
  from: row.fromOn,
  until: row.untilOn,
  appointedBy: { personId: row.appointedBy, name: appointerName },
  endedAt: row.endedAt?.toISOString() ?? null,
});
