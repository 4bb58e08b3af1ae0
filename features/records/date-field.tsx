import * as yup from 'yup';

import { TextField } from '@/features/forms';

const SHAPE = /^(\d{4})-(\d{1,2})-(\d{1,2})$/;

/** The ISO date that a text stands for; null for anything else, also for the 31st of June. */
export function readDate(text: string): string | null {
  const [, year = '', month = '', day = ''] = SHAPE.exec(text.trim()) ?? [];
  const iso = `${year}-${month.padStart(2, '0')}-${day.padStart(2, '0')}`;
  const date = new Date(`${iso}T00:00:00Z`);
  return Number.isFinite(date.getTime()) && date.toISOString().startsWith(iso) ? iso : null;
}

export const dateText = (label: string) =>
  yup
    .string()
    .default('')
    .test(
      'date',
      `${label} is a date: year, month and day, like 2027-03-31.`,
      (text) => !text?.trim() || readDate(text) !== null,
    );

interface DateFieldProps {
  name: string;
  label: string;
  hint?: string;
  required?: boolean;
}

/** A date, typed as year-month-day: the one order that is read alike everywhere. */
export function DateField({ hint, ...rest }: DateFieldProps) {
  const how = 'Year, month, day, like 2027-03-31.';
  return (
    <TextField {...rest} hint={hint ? `${hint} ${how}` : how} inputMode="text" maxLength={10} />
  );
}
