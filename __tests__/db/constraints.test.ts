import { randomUUID } from 'node:crypto';

import { LIMITS } from '@/shared/domain/limits';

import { insertShop, openTestDatabase, type TestDatabase } from '../support/database';

const shop = { shopId: randomUUID(), personId: randomUUID() };

let db: TestDatabase;
beforeAll(async () => {
  db = await openTestDatabase();
  await insertShop(db.as.owner, shop);
});
afterAll(() => db.drop());

type Row = Record<string, unknown>;

const insert = (table: string, row: Row) => {
  const names = Object.keys(row);
  const values = names.map((_, index) => `$${index + 1}`);
  return db.as.owner.query(
    `insert into ${table} (${names.join(', ')}) values (${values.join(', ')})`,
    Object.values(row),
  );
};

const common = () => ({
  shop_id: shop.shopId,
  id: randomUUID(),
  typed: '{}',
  creation_digest: 'digest',
});
const wheel = (): Row => ({
  ...common(),
  tag: randomUUID().slice(0, 20),
  diameter_new_mm: 25,
  diameter_now_mm: 24,
  width_mm: 20,
  hole_mm: 8,
  state: 'on the rack',
});
const lathe = (): Row => ({
  ...common(),
  name: randomUUID(),
  spindle_speeds_rpm: [50, 100],
  feeds_mm_per_rev: [0.1],
  cross_slide_division_mm: 0.02,
  cross_slide_reads: 'radius',
});
const grinder = (): Row => ({
  ...common(),
  name: randomUUID(),
  motor_no_load_rpm: 2900,
  motor_power_w: 500,
  guard: 'none',
});

describe('the database itself', () => {
  it.each([
    ['wheels', wheel],
    ['lathes', lathe],
    ['grinders', grinder],
  ] as const)('takes a row of %s as it should be', async (table, row) => {
    await expect(insert(table, row())).resolves.toMatchObject({ rowCount: 1 });
  });

  it.each([
    ['wheels', wheel, { diameter_now_mm: 26 }, 'wheels_only_wear'],
    ['wheels', wheel, { hole_mm: 24 }, 'wheels_hole_inside'],
    ['wheels', wheel, { state: 'lost' }, 'wheels_state'],
    ['wheels', wheel, { state: 'set aside' }, 'wheels_set_aside_reason'],
    ['wheels', wheel, { set_aside_reason: 'Dull.' }, 'wheels_set_aside_reason'],
    ['wheels', wheel, { mandrel_diameter_mm: 6 }, 'wheels_mandrel_whole'],
    ['wheels', wheel, { maker_maximum_rpm: 30_000 }, 'wheels_mandrel_whole'],
    ['wheels', wheel, { rung: 'loud' }, 'wheels_rung'],
    ['wheels', wheel, { tag: '' }, 'wheels_tag_length'],
    ['wheels', wheel, { shape: '99' }, 'wheels_shape'],
    ['wheels', wheel, { smallest_usable_mm: 8 }, 'wheels_smallest_usable_mm'],
    ['wheels', wheel, { smallest_usable_mm: 25.1 }, 'wheels_smallest_usable_mm'],
    ['wheels', wheel, { place: '' }, 'wheels_place_length'],
    ['wheels', wheel, { due_on: '2026-03-02' }, 'wheels_due'],
    ['wheels', wheel, { on_quill_id: randomUUID() }, 'wheels_on_quill_of_grinder'],
    ['wheels', wheel, { abrasive: 'sand' }, 'wheels_abrasive'],
    ['lathes', lathe, { spindle_speeds_rpm: [] }, 'lathes_spindle_speeds_count'],
    ['lathes', lathe, { spindle_speeds_rpm: [50, 0] }, 'lathes_spindle_speeds_rpm'],
    ['lathes', lathe, { feeds_mm_per_rev: [0.1, 21] }, 'lathes_feeds_mm_per_rev'],
    ['lathes', lathe, { cross_slide_reads: 'area' }, 'lathes_cross_slide_reads'],
    ['lathes', lathe, { name: 'x'.repeat(81) }, 'lathes_name_length'],
    ['grinders', grinder, { guard: 'half' }, 'grinders_guard'],
  ] as const)('refuses %s %# with %j', async (table, row, wrong, constraint) => {
    await expect(insert(table, { ...row(), ...wrong })).rejects.toMatchObject({ constraint });
  });

  it.each([
    ['wheels', wheel, 'width_mm', LIMITS.wheelWidthMm],
    ['wheels', wheel, 'marked_rpm', LIMITS.wheelRpm],
    ['wheels', wheel, 'marked_speed_m_per_s', LIMITS.wheelSpeedMPerS],
    ['lathes', lathe, 'cross_slide_division_mm', LIMITS.dialDivisionMm],
    ['lathes', lathe, 'compound_travel_mm', LIMITS.compoundTravelMm],
    ['grinders', grinder, 'motor_no_load_rpm', LIMITS.motorRpm],
    ['grinders', grinder, 'motor_power_w', LIMITS.motorPowerW],
    ['grinders', grinder, 'post_stiffness_n_per_mm', LIMITS.stiffnessNPerMm],
  ] as const)('holds %s %# to the limits of %s', async (table, row, column, { min, max }) => {
    for (const inside of [min, max])
      await expect(insert(table, { ...row(), [column]: inside })).resolves.toBeDefined();
    for (const outside of [min - 1e-6, max + 1e-6, NaN, Infinity])
      await expect(insert(table, { ...row(), [column]: outside })).rejects.toThrow(
        column.slice(0, 12),
      );
  });

  it('keeps the reference of a setup inside its shop and its grinder', async () => {
    const other = { shopId: randomUUID(), personId: randomUUID() };
    await insertShop(db.as.owner, other);
    const theirs: Row = { ...wheel(), shop_id: other.shopId };
    await insert('wheels', theirs);
    const setup = {
      ...common(),
      name: 'Jaws',
      operation: 'jaws',
      inputs: '{"operation": "jaws"}',
      plan: '{}',
      verdict: 'incomplete',
      verdict_count: 1,
      rules_version: '1.0.0',
      updated_by: shop.personId,
    };
    await expect(insert('setups', { ...setup, wheel_id: theirs.id })).rejects.toMatchObject({
      constraint: 'setups_wheel',
    });
    await expect(insert('setups', { ...setup, updated_by: other.personId })).rejects.toMatchObject({
      constraint: 'setups_updated_by',
    });
    await expect(insert('setups', { ...setup, quill_id: randomUUID() })).rejects.toMatchObject({
      constraint: 'setups_quill_of_grinder',
    });
    await expect(insert('setups', { ...setup, operation: 'bore' })).rejects.toMatchObject({
      constraint: 'setups_inputs_operation',
    });
    await expect(insert('setups', setup)).resolves.toMatchObject({ rowCount: 1 });
  });
});
