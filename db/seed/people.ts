/** Public, and so good for the demo alone. */
export const password = 'plum tractor by the window';

export const lead = {
  id: '01900000-0000-7000-8000-000000000101',
  role: 'lead',
  name: 'Ottilie Brandvik',
  email: 'ottilie@brackenmoor.example',
} as const;

export const others = [
  {
    id: '01900000-0000-7000-8000-000000000102',
    role: 'machinist',
    name: 'Desmond Okafor-Lund',
    email: 'desmond@brackenmoor.example',
  },
  {
    id: '01900000-0000-7000-8000-000000000103',
    role: 'apprentice',
    name: 'Maren Tollivander',
    email: 'maren@brackenmoor.example',
  },
] as const;

/** Who can look around in the demo shop; the start command prints them. */
export const signIns = [lead, ...others].map(({ role, name, email }) => ({
  role,
  name,
  email,
  password,
}));
