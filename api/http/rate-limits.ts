import { createHash } from 'node:crypto';
import { isIPv6 } from 'node:net';

import {
  RateLimiterPostgres,
  RateLimiterRes,
  type IRateLimiterStoreOptions,
} from 'rate-limiter-flexible';

import { Refusal } from '../refusals';

const MINUTE = 60;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;

/** Attempts at one account from one address before each further one waits twice as long. */
const FREE_FAILURES = 5;
const LONGEST_PAUSE = 15 * MINUTE;

export interface LimitPoints {
  signInBurstPerMinute: number;
  signInPerAddressPerHour: number;
  signUpPerAddressPerHour: number;
  requestsPerPersonPerMinute: number;
}

export const LIMIT_POINTS: LimitPoints = {
  signInBurstPerMinute: 10,
  signInPerAddressPerHour: 300,
  signUpPerAddressPerHour: 20,
  requestsPerPersonPerMinute: 600,
};

/** Counts in the database, so that several processes count together. */
export function rateLimits(
  storeClient: IRateLimiterStoreOptions['storeClient'],
  points: LimitPoints = LIMIT_POINTS,
) {
  const limiter = (keyPrefix: string, allowed: number, duration: number) =>
    new RateLimiterPostgres({
      storeClient,
      tableName: 'rate_limits',
      tableCreated: true,
      keyPrefix,
      points: allowed,
      duration,
    });

  const burst = limiter('sign-in-burst', points.signInBurstPerMinute, MINUTE);
  const perAddress = limiter('sign-in-address', points.signInPerAddressPerHour, HOUR);
  const failures = limiter('sign-in-failures', FREE_FAILURES, DAY);
  const pause = limiter('sign-in-pause', 1, LONGEST_PAUSE);
  const signUps = limiter('sign-up', points.signUpPerAddressPerHour, HOUR);
  const requests = limiter('requests', points.requestsPerPersonPerMinute, MINUTE);

  return {
    /** Refuses an attempt to sign in that comes too soon; ask before the password is looked at. */
    async beforeSignIn(email: string, address: string): Promise<void> {
      const key = keyOf(email, network(address));
      const waiting = await pause.get(key);
      if (waiting && waiting.msBeforeNext > 0) throw tooMany(waiting.msBeforeNext);
      await consume(perAddress, keyOf(network(address)));
      await consume(burst, key);
    },

    async signInFailed(email: string, address: string): Promise<void> {
      const key = keyOf(email, network(address));
      const { consumedPoints } = await failures.penalty(key);
      const excess = consumedPoints - FREE_FAILURES;
      if (excess >= 0) await pause.block(key, Math.min(2 ** excess, LONGEST_PAUSE));
    },

    async signInSucceeded(email: string, address: string): Promise<void> {
      const key = keyOf(email, network(address));
      await Promise.all([failures.delete(key), pause.delete(key), burst.delete(key)]);
    },

    signUp: (address: string): Promise<void> => consume(signUps, keyOf(network(address))),
    request: (personId: string): Promise<void> => consume(requests, personId),
  };
}

export type RateLimits = ReturnType<typeof rateLimits>;

async function consume(limiter: RateLimiterPostgres, key: string): Promise<void> {
  try {
    await limiter.consume(key);
  } catch (reason) {
    throw reason instanceof RateLimiterRes ? tooMany(reason.msBeforeNext) : reason;
  }
}

const tooMany = (milliseconds: number) =>
  new Refusal('too-many-requests', {
    detail: 'Wait a little before the next try.',
    retryAfterSeconds: Math.max(1, Math.ceil(milliseconds / 1000)),
  });

/** Of bounded length, and no address of a person is left lying in the table. */
const keyOf = (...parts: string[]) =>
  createHash('sha256').update(parts.join('\n')).digest('base64url');

/** The part of an address that one subscriber holds: of IPv6 the first 56 bits. */
function network(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)?.[1];
  if (mapped) return mapped;
  if (!isIPv6(address)) return address;
  const [head = '', tail] = address.split('%')[0]?.split('::') ?? [];
  const left = head === '' ? [] : head.split(':');
  const right = tail ? tail.split(':') : [];
  const zeros = tail === undefined ? [] : Array<string>(8 - left.length - right.length).fill('0');
  const groups = [...left, ...zeros, ...right].slice(0, 4);
  return groups
    .map((group) => group.padStart(4, '0'))
    .join(':')
    .slice(0, 17);
}
