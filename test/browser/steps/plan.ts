import type { Page } from 'playwright-core';
import { testPassword } from '../../factories/people.js';

export const safetyNet = 'Go to the emergency department for bleeding, confusion or breathlessness.';

/** The chair writes the whole plan and asks the contributors. */
export async function writePlan(page: Page, caseId: string, owner: string): Promise<void> {
  await page.goto(`/cases/${caseId}/plan`);
  await page.getByLabel('Working diagnosis').fill('Adult-onset inflammatory fever is most likely.');
  await page.getByRole('radio', { name: /^Provisional/ }).check();
  await page.getByLabel('Remaining doubt').fill('Lymphoma is not excluded before a node is out.');
  await page.getByLabel('Safety-net advice').fill(safetyNet);
  if (!(await page.getByLabel('1. What is to be done').isVisible())) {
    await page.getByRole('button', { name: 'Add an action' }).click();
  }
  await page.getByLabel('1. What is to be done').fill('Take out one lymph node.');
  const choice = page.getByLabel('Who', { exact: true });
  const option = await choice.locator('option', { hasText: owner }).getAttribute('value');
  await choice.selectOption(option ?? '');
  await page.getByLabel('By when').fill(new Date(Date.now() + 7 * 86_400_000).toISOString().slice(0, 10));
  await page.getByLabel('The patient is told of it').check();
  await page.getByRole('button', { name: 'Ask contributors' }).click();
  await page
    .getByText(/^Asked /)
    .first()
    .waitFor();
}

export async function agree(page: Page, caseId: string): Promise<void> {
  await page.goto(`/cases/${caseId}/plan`);
  await page.getByRole('button', { name: 'Agree with this plan' }).click();
  await page
    .getByText(/You agree/)
    .first()
    .waitFor();
}

export async function dissent(page: Page, caseId: string, words: string): Promise<void> {
  await page.goto(`/cases/${caseId}/plan`);
  await page
    .getByRole('button', { name: /dissent/i })
    .first()
    .click();
  await page.getByLabel('What you want on the record against this plan').fill(words);
  await page.getByRole('button', { name: 'Put dissent on the record' }).click();
  await page.getByText(words).first().waitFor();
}

export async function conclude(page: Page, caseId: string): Promise<void> {
  await page.goto(`/cases/${caseId}/plan`);
  await page.getByRole('button', { name: 'Close with this plan' }).click();
  const dialog = page.getByRole('alertdialog').or(page.getByRole('dialog'));
  await dialog.getByLabel(/password/i).fill(testPassword);
  await dialog.getByRole('button', { name: 'Close with this plan' }).click();
  await page.getByRole('article', { name: 'Plan 1' }).waitFor();
}
