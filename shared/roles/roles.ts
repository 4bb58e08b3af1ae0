import type { Role } from '../domain/people';
import type { EntryKind } from '../domain/wheel-life';

/** Everything a person may be refused, named after product.md's table of roles. */
export const ACTIONS = [
  'shop:read',
  'shop:update',
  'shop:appoint',
  'setup:read',
  'setup:draft',
  'wheel:read',
  'wheel:edit',
  'wheel:record',
  'wheel:sign',
  'wheel:set-aside',
  'wheel:return',
  'wheel:scrap',
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
  'shop:appoint': LEAD,
  'setup:read': EVERYONE,
  'setup:draft': EVERYONE,
  'wheel:read': EVERYONE,
  'wheel:edit': SKILLED,
  'wheel:record': EVERYONE,
  'wheel:sign': SKILLED,
  'wheel:set-aside': EVERYONE,
  'wheel:return': LEAD,
  'wheel:scrap': SKILLED,
  'machine:read': EVERYONE,
  'machine:edit': SKILLED,
};

/** Corrections and signatures hang on the entry they point at as well. */
const ACTION_OF_STEP: Record<EntryKind, Action> = {
  received: 'wheel:edit',
  inspected: 'wheel:record',
  'ring test': 'wheel:record',
  mounted: 'wheel:record',
  'trial run': 'wheel:record',
  dressed: 'wheel:record',
  used: 'wheel:record',
  'taken off': 'wheel:record',
  'set aside': 'wheel:set-aside',
  returned: 'wheel:return',
  scrapped: 'wheel:scrap',
  countersigned: 'wheel:sign',
  correction: 'wheel:record',
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

/**
 * Whether a role may record a step of a wheel's life; whose signature it then waits for is another question.
 *
 * @param role - the person's role in this shop
 * @param kind - what kind of step
 * @returns true when allowed
 * @example mayRecord('machinist', 'returned') // false
 */
export function mayRecord(role: Role, kind: EntryKind): boolean {
  return can(role, ACTION_OF_STEP[kind]);
}
