import * as z from 'zod';

import { TEXT_LIMITS } from '../domain/limits';
import { ROLES, UNIT_SYSTEMS } from '../domain/people';
import { id, name, timeZone } from './common';

const email = z.string().trim().toLowerCase().max(TEXT_LIMITS.email).pipe(z.email());

export const signInRequest = z.strictObject({
  email,
  password: z.string().min(1).max(TEXT_LIMITS.passwordMax),
});

export const signUpRequest = z.strictObject({
  personId: id,
  shopId: id,
  name,
  email,
  password: z.string().min(TEXT_LIMITS.passwordMin).max(TEXT_LIMITS.passwordMax),
  shopName: name,
  units: z.enum(UNIT_SYSTEMS),
  timeZone,
});

export const membership = z.strictObject({
  shopId: id,
  shopName: z.string(),
  role: z.enum(ROLES),
});

/** Who is signed in; the answer is null for nobody. */
export const session = z
  .strictObject({
    personId: id,
    name: z.string(),
    email: z.string(),
    memberships: z.array(membership),
  })
  .nullable();

export type SignInRequest = z.infer<typeof signInRequest>;
export type SignUpRequest = z.infer<typeof signUpRequest>;
export type Membership = z.infer<typeof membership>;
export type Session = z.infer<typeof session>;
