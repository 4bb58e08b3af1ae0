import type { Session, SignInRequest, SignUpRequest } from '@/shared/contracts/session';
import type { Role } from '@/shared/domain/people';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';

import type { AuditTrail } from '../audit/audit-trail';
import { invalidField } from '../refusals';
import type { MembersRepository } from '../shops/members-repository';
import type { ShopsRepository } from '../shops/shops-repository';
import { weaknessOf } from './password-policy';
import type { Passwords } from './passwords';
import { emailTaken, type Credentials, type PersonsRepository } from './persons-repository';

/** What becoming a member writes. */
export interface JoiningScope {
  persons: PersonsRepository;
  shop: ShopsRepository;
  members: MembersRepository;
  audit: AuditTrail;
}

export interface AccountsContext {
  passwords: Passwords;
  credentialsOf(email: string): Promise<Credentials | null>;
  sessionOf(personId: string): Promise<Session>;
  /** A transaction in a shop for a person who is not yet a member; either may be new. */
  withPersonInShop<T>(
    ids: { shopId: string; personId: string },
    work: (scope: JoiningScope) => Promise<T>,
  ): Promise<T>;
}

interface NewMember {
  id: string;
  name: string;
  email: string;
  password: string;
  shopId: string;
  role: Role;
}

export const accounts = ({
  passwords,
  credentialsOf,
  sessionOf,
  withPersonInShop,
}: AccountsContext) => ({
  sessionOf,

  /** The person's id; null for an unknown address as for a wrong password, after the same time. */
  async recognise({ email, password }: SignInRequest): Promise<string | null> {
    const credentials = await credentialsOf(email);
    const matches = await passwords.verify(password, credentials?.passwordHash ?? null);
    return matches && credentials ? credentials.personId : null;
  },

  /** Makes a person and a shop that they lead. The same request sent again makes nothing new. */
  async signUp(request: SignUpRequest): Promise<{ isNew: boolean }> {
    const { personId, shopId, name, email, password, shopName, units, timeZone } = request;
    const weakness = weaknessOf(password, [name, shopName, email.split('@')[0] ?? '']);
    if (weakness) throw invalidField('password', weakness);
    const known = await credentialsOf(email);
    if (known) {
      const isRepeated = known.personId === personId;
      if (isRepeated && (await passwords.verify(password, known.passwordHash)))
        return { isNew: false };
      throw emailTaken();
    }
    const passwordHash = await passwords.hash(password);
    await withPersonInShop({ personId, shopId }, async ({ persons, shop, members, audit }) => {
      await persons.insert({ id: personId, name, email, passwordHash });
      const made = await shop.insert({
        name: shopName,
        units,
        timeZone,
        rules: DEFAULT_SHOP_RULES,
      });
      await members.add(personId, 'lead');
      await audit.record(
        { action: 'create', subject: 'shop', subjectId: shopId, before: null, after: made },
        membershipMade(personId, { name, role: 'lead' }),
      );
    });
    return { isNew: true };
  },

  /** Makes a person who belongs to a shop from the start; somebody known by the address stays as they are. */
  async join({ id, name, email, password, shopId, role }: NewMember): Promise<void> {
    if (await credentialsOf(email)) return;
    const passwordHash = await passwords.hash(password);
    await withPersonInShop({ personId: id, shopId }, async ({ persons, members, audit }) => {
      await persons.insert({ id, name, email, passwordHash });
      await members.add(id, role);
      await audit.record(membershipMade(id, { name, role }));
    });
  },
});

const membershipMade = (personId: string, member: { name: string; role: Role }) => ({
  action: 'create' as const,
  subject: 'membership' as const,
  subjectId: personId,
  before: null,
  after: { personId, ...member },
});

export type Accounts = ReturnType<typeof accounts>;
