import type { Role } from '../domain/people';

/** Everything a person may be refused, named after product.md's table of roles. */
export const ACTIONS = [
  'shop:read',
  'shop:update',
  'setup:read',
  'setup:draft',
  'wheel:read',
  'wheel:edit',
  'wheel:set-aside',
  'wheel:return',
  'machine:read',
  'machine:edit',
] as const;

export type Action = (typeof ACTIONS)[number];

const EVERYONE: readonly Role[] = ['lead', 'machinist', 'apprentice'];
const SKILLED: readonly Role[] = ['lead', 'machinist'];
const LEAD: readonly Role[] = ['lead'];

const ALLOWED: Record<Action, readonly Role[]> = {
  'shop:read': EVERYONE,
  'shop:update': LEAD,
  'setup:read': EVERYONE,
  'setup:draft': EVERYONE,
  'wheel:read': EVERYONE,
  'wheel:edit': SKILLED,
  'wheel:set-aside': EVERYONE,
  'wheel:return': LEAD,
  'machine:read': EVERYONE,
  'machine:edit': SKILLED,
};

/**
 * Whether a role may do a thing. The server decides by it; the client hides what it would refuse.
 *
 * @param role - the person's role in this shop
 * @param action - what they want to do
 * @returns true when allowed
 * @example can('apprentice', 'machine:edit') // false
 */
export function can(role: Role, action: Action): boolean {
  return ALLOWED[action].includes(role);
}
