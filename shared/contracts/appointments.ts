import * as z from 'zod';

import { APPOINTED_TASKS } from '../domain/appointments';
import { TEXT_LIMITS } from '../domain/limits';
import { expectedVersion, id, isoDate, stored } from './common';

const body = {
  personId: id,
  tasks: z
    .array(z.enum(APPOINTED_TASKS))
    .min(1)
    .transform((tasks) => APPOINTED_TASKS.filter((task) => tasks.includes(task))),
  wheelClass: z.string().trim().min(1).max(TEXT_LIMITS.wheelClass),
  from: isoDate,
  until: isoDate.nullable(),
};

export const createAppointmentRequest = z
  .strictObject({ id, ...body })
  .refine(({ from, until }) => until === null || until >= from, {
    path: ['until'],
    message: 'It ends on the day it begins, or later.',
  });

export const endAppointmentRequest = z.strictObject({ version: expectedVersion });

export const appointment = z.strictObject({
  ...stored,
  ...body,
  personName: z.string(),
  appointedBy: z.strictObject({ personId: id, name: z.string() }),
  /** When a lead ended it before its time. */
  endedAt: z.string().nullable(),
  /** Whether it holds today, in the shop's own time zone. */
  holds: z.boolean(),
});

/** Those that hold first, then the newest first. */
export const appointmentList = z.strictObject({ items: z.array(appointment) });

export type Appointment = z.infer<typeof appointment>;
export type CreateAppointmentRequest = z.infer<typeof createAppointmentRequest>;
