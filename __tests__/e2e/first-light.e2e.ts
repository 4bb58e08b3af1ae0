import type { Browser, Page } from 'playwright-core';

import { inspect, launchBrowser, openVisitor, type Size } from '../support/browser';
import { newSetup, PlannerPage, signIn } from './planner-page';

jest.setTimeout(240_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const SIZES: Size[] = ['phone', 'wide'];

/** What the server holds of the setup whose planner is open. */
async function storedPlan(page: Page) {
  const { pathname } = new URL(page.url());
  return page.evaluate(async (path) => {
    const response = await fetch(`/api${path}`);
    const { inputs, plan } = await response.json();
    return { inputs, plan };
  }, pathname);
}

/** The same, without the last bits of doubles, in which 1/2 in and 12.7 mm may differ. */
async function steadyPlan(page: Page): Promise<unknown> {
  return JSON.parse(JSON.stringify(await storedPlan(page)), (_, value: unknown) =>
    typeof value === 'number' ? Number(value.toPrecision(12)) : value,
  );
}

const newJawSetup = (page: Page, wide: boolean) => newSetup(page, wide, /Chuck jaws/);

describe.each(SIZES)('on a %s screen', (size) => {
  const wide = size === 'wide';

  it('answers the first question to a visitor', async () => {
    const { context, page, complaints } = await openVisitor(browser, size);
    await page.goto('/');
    await page.getByText('Needs 3 things').first().waitFor();
    await page.getByRole('radio', { name: 'inch' }).click();
    await page.getByRole('textbox', { name: 'Wheel diameter, new' }).fill('1 1/4');
    await page.getByRole('textbox', { name: 'Marked limit' }).fill('25');
    await page.getByRole('radio', { name: 'motor and pulleys' }).click();
    await page.getByRole('textbox', { name: 'Motor, no load' }).fill('2850');
    await page.getByRole('textbox', { name: 'Pulley on the motor' }).fill('130 mm');
    await page.getByRole('textbox', { name: 'Pulley on the spindle' }).fill('24 mm');
    await page.getByText('Stop: too fast').waitFor();
    await page.getByText(/15.438.rpm is above the limit of 15.038.rpm/).waitFor();
    await page.getByRole('button', { name: /^Limit: 15/ }).click();
    await page
      .getByRole('dialog')
      .getByText(/Title 8, s\. 3580/)
      .waitFor();
    await page.keyboard.press('Escape');
    expect(await inspect(page, `quick-check-${size}`)).toEqual([]);
    await page.reload();
    await page.getByText('Stop: too fast').waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('plans a jaw-truing setup in millimetres and in inches: one plan, locked steps, saved and reopened', async () => {
    const { context, page, complaints } = await openVisitor(browser, size);
    await page.goto('/sign-in');
    await signIn(page, 'machinist');
    await page.waitForURL(/\/shops\//);

    const planner = await newJawSetup(page, wide);
    expect(await planner.verdict().textContent()).toMatch(/Needs \d+ things/);
    expect(await page.getByRole('alert').count()).toBe(0);
    await planner.fillJaws('mm');
    await planner.chooseMachines();

    // 190/22 of 2 980 rpm is 25 737: above the 20 850 marked on W07, below all limits of W06.
    await planner.chooseWheel('W07');
    expect(await planner.step('D').getAttribute('aria-disabled')).toBe('true');
    await page
      .getByText(/Locked out: 25.737.rpm is above/)
      .first()
      .waitFor();
    await planner.step('D').click({ force: true });
    expect(await planner.step('D').getAttribute('aria-checked')).toBe('false');

    await planner.chooseWheel('W06');
    await planner.step('D').click();
    await planner
      .verdict()
      .filter({ hasText: /Clear|Check/ })
      .waitFor({ state: 'attached' });
    await planner.chooseWheel('W07');
    await planner.verdict().filter({ hasText: 'Stop' }).waitFor({ state: 'attached' });
    await planner.step('C').click();
    await planner
      .verdict()
      .filter({ hasText: /Clear|Check/ })
      .waitFor({ state: 'attached' });
    await planner.saved();
    expect(await inspect(page, `planner-${size}`)).toEqual([]);
    const address = page.url().replace(/\?.*/, '');
    const inMillimetres = await steadyPlan(page);

    await planner.units('inch');
    await planner.part('Work');
    expect(await planner.field('Bore at the jaws').inputValue()).toBe('2.5');
    await page.goto(address.replace(/\/setups\/.*/, ''));
    const second = await newJawSetup(page, wide);
    await second.fillJaws('inch');
    await second.chooseMachines();
    await second.chooseWheel('W07');
    await second.step('C').click();
    await second.saved();
    expect(await steadyPlan(page)).toEqual(inMillimetres);

    await page.goto(address.replace(/\/setups\/.*/, '/shop'));
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.getByText('May this wheel run at this speed?').waitFor();
    await page.goto(address);
    await page.waitForURL(/sign-in\?next=/);
    await signIn(page, 'machinist');
    await page.waitForURL(address);
    const reopened = new PlannerPage(page, wide);
    await reopened.part('Work');
    expect(await reopened.field('Bore at the jaws').inputValue()).toBe('2.5');
    expect(await steadyPlan(page)).toEqual(inMillimetres);
    // The browser itself notes that a setup is not there before its first save.
    expect(complaints.filter((words) => !words.includes('404'))).toEqual([]);
    await context.close();
  });

  it('says at the field what is wrong, and loses nothing that was typed', async () => {
    const { context, page } = await openVisitor(browser, size);
    await page.goto('/sign-in');
    await signIn(page, 'apprentice');
    await page.waitForURL(/\/shops\//);
    const planner = await newJawSetup(page, wide);
    const bore = planner.field('Bore at the jaws');
    for (const [text, words] of [
      ['wide', /Bore at the jaws is a number/],
      ['0', /Bore at the jaws is from 1 to/],
      ['-20', /Bore at the jaws is from 1 to/],
    ] as const) {
      await bore.fill(text);
      await bore.blur();
      await page.getByText(words).waitFor();
      expect(await bore.inputValue()).toBe(text);
    }
    await bore.fill('20');
    await planner.field('Pad length').fill('long');
    await planner.part('Wheel');
    await page.getByRole('button', { name: 'Choose the wheel' }).click();
    await page.getByRole('button', { name: 'Type a wheel in' }).click();
    await planner.field('Diameter when new').fill('25');
    await planner.field('Width').fill('16');
    await planner.field('Hole').fill('8');
    await page
      .getByText(/as wide as the bore/)
      .first()
      .waitFor();

    await page.reload();
    await planner.part('Work');
    expect(await planner.field('Pad length').inputValue()).toBe('long');
    await page.getByText(/Pad length is a number/).waitFor();

    // The server is gone for a while: typing goes on, and is sent when it is back.
    await page.route('**/api/**', (route) => route.abort());
    await bore.fill('48');
    await page.getByText('kept on this device', { exact: true }).waitFor();
    await page.unroute('**/api/**');
    await planner.saved();
    const { inputs } = await storedPlan(page);
    expect(inputs.work.jawBoreMm).toBe(48);

    // Signed out elsewhere: what is typed stays, signing in brings it back.
    await page.evaluate(() => fetch('/api/session', { method: 'DELETE' }));
    await bore.fill('49');
    await page.getByText(/You are signed out/).waitFor();
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL(/sign-in\?next=/);
    await signIn(page, 'apprentice');
    await planner.part('Work');
    expect(await planner.field('Bore at the jaws').inputValue()).toBe('49');
    await planner.saved();
    await context.close();
  });
});
