import type { Browser, Page } from 'playwright-core';

import { inspect, launchBrowser, openVisitor, type Size } from '../support/browser';
import { PlannerPage, signIn, type Role } from './planner-page';

jest.setTimeout(300_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

/** A person of the shop at a page of the shop's. */
async function personAt(role: Role, size: Size) {
  const visitor = await openVisitor(browser, size);
  await visitor.page.goto('/sign-in');
  await signIn(visitor.page, role);
  await visitor.page.waitForURL(/\/shops\//);
  return { ...visitor, shop: new URL(visitor.page.url()).pathname };
}

const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name });
const sheetOf = (page: Page) => page.getByRole('dialog');
const field = (page: Page, label: string) =>
  page.getByRole('textbox', { name: label, exact: true });

/** Opens the form of a step, fills it, records it, and waits until the page says so. */
async function record(
  page: Page,
  step: string,
  fill: (sheet: ReturnType<typeof sheetOf>) => Promise<void>,
) {
  await page.getByRole('button', { name: step, exact: true }).click();
  await fill(sheetOf(page));
  await sheetOf(page)
    .getByRole('button', { name: /Record it|It is off/ })
    .click();
  await sheetOf(page).waitFor({ state: 'hidden' });
  await page.getByText(/^Recorded: /).waitFor();
}

const nothing = () => Promise.resolve();
const picture = (page: Page) => page.getByRole('img', { name: /^New / });

/** Every run adds a wheel of its own to the rack. */
const newTag = () => `E${Date.now().toString(36).slice(-7).toUpperCase()}`;

async function addWheel(page: Page, shop: string, tag: string) {
  await page.goto(`${shop}/wheels`);
  await page.getByRole('link', { name: 'Add a wheel' }).click();
  await field(page, 'Tag').fill(tag);
  await field(page, 'Marking').fill('A 60 K 8 V');
  await field(page, 'Diameter when new').fill('25 x 20 x 8');
  await field(page, 'Marked rpm').fill('26 700');
  expect(await field(page, 'Hole').inputValue()).toBe('8');
  expect(await inspect(page, 'rack-add-phone')).toEqual([]);
  await button(page, 'Save the wheel').click();
  await page.waitForURL(/wheels\/[0-9a-f-]{36}$/);
  await page.getByRole('heading', { name: 'Next' }).waitFor();
  return new URL(page.url()).pathname;
}

