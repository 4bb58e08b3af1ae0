import type { Browser, Page } from 'playwright-core';

import { inspect, launchBrowser, openVisitor, served, type Size } from '../support/browser';
import { signIn, type Role } from './planner-page';

jest.setTimeout(300_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const SIZES: Size[] = ['phone', 'wide'];
/** What roles hide is the same on both sizes: the wide screen is looked at as the lead alone. */
const ROLES: Record<Size, Role[]> = {
  phone: ['lead', 'machinist', 'apprentice'],
  wide: ['lead'],
};

/** Below the shop's address. */
const SCREENS: Record<string, string> = {
  bench: '',
  setups: '/setups',
  rack: '/wheels',
  board: '/board',
  shop: '/shop',
  machines: '/machines',
  appointments: '/appointments',
  'rack-narrowed': '/wheels?usable=yes&diameterToMm=60&sort=largest',
};

const FORMS: Record<string, string> = {
  'new-wheel': '/wheels/new',
  'new-lathe': '/machines/lathes/new',
  'new-grinder': '/machines/grinders/new',
};

/** The screen itself stands there: not the painted shell, not the bars that hold its place. */
async function settled(page: Page) {
  await page.waitForLoadState('networkidle');
  await page.getByRole('main').filter({ visible: true }).first().waitFor();
  await page.waitForFunction(() => !document.querySelector('[aria-busy="true"]'));
}

describe.each(SIZES)('on a %s screen', (size) => {
  it.each([
    '/',
    '/sign-in',
    '/sign-up',
    '/numbers',
    '/numbers?source=mh31-1318',
    '/numbers?show=all',
    '/nowhere',
  ])('%s is clean to a visitor', async (path) => {
    const { context, page, complaints } = await openVisitor(browser, size);
    await page.goto(path);
    await settled(page);
    const name = path === '/' ? 'home' : path.slice(1).replace(/\W/g, '-');
    expect(await inspect(page, `${name}-${size}`)).toEqual([]);
    expect(complaints).toEqual([]);
    await context.close();
  });

  it.each(ROLES[size])('every screen is clean to the %s, and fits 320 px', async (role) => {
    const { context, page, complaints } = await openVisitor(browser, size);
    await page.goto('/sign-in');
    await signIn(page, role);
    await page.waitForURL(/\/shops\//);
    const shop = new URL(page.url()).pathname;
    const setups = await page.evaluate(
      async (path) => (await (await fetch(`/api${path}/setups`)).json()).items,
      shop,
    );
    const wheels = await page.evaluate(
      async (path) => (await (await fetch(`/api${path}/wheels?limit=4`)).json()).items,
      shop,
    );
    const screens = {
      ...SCREENS,
      ...Object.fromEntries(
        wheels.map(({ id, tag }: { id: string; tag: string }) => [`wheel-${tag}`, `/wheels/${id}`]),
      ),
      ...(role === 'apprentice' ? {} : FORMS),
      ...Object.fromEntries(
        setups.map(({ id, operation }: { id: string; operation: string }) => [
          `setup-${operation}`,
          `/setups/${id}`,
        ]),
      ),
    };
    const faults: string[] = [];
    for (const [name, path] of Object.entries(screens)) {
      await page.goto(`${served().baseUrl}${shop}${path}`);
      await settled(page);
      const found = await inspect(page, `${name}-${role}-${size}`);
      faults.push(...found.map((fault) => `${name}: ${fault}`));
      if (size === 'phone') {
        await page.setViewportSize({ width: 320, height: 700 });
        const sideways = await page.evaluate(
          () => document.documentElement.scrollWidth > window.innerWidth,
        );
        if (sideways) faults.push(`${name}: scrolls sideways at 320 px`);
        await page.setViewportSize({ width: 390, height: 844 });
      }
    }
    expect(faults).toEqual([]);
    expect(complaints).toEqual([]);
    await context.close();
  });
});
