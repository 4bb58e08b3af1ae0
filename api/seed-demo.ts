import { createAppointmentRequest } from '@/shared/contracts/appointments';
import { createGrinderRequest, createLatheRequest } from '@/shared/contracts/machines';
import { signUpRequest } from '@/shared/contracts/session';
import { createSetupRequest } from '@/shared/contracts/setups';
import { recordEntryRequest } from '@/shared/contracts/wheel-entries';
import { createWheelRequest } from '@/shared/contracts/wheels';
import type { GrinderData, LatheData, QuillData } from '@/shared/domain/machines';
import type { Role, UnitSystem } from '@/shared/domain/people';
import type { SetupInputs } from '@/shared/domain/setups';
import type { WheelRecord } from '@/shared/domain/wheels';

import type { Server } from './composition';
import { Refusal } from './refusals';

interface DemoPerson {
  id: string;
  name: string;
  email: string;
  role: Role;
}

interface Named<T> {
  id: string;
  name: string;
  data: T;
}

export interface DemoShop {
  id: string;
  name: string;
  units: UnitSystem;
  timeZone: string;
  /** Of everybody in it: it is public. */
  password: string;
  lead: DemoPerson;
  others: readonly DemoPerson[];
  lathes: readonly Named<LatheData>[];
  grinders: readonly (Named<GrinderData> & { quills: readonly Named<QuillData>[] })[];
  wheels: readonly { id: string; tag: string; data: WheelRecord; received: object }[];
  appointments: readonly { id: string; personId: string }[];
  /** After the wheels came, in order. */
  wheelEntries: readonly { wheelId: string; personId: string; entry: object }[];
  setups: readonly { id: string; name: string; inputs: SetupInputs }[];
}

/**
 * Puts the demo shop in, the way its people would: what is there already stays as it is. A demo shop that an
 * earlier version put in, or that people have changed since, refuses what no longer fits; it is left as it stands.
 */
export async function seedDemo(services: Server['services'], demo: DemoShop): Promise<void> {
  try {
    await plant(services, demo);
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
  }
}

async function plant(services: Server['services'], demo: DemoShop): Promise<void> {
  const { lead, password } = demo;
  const caller = { personId: lead.id, shopId: demo.id };
  await services.accounts.signUp(
    signUpRequest.parse({
      personId: lead.id,
      shopId: demo.id,
      name: lead.name,
      email: lead.email,
      password,
      shopName: demo.name,
      units: demo.units,
      timeZone: demo.timeZone,
    }),
  );
  for (const person of demo.others)
    await services.accounts.join({ ...person, shopId: demo.id, password });
  const typed = {};
  for (const lathe of demo.lathes)
    await services.lathes.create(caller, createLatheRequest.parse({ ...lathe, typed }));
  for (const grinder of demo.grinders)
    await services.grinders.create(caller, createGrinderRequest.parse({ ...grinder, typed }));
  for (const wheel of demo.wheels)
    await services.wheels.create(caller, createWheelRequest.parse({ ...wheel, typed }));
  for (const appointment of demo.appointments)
    await services.appointments.create(caller, createAppointmentRequest.parse(appointment));
  for (const { wheelId, personId, entry } of demo.wheelEntries)
    await services.wheelLives.record(
      { personId, shopId: demo.id },
      wheelId,
      recordEntryRequest.parse(entry),
    );
  for (const setup of demo.setups)
    await services.setups.create(caller, createSetupRequest.parse({ ...setup, typed }));
}
