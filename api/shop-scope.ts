import type { Role } from '@/shared/domain/people';

import type { AppointmentsRepository } from './appointments/appointments-repository';
import type { AuditTrail } from './audit/audit-trail';
import type { GrindersRepository } from './machines/grinders-repository';
import type { LathesRepository } from './machines/lathes-repository';
import type { MembersRepository } from './shops/members-repository';
import type { ShopsRepository } from './shops/shops-repository';
import type { SetupsRepository } from './setups/setups-repository';
import type { WheelEntriesRepository } from './wheels/wheel-entries-repository';
import type { WheelsRepository } from './wheels/wheels-repository';

/** Who asks, and in which shop. */
export interface Caller {
  personId: string;
  shopId: string;
}

/** All that a service works with: one shop, one member of it, one transaction. */
export interface ShopScope {
  personId: string;
  role: Role;
  shop: ShopsRepository;
  members: MembersRepository;
  lathes: LathesRepository;
  grinders: GrindersRepository;
  wheels: WheelsRepository;
  wheelEntries: WheelEntriesRepository;
  appointments: AppointmentsRepository;
  setups: SetupsRepository;
  audit: AuditTrail;
}

/**
 * Opens a transaction in a shop for a member of it, and commits what the work did, or nothing when it throws.
 * To anybody else the shop does not exist.
 */
export type InShop = <T>(caller: Caller, work: (scope: ShopScope) => Promise<T>) => Promise<T>;
