export { appointments } from './appointments';
export { auditEntries } from './audit';
export { beltSteps, grinders, lathes, quills } from './machines';
export { memberships, persons, sessions, shops } from './people';
export { rateLimits } from './rate-limits';
export { setups } from './setups';
export { wheelEntries } from './wheel-entries';
export { wheels } from './wheels';
