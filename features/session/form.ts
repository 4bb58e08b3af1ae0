import * as yup from 'yup';

import type { SignInRequest, SignUpRequest } from '@/shared/contracts/session';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import type { UnitSystem } from '@/shared/domain/people';
import { newId } from '@/features/transport';

const email = yup
  .string()
  .trim()
  .required('Enter your e-mail address.')
  .email('Enter an e-mail address like name@example.com.')
  .max(TEXT_LIMITS.email, `The e-mail address is longer than ${TEXT_LIMITS.email} characters.`);

export interface SignInValues {
  email: string;
  password: string;
}

export const signInForm = {
  initialValues: { email: '', password: '' } satisfies SignInValues,
  schema: yup.object({
    email,
    password: yup
      .string()
      .required('Enter your password.')
      .max(
        TEXT_LIMITS.passwordMax,
        `Passwords have at most ${TEXT_LIMITS.passwordMax} characters.`,
      ),
  }),
  toRequest: (values: SignInValues): SignInRequest => ({
    email: values.email.trim().toLowerCase(),
    password: values.password,
  }),
};

export interface SignUpValues {
  /** Made once with the form, so that sending it twice makes one shop. */
  personId: string;
  shopId: string;
  name: string;
  email: string;
  password: string;
  shopName: string;
  units: UnitSystem;
  timeZone: string;
}

/** What the browser says of its place on earth; the person may choose another. */
export function deviceTimeZone(): string {
  return new Intl.DateTimeFormat().resolvedOptions().timeZone || 'UTC';
}

export const signUpForm = {
  initialValues: (): SignUpValues => ({
    personId: newId(),
    shopId: newId(),
    name: '',
    email: '',
    password: '',
    shopName: '',
    units: 'mm',
    timeZone: deviceTimeZone(),
  }),
  schema: yup.object({
    name: yup.string().trim().required('Enter your name.').max(TEXT_LIMITS.name),
    email,
    password: yup
      .string()
      .required('Choose a password.')
      .min(
        TEXT_LIMITS.passwordMin,
        `Use ${TEXT_LIMITS.passwordMin} characters or more: a few words in a row are easy to keep.`,
      )
      .max(
        TEXT_LIMITS.passwordMax,
        `Passwords have at most ${TEXT_LIMITS.passwordMax} characters.`,
      ),
    shopName: yup.string().trim().required('Enter the name of your shop.').max(TEXT_LIMITS.name),
    timeZone: yup.string().required('Choose a time zone.'),
  }),
  toRequest: (values: SignUpValues): SignUpRequest => ({
    personId: values.personId,
    shopId: values.shopId,
    name: values.name.trim(),
    email: values.email.trim().toLowerCase(),
    password: values.password,
    shopName: values.shopName.trim(),
    units: values.units,
    timeZone: values.timeZone,
  }),
};
