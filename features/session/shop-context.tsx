import { createContext, useCallback, useContext, useMemo, useState, type ReactNode } from 'react';

import { readStored, writeStored } from '@/features/transport';
import type { Membership, Session } from '@/shared/contracts/session';
import type { Shop } from '@/shared/contracts/shops';
import { UNIT_SYSTEMS, type Role, type UnitSystem } from '@/shared/domain/people';
import { can, type Action } from '@/shared/roles/roles';

type Person = NonNullable<Session>;

interface ShopValue {
  shop: Shop;
  person: Person;
  role: Role;
  memberships: Membership[];
  may: (action: Action) => boolean;
  /** The units this person reads and types in here; starts with the shop's. */
  units: UnitSystem;
  setUnits: (units: UnitSystem) => void;
}

const ShopContext = createContext<ShopValue | null>(null);

const unitsKey = (personId: string) => `ringtrue:units:${personId}`;

function storedUnits(personId: string): UnitSystem | undefined {
  const value = readStored(unitsKey(personId));
  return UNIT_SYSTEMS.find((system) => system === value);
}

interface ShopProviderProps {
  shop: Shop;
  person: Person;
  role: Role;
  children: ReactNode;
}

export function ShopProvider({ shop, person, role, children }: ShopProviderProps) {
  const [own, setOwn] = useState(() => storedUnits(person.personId));
  const setUnits = useCallback(
    (units: UnitSystem) => {
      writeStored(unitsKey(person.personId), units);
      setOwn(units);
    },
    [person.personId],
  );
  const value = useMemo<ShopValue>(
    () => ({
      shop,
      person,
      role,
      memberships: person.memberships,
      may: (action) => can(role, action),
      units: own ?? shop.units,
      setUnits,
    }),
    [shop, person, role, own, setUnits],
  );
  return <ShopContext.Provider value={value}>{children}</ShopContext.Provider>;
}

/** The shop of the page's address, the person in it, and what they may do. */
export function useShop(): ShopValue {
  const value = useContext(ShopContext);
  if (!value) throw new Error('useShop stands outside a ShopProvider');
  return value;
}
