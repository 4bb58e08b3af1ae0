import type { Browser, Page } from 'playwright-core';

import { inspect, launchBrowser, openVisitor, type Size } from '../support/browser';
import { newSetup, type PlannerPage, signIn } from './planner-page';

jest.setTimeout(300_000);

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

interface Job {
  name: string;
  operation: RegExp;
  fill: (planner: PlannerPage) => Promise<void>;
  machines: [lathe: RegExp, grinder: RegExp, quill: RegExp];
  wheel: string;
  step: string;
  /** Something that stands in the plan only when it is right. */
  shows: RegExp;
}

const fields = async (planner: PlannerPage, texts: Record<string, string>) => {
  for (const [label, text] of Object.entries(texts)) await planner.field(label).fill(text);
};

const JOBS: Job[] = [
  {
    name: 'job-jaws',
    operation: /Chuck jaws/,
    // A 25 mm wheel on a quill of 70 mm, for the jaws of a 160 mm chuck.
    fill: (planner) => planner.fillJaws('mm'),
    machines: [/Tarnholt/, /inside/, /Stepped quill/],
    wheel: 'W06',
    step: 'C',
    shows: /touches|first/,
  },
  {
    name: 'job-shaft',
    operation: /Outside cylinder/,
    fill: async (planner) => {
      await planner.choose('Material', 'Alloy steel, hardened');
      await fields(planner, {
        'Diameter before grinding': '40',
        'Length to grind': '150',
        'To come off, on diameter': '0.10',
        'Worst run-out (TIR)': '0.04',
        'Tolerance, on diameter': '0.02',
        'Free length': '200',
      });
      await planner.choose('How it is held', 'Between centres');
    },
    machines: [/Tarnholt/, /outside/, /Short arbor/],
    wheel: 'W01',
    step: '3',
    shows: /To come off, on radius/,
  },
  {
    name: 'job-centre',
    operation: /Taper or centre/,
    fill: async (planner) => {
      await planner.choose('Material', 'Tool steel, hardened');
      await fields(planner, { 'Diameter at the big end': '25', 'Length along the axis': '21' });
      await planner.page.getByRole('button', { name: 'A lathe centre: 60°' }).click();
      await fields(planner, {
        'To come off, on diameter': '0.1',
        'Worst run-out (TIR)': '0.03',
        'Free length': '45',
      });
      await planner.choose('How it is held', 'In the taper of the spindle');
    },
    machines: [/Tarnholt/, /outside/, /Short arbor/],
    wheel: 'W01',
    step: '3',
    shows: /Set the compound to/,
  },
];

/** Opens every fold of the part, so that what lies one tap deeper is looked at too. */
async function openFolds(page: Page) {
  const closed = page.locator('[aria-expanded="false"][aria-label]:visible');
  for (let left = await closed.count(); left > 0; left -= 1) await closed.first().click();
}

describe.each<Size>(['phone', 'wide'])('on a %s screen', (size) => {
  it.each(JOBS)('$name is planned from nothing, and reads Clear', async (job) => {
    const { context, page, complaints } = await openVisitor(browser, size);
    await page.goto('/sign-in');
    await signIn(page, 'machinist');
    await page.waitForURL(/\/shops\//);
    const planner = await newSetup(page, size === 'wide', job.operation);
    await job.fill(planner);
    await planner.chooseMachines(job.machines);
    await planner.chooseWheel(job.wheel);
    await planner.step(job.step).click();
    await planner.verdict().filter({ hasText: 'Clear' }).waitFor({ state: 'attached' });
    await planner.saved();
    const parts = size === 'wide' ? ['all'] : ['Work', 'Machine', 'Wheel', 'Cut', 'Dress'];
    const faults: string[] = [];
    for (const part of parts) {
      if (part !== 'all') await planner.part(part as 'Work');
      await openFolds(page);
      if (part === 'Work' || part === 'all') await page.getByText(job.shows).first().waitFor();
      faults.push(...(await inspect(page, `${job.name}-${part.toLowerCase()}-${size}`)));
    }
    expect(faults).toEqual([]);
    expect(complaints.filter((words) => !words.includes('404'))).toEqual([]);
    await context.close();
  });
});
