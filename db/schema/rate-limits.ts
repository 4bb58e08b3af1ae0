import { bigint, integer, pgTable, varchar } from 'drizzle-orm/pg-core';

/** As rate-limiter-flexible reads and writes it. */
export const rateLimits = pgTable('rate_limits', {
  key: varchar('key', { length: 255 }).primaryKey(),
  points: integer('points').notNull().default(0),
  expire: bigint('expire', { mode: 'number' }),
});
