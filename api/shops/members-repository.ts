import { and, asc, eq, sql } from 'drizzle-orm';

import type { Transaction } from '@/db/client';
import { memberships, persons } from '@/db/schema';
import type { ShopMember } from '@/shared/contracts/shops';
import type { Role } from '@/shared/domain/people';

const member = { personId: memberships.personId, name: persons.name, role: memberships.role };

export const membersRepository = (tx: Transaction, shopId: string) => ({
  list: (): Promise<ShopMember[]> =>
    tx
      .select(member)
      .from(memberships)
      .innerJoin(persons, eq(persons.id, memberships.personId))
      .where(eq(memberships.shopId, shopId))
      .orderBy(asc(sql`lower(${persons.name})`), asc(memberships.personId)),

  async find(personId: string): Promise<ShopMember | null> {
    const [row] = await tx
      .select(member)
      .from(memberships)
      .innerJoin(persons, eq(persons.id, memberships.personId))
      .where(and(eq(memberships.shopId, shopId), eq(memberships.personId, personId)));
    return row ?? null;
  },

  async add(personId: string, role: Role): Promise<void> {
    await tx.insert(memberships).values({ shopId, personId, role });
  },
});

export type MembersRepository = ReturnType<typeof membersRepository>;
