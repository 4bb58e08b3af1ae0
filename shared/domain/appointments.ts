import type { Role } from './people';

/** What only an appointed person does, or signs for. */
export const APPOINTED_TASKS = ['mount', 'dress', 'trial run'] as const;
export type AppointedTask = (typeof APPOINTED_TASKS)[number];

/** A person the shop has appointed in writing. */
export interface Appointment {
  id: string;
  personId: string;
  tasks: AppointedTask[];
  /** In words, for example "vitrified wheels up to 150 mm". */
  wheelClass: string;
  /** ISO dates, both included; null has no end. */
  from: string;
  until: string | null;
  /** Ended before its time. */
  revoked: boolean;
}

/** Who acts: what a shop lets somebody do hangs on role and appointment. */
export interface Actor {
  personId: string;
  role: Role;
  /** What the person is appointed for today. */
  tasks: readonly AppointedTask[];
}