it('follows one wheel from its marking to the setup that it stops, on a phone', async () => {
  const tag = newTag();
  const machinist = await personAt('machinist', 'phone');
  const at = await addWheel(machinist.page, machinist.shop, tag);

  await record(machinist.page, 'Close look', (sheet) =>
    sheet.getByRole('radio', { name: 'Looked at, no fault seen' }).click(),
  );

  const apprentice = await personAt('apprentice', 'phone');
  await apprentice.page.goto(at);
  await apprentice.page.getByText(/^Ring test due/).waitFor();
  await button(apprentice.page, 'Ring test').click();
  await sheetOf(apprentice.page)
    .getByText(/about 45 degrees either side/)
    .waitFor();
  expect(await inspect(apprentice.page, 'rack-ring-test-phone')).toEqual([]);
  await sheetOf(apprentice.page).getByRole('radio', { name: 'Rings clear' }).click();
  await button(apprentice.page, 'Record it').click();
  await apprentice.page.getByText(/waits for the signature of a lead or a machinist/).waitFor();
  await apprentice.page.getByText('Nobody signs for an entry of their own.').waitFor();
  expect(await button(apprentice.page, /^Sign for/).count()).toBe(0);

  const { page } = machinist;
  await page.reload();
  await button(page, /^Sign for Ring test/).click();
  await button(page, 'I sign for this').click();
  await page.getByText(/^Recorded: Signed for/).waitFor();

  await record(page, 'Mount', (sheet) =>
    sheet.getByRole('radio', { name: /Stepped quill/ }).click(),
  );
  await page.getByText(/Since it was mounted the wheel has had no trial run/).waitFor();
  await record(page, 'Trial run', async (sheet) => {
    await sheet.getByRole('textbox', { name: 'Trial run' }).fill('3');
    await sheet.getByRole('radio', { name: /rpm/, disabled: false }).first().click();
  });
  expect(await picture(page).getAttribute('aria-label')).toContain('now 25\u00a0mm');

  await record(page, 'Dress', async (sheet) => {
    await sheet.getByRole('textbox', { name: 'Depth of a pass' }).fill('0.02');
    await sheet.getByRole('textbox', { name: 'Passes' }).fill('3');
    await sheet.getByText(/this leaves 24\.88.mm/).waitFor();
    expect(await inspect(page, 'rack-dress-phone')).toEqual([]);
  });
  // Three passes of 0.02 mm on radius: 25 - 2 x 3 x 0.02.
  await page.getByText(/It is 24\.88.mm now/).waitFor();
  await record(page, 'Dress', async (sheet) => {
    await sheet.getByRole('textbox', { name: 'Depth of a pass' }).fill('0.01');
    await sheet.getByRole('textbox', { name: 'Passes' }).fill('2');
  });
  await page.getByText(/It is 24\.84.mm now/).waitFor();
  expect(await picture(page).getAttribute('aria-label')).toMatch(/now 24\.84.mm.*2 dressings/);
  expect(await inspect(page, 'rack-wheel-phone')).toEqual([]);

  const setup = await setupWith(page, machinist.shop, tag);
  await button(page, `Set ${tag} aside`).click();
  await button(page, 'Dropped or knocked').click();
  await sheetOf(page)
    .getByText(/The one setup that uses it is stopped/)
    .waitFor();
  expect(await inspect(page, 'rack-set-aside-phone')).toEqual([]);
  await button(page, 'Done').click();
  await setup.verdict().filter({ hasText: 'Stop' }).waitFor({ state: 'attached' });

  await page.goto(at);
  await page.getByText('set aside: Dropped or knocked').first().waitFor();
  await page.getByText('The wheel is still on a spindle. Take it off first.').waitFor();
  await record(page, 'Take off', nothing);
  await page.getByText('Only a lead returns a wheel from set aside.').waitFor();
  expect(await page.getByRole('list', { name: 'Setups that use it' }).textContent()).toContain(
    'Stop',
  );
  expect(machinist.complaints.filter((words) => !words.includes('404'))).toEqual([]);
  expect(apprentice.complaints).toEqual([]);
  await machinist.context.close();
  await apprentice.context.close();
});

/** A jaw setup in which nothing but the wheel was to be chosen. */
async function setupWith(page: Page, shop: string, tag: string) {
  await page.goto(`${shop}/setups`);
  await button(page, 'New setup').filter({ visible: true }).click();
  await sheetOf(page)
    .getByRole('button', { name: /Chuck jaws/ })
    .click();
  await page.waitForURL(/setups\/[0-9a-f-]{36}/);
  const planner = new PlannerPage(page, false);
  await planner.fillJaws('mm');
  await planner.chooseMachines();
  await planner.chooseWheel(tag);
  await planner.verdict().filter({ hasNotText: 'Stop' }).waitFor({ state: 'attached' });
  await planner.saved();
  return planner;
}

it('narrows the rack in its address and reads a wheel beside it, on a wide screen', async () => {
  const { page, context, complaints, shop } = await personAt('lead', 'wide');
  await page.goto(`${shop}/wheels`);
  await button(page, 'Usable now').click();
  await button(page, 'Diameter now').click();
  await sheetOf(page).getByRole('textbox', { name: 'At most' }).fill('1 1/4 in');
  expect(await inspect(page, 'rack-filter-wide')).toEqual([]);
  await button(page, 'Show the wheels').click();
  await page.waitForURL(/usable=yes.*diameterToMm=31\.75/);
  await page.getByRole('link', { name: 'W06' }).click();
  const beside = page.getByRole('region', { name: 'The chosen wheel' });
  await beside.getByRole('heading', { name: 'A 60 K 6 V' }).waitFor();
  await page.reload();
  await beside.getByRole('heading', { name: 'A 60 K 6 V' }).waitFor();
  expect(await page.getByRole('link', { name: 'W07' }).count()).toBe(0);
  expect(await inspect(page, 'rack-wide')).toEqual([]);
  await button(page, /^Remove the filter up to 31\.75/).click();
  await page.getByRole('link', { name: 'W07' }).waitFor();
  expect(complaints).toEqual([]);
  await context.close();
});
