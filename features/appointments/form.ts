import * as yup from 'yup';

import { dateText, readDate } from '@/features/records';
import { newId } from '@/features/transport';
import type { CreateAppointmentRequest } from '@/shared/contracts/appointments';
import { APPOINTED_TASKS, type AppointedTask } from '@/shared/domain/appointments';
import { TEXT_LIMITS } from '@/shared/domain/limits';

export interface AppointmentValues {
  /** Made with the form, so that sending it twice makes one appointment. */
  id: string;
  personId: string;
  tasks: AppointedTask[];
  wheelClass: string;
  from: string;
  /** Empty has no end. */
  until: string;
}

export const TASK_WORDS: Record<AppointedTask, string> = {
  mount: 'Mount wheels',
  dress: 'Dress wheels',
  'trial run': 'Trial-run wheels',
};

export const newAppointment = (today: string): AppointmentValues => ({
  id: newId(),
  personId: '',
  tasks: [...APPOINTED_TASKS],
  wheelClass: '',
  from: today,
  until: '',
});

export const appointmentSchema = yup.object({
  personId: yup.string().required('Choose the person.'),
  tasks: yup.array().min(1, 'Choose at least one task.'),
  wheelClass: yup
    .string()
    .trim()
    .required('Enter the class of wheel, like "vitrified wheels up to 150 mm".')
    .max(
      TEXT_LIMITS.wheelClass,
      `The class of wheel has at most ${TEXT_LIMITS.wheelClass} characters.`,
    ),
  from: dateText('From').required('Enter the first day.'),
  until: dateText('Until').test(
    'until',
    'It ends on the day it begins, or later.',
    (text, { parent }) => {
      const [from, until] = [readDate((parent as AppointmentValues).from), readDate(text ?? '')];
      return from === null || until === null || until >= from;
    },
  ),
});

export const toRequest = (values: AppointmentValues, today: string): CreateAppointmentRequest => ({
  id: values.id,
  personId: values.personId,
  tasks: APPOINTED_TASKS.filter((task) => values.tasks.includes(task)),
  wheelClass: values.wheelClass.trim(),
  from: readDate(values.from) ?? today,
  until: readDate(values.until),
});

/** Guards what comes back from the device's storage. */
export function isAppointmentValues(value: unknown): value is AppointmentValues {
  const shape = value as Partial<AppointmentValues> | null;
  return (
    typeof shape === 'object' &&
    shape !== null &&
    [shape.id, shape.personId, shape.wheelClass, shape.from, shape.until].every(
      (text) => typeof text === 'string',
    ) &&
    Array.isArray(shape.tasks) &&
    shape.tasks.every((task) => APPOINTED_TASKS.includes(task))
  );
}
