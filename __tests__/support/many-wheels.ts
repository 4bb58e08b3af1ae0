import type { Client } from 'pg';

import { WHEEL_FACTS_VERSION } from '@/shared/rules/wheel-facts';

/** Every so many-th wheel is one that a filter looks for. */
const RARE = 500;

/**
 * Puts a rack of wheels in, past every policy: tags T000001 on, sizes and marks in turn, and every 500th set
 * aside, of silicon carbide, overdue and fast.
 */
export async function insertManyWheels(owner: Client, shopId: string, count: number) {
  await owner.query(
    `insert into wheels (shop_id, id, tag, marking, diameter_new_mm, diameter_now_mm, width_mm, hole_mm, state,
       set_aside_reason, typed, creation_digest, updated_at, place, due_on, due_why, facts_version, abrasive, grain,
       limit_rpm, usable)
     select $1, gen_random_uuid(), 'T' || lpad(n::text, 6, '0'),
       case when rare then 'C' else 'A' end || ' ' || grain || ' ' || chr(72 + n % 8) || ' 7 V',
       150, 100 + (n * 7919 % 5000) / 100.0, 20, 20, case when rare then 'set aside' else 'on the rack' end,
       case when rare then 'Dull.' end, '{}', 'digest', '2026-03-02'::timestamptz - n * interval '1 minute',
       'Shelf ' || n % (1 + $2::int / 100), '2026-01-01'::date + case when rare then -n % 300 else n % 900 end, 'expiry',
       $3, case when rare then 'silicon carbide' else 'aluminium oxide' end, grain,
       case when rare then 20000 else 3000 + n % 3000 end, not rare
     from generate_series(1, $2::int) n,
       lateral (select n % ${RARE} = 0 as rare, case when n % ${RARE} = 1 then 220 else 46 + n % 4 end as grain) of_n`,
    [shopId, count, WHEEL_FACTS_VERSION],
  );
  await owner.query('vacuum analyze wheels');
}
