import { asc, eq, sql } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { memberships, persons, shops } from '@/db/schema';
import type { Session } from '@/shared/contracts/session';

import { idReused, taken } from '../refusals';
import { keepingUnique } from '../unique';

export interface Credentials {
  personId: string;
  passwordHash: string;
}

interface NewPerson {
  id: string;
  name: string;
  email: string;
  passwordHash: string;
}

export const personsRepository = (tx: Transaction) => ({
  /** By the exact address; null when nobody has it. */
  async credentialsOf(email: string): Promise<Credentials | null> {
    const { rows } = await tx.execute<{ person_id: string; password_hash: string }>(
      sql`select person_id, password_hash from credentials_of(${email})`,
    );
    const [row] = rows;
    return row ? { personId: row.person_id, passwordHash: row.password_hash } : null;
  },

  async sessionOf(personId: string): Promise<Session> {
    const [person] = await tx
      .select({ personId: persons.id, name: persons.name, email: persons.email })
      .from(persons)
      .where(eq(persons.id, personId));
    if (!person) return null;
    const shopsOfPerson = await tx
      .select({ shopId: shops.id, shopName: shops.name, role: memberships.role })
      .from(memberships)
      .innerJoin(shops, eq(shops.id, memberships.shopId))
      .where(eq(memberships.personId, personId))
      .orderBy(asc(sql`lower(${shops.name})`), asc(shops.id));
    return { ...person, memberships: shopsOfPerson };
  },

  async insert(person: NewPerson): Promise<void> {
    await keepingUnique(tx.insert(persons).values(person), {
      persons_email: emailTaken(),
      persons_pkey: idReused(),
    });
  },
});

export type PersonsRepository = ReturnType<typeof personsRepository>;

export const emailTaken = () =>
  taken('email', 'This address has an account already. Sign in with it instead.');
