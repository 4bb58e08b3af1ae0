import fs from 'node:fs';
import path from 'node:path';

import { AxeBuilder } from '@axe-core/playwright';
import { chromium, type Browser, type Page } from 'playwright-core';

const SHOTS = path.resolve(__dirname, '../e2e/out');

const FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Long enough for a busy machine, short enough to name the step that failed. */
const ACTION_WITHIN_MS = 15_000;

/** The two sizes that every screen is looked at in. */
export const SIZES = {
  phone: { width: 390, height: 844 },
  wide: { width: 1280, height: 800 },
} as const;

export type Size = keyof typeof SIZES;

export interface SignIn {
  role: string;
  name: string;
  email: string;
  password: string;
}

/** Where the app is served, and who can sign in to the demo shop. */
export function served() {
  const baseUrl = process.env.BASE_URL;
  const signIns = process.env.SIGN_INS;
  if (!baseUrl || !signIns) {
    throw new Error('Browser tests run against a served app: npm test -- --only browser');
  }
  return { baseUrl, signIns: JSON.parse(signIns) as SignIn[] };
}

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    args: FLAGS,
  });
}

/** A visitor of their own: nobody else's cookies or storage, and a list of what the console complained of. */
export async function openVisitor(browser: Browser, size: Size) {
  const phone = size === 'phone';
  const context = await browser.newContext({
    baseURL: served().baseUrl,
    viewport: SIZES[size],
    deviceScaleFactor: phone ? 2 : 1,
    isMobile: phone,
    hasTouch: phone,
  });
  context.setDefaultTimeout(ACTION_WITHIN_MS);
  const complaints: string[] = [];
  context.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) complaints.push(message.text());
  });
  context.on('weberror', (error) => complaints.push(error.error().message));
  return { context, page: await context.newPage(), complaints };
}

/**
 * Looks at the page in both palettes: keeps a picture of each in e2e/out, and answers with everything axe
 * finds, as `palette rule: element`.
 */
export async function inspect(page: Page, name: string): Promise<string[]> {
  fs.mkdirSync(SHOTS, { recursive: true });
  const found: string[] = [];
  for (const [palette, colorScheme] of [
    ['night', 'dark'],
    ['day', 'light'],
  ] as const) {
    await page.emulateMedia({ colorScheme });
    await page.evaluate(() => document.fonts.ready.then(() => undefined));
    await page.screenshot({ path: path.join(SHOTS, `${name}-${palette}.png`), fullPage: true });
    const { violations } = await new AxeBuilder({ page }).analyze();
    for (const { id, nodes } of violations) {
      found.push(...nodes.map(({ target }) => `${palette} ${id}: ${target.join(' ')}`));
    }
  }
  return found;
}
