import type { Browser } from 'playwright-core';

import { launchBrowser, openVisitor, type Size } from '../support/browser';
import { signIn } from './planner-page';

jest.setTimeout(120_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe.each<Size>(['phone', 'wide'])('on a %s screen', (size) => {
  it('a figure leads to the page of its source, and back to the plan as it was typed', async () => {
    const { context, page, complaints } = await openVisitor(browser, size);
    await page.goto('/sign-in');
    await signIn(page, 'lead');
    await page.waitForURL(/\/shops\//);
    const shop = new URL(page.url()).pathname;
    const { items } = await page.evaluate(
      async (path): Promise<{ items: { id: string }[] }> =>
        (await fetch(`/api${path}/setups`)).json(),
      shop,
    );
    await page.goto(`${shop}/setups/${items[0]?.id ?? ''}`);
    // It has a number once machines and wheel are there.
    const figure = page
      .getByRole('button', { name: /^(Wheel|Spindle step): .*\d.*Show the working/ })
      .filter({ visible: true });
    const words = await figure.first().getAttribute('aria-label');
    await figure.first().click();
    await page.getByRole('dialog').getByRole('link').click();

    await page.waitForURL(/\/numbers\?source=/);
    await page.getByText('What rests on it').waitFor();
    await page.getByText(/worked out on this device just now: all agree/).waitFor();
    expect(await page.getByRole('dialog').filter({ visible: true }).count()).toBe(0);
    await page.getByRole('button', { name: 'Show all sources' }).click();
    await page.getByLabel('Search').fill('bushings');
    await page.waitForURL(/search=bushings/);
    await page.getByText('A60 L').first().waitFor();

    await page.getByRole('button', { name: 'Back' }).filter({ visible: true }).click();
    await page.waitForURL(/\/setups\//);
    await figure.first().waitFor();
    expect(await figure.first().getAttribute('aria-label')).toBe(words);
    expect(complaints).toEqual([]);
    await context.close();
  });
});
