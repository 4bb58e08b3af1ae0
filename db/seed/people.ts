import signIns from './sign-ins.json';

/** Public, and so good for the demo alone; the start command prints it. */
export const password = signIns.password;

export const lead = {
  id: '01900000-0000-7000-8000-000000000101',
  role: 'lead',
  ...signIns.people.lead,
} as const;

export const others = [
  {
    id: '01900000-0000-7000-8000-000000000102',
    role: 'machinist',
    ...signIns.people.machinist,
  },
  {
    id: '01900000-0000-7000-8000-000000000103',
    role: 'apprentice',
    ...signIns.people.apprentice,
  },
] as const;
