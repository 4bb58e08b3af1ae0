import type { Page } from 'playwright-core';

import { served } from '../support/browser';

/** The demo shop's jaw job in numbers that are whole in millimetres and in fractions of an inch. */
export const JAW_JOB = {
  mm: {
    'Bore at the jaws': '63.5',
    'Pad length': '25,4',
    'Near plane at': '12.7',
    'Run-out there (TIR)': ['0.1016', '0.127'],
    'High spot': ['40', '45'],
    'Far plane at': '76.2 mm',
    'Pad width': '9.525',
    'Free depth behind': '31.75',
  },
  inch: {
    'Bore at the jaws': '2 1/2',
    'Pad length': '1in',
    'Near plane at': '0,5',
    'Run-out there (TIR)': ['.004', '5 thou'],
    'High spot': ['40', '45'],
    'Far plane at': '3',
    'Pad width': '3/8',
    'Free depth behind': '1 1/4',
  },
} as const;

export type Role = 'lead' | 'machinist' | 'apprentice';

export async function signIn(page: Page, role: Role) {
  const person = served().signIns.find((known) => known.role === role);
  if (!person) throw new Error(`Nobody signs in as ${role}`);
  await page.getByLabel('E-mail address').fill(person.email);
  await page.getByRole('textbox', { name: 'Password' }).fill(person.password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
}

/** Starts a setup for the operation, and stands in its planner. */
export async function newSetup(page: Page, wide: boolean, operation: RegExp) {
  await page.getByRole('link', { name: 'Setups' }).first().click();
  await page.getByRole('button', { name: 'New setup' }).filter({ visible: true }).click();
  await page.getByRole('dialog').getByRole('button', { name: operation }).click();
  await page.waitForURL(/setups\/[0-9a-f-]{36}/);
  return new PlannerPage(page, wide);
}

/** The planner of one setup, as a person works it on either size of screen. */
export class PlannerPage {
  constructor(
    readonly page: Page,
    private readonly wide: boolean,
  ) {}

  /** A wide screen shows all parts at once. */
  async part(name: 'Work' | 'Machine' | 'Wheel' | 'Cut' | 'Dress') {
    if (!this.wide) await this.page.getByRole('tab', { name: new RegExp(`^${name}:`) }).click();
  }

  field(label: string, which = 0) {
    return this.page.getByRole('textbox', { name: label, exact: true }).nth(which);
  }

  async choose(label: string, option: string | RegExp) {
    await this.page.getByRole('button', { name: new RegExp(`^${label}`) }).click();
    const sheet = this.page.getByRole('dialog');
    await sheet.getByRole('radio', { name: option }).click();
    await sheet.waitFor({ state: 'hidden' });
  }

  async fillJaws(units: keyof typeof JAW_JOB) {
    await this.part('Work');
    await this.choose('Material', 'Tool steel, hardened');
    for (const [label, texts] of Object.entries(JAW_JOB[units])) {
      for (const [which, text] of [texts].flat().entries())
        await this.field(label, which).fill(text);
    }
    await this.choose('How the jaws are loaded', /Ring/);
  }

  async chooseMachines([lathe, grinder, quill] = [/Tarnholt/, /inside/, /Stepped quill/]) {
    await this.part('Machine');
    await this.choose('Lathe', lathe);
    await this.choose('Tool-post grinder', grinder);
    await this.choose('Quill or arbor', quill);
    await this.page.getByRole('checkbox', { name: /fixed shield/ }).click();
  }

  async chooseWheel(tag: string) {
    await this.part('Wheel');
    await this.page.getByRole('button', { name: /the wheel$/ }).click();
    const sheet = this.page.getByRole('dialog');
    await sheet.getByRole('textbox', { name: 'Tag or marking' }).fill(tag);
    await sheet.getByRole('radio', { name: new RegExp(`^${tag}`) }).click();
    await sheet.waitFor({ state: 'hidden' });
  }

  step(name: string) {
    return this.page.getByRole('radio', { name: new RegExp(`^(Belt step )?${name}\\b.*rpm`) });
  }

  verdict() {
    return this.page.getByRole('status').filter({ hasText: /^Verdict: / });
  }

  async saved() {
    await this.page.getByText(/^saved \d\d:\d\d$/).waitFor();
  }

  /** Puts the page's units to mm or inch, through the setup's own sheet. */
  async units(units: 'mm' | 'inch') {
    await this.page.getByRole('button', { name: 'Name, units, copy' }).click();
    const sheet = this.page.getByRole('dialog');
    await sheet.getByRole('radio', { name: units }).click();
    await sheet.getByRole('button', { name: 'Close' }).click();
    await sheet.waitFor({ state: 'hidden' });
  }
}
