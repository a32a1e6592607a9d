import type { Page } from 'playwright-core';

export async function addCandidates(page: Page, names: string[]): Promise<void> {
  await page.getByRole('button', { name: 'Add or retire candidates' }).click();
  for (const name of names) {
    await page.getByLabel('Name').fill(name);
    await page.getByRole('button', { name: 'Add candidate' }).click();
    await page.locator('.ledger thead, .ledger-side').getByText(name).first().waitFor();
  }
  await closeSide(page);
}

export interface NewFinding {
  title: string;
  kind: string;
  known: 'Present' | 'Absent' | 'Not known yet';
}

export async function addFinding(page: Page, { title, kind, known }: NewFinding): Promise<void> {
  await page.getByRole('button', { name: 'Add a finding' }).click();
  await page.getByLabel('Finding', { exact: true }).fill(title);
  await page.getByLabel('Where it comes from').selectOption({ label: kind });
  await page.getByLabel('How far the report can be trusted').selectOption('firm');
  await page.getByRole('radio', { name: known }).check();
  await page.getByRole('button', { name: 'Add finding' }).click();
  await page.locator('.ledger').getByText(title).waitFor();
  await closeSide(page);
}

/** Shuts what stands beside the ledger, if anything does. */
export async function closeSide(page: Page): Promise<void> {
  await page.keyboard.press('Escape');
}
