export const ROLES = ['lead', 'machinist', 'apprentice'] as const;
export type Role = (typeof ROLES)[number];

/** The unit system a person reads and types in by default. */
export const UNIT_SYSTEMS = ['mm', 'inch'] as const;
export type UnitSystem = (typeof UNIT_SYSTEMS)[number];
