import type { Page } from 'playwright-core';

export async function openRound(page: Page, kind: 'Sealed' | 'Live'): Promise<void> {
  await page.getByRole('button', { name: 'Open a round' }).click();
  await page.getByRole('radio', { name: new RegExp(`^${kind}`) }).check();
  await page.getByRole('button', { name: 'Open the round' }).click();
  await page.getByRole('dialog').waitFor({ state: 'detached' });
}

/** Gives the prior, in the order of the columns, none of these last; it is asked before the rows are shown. */
export async function givePrior(page: Page, caseId: string, shares: string[]): Promise<void> {
  await page.goto(`/cases/${caseId}/differential`);
  const fields = page.getByRole('textbox', { name: /^How many of 100 would have/ });
  await fields.first().waitFor();
  for (const [index, share] of shares.entries()) await fields.nth(index).fill(share);
  await page.getByRole('button', { name: 'Save prior' }).click();
  await page.locator('.ledger').waitFor();
}

/** Judges one row; '' leaves a cell blank. */
export async function judgeRow(
  page: Page,
  title: string,
  exposure: 'Seldom' | 'Sometimes' | 'Often',
  cells: string[],
): Promise<void> {
  await page.locator('.ledger').getByText(title).click();
  await page.locator('.exposure').getByText(exposure, { exact: true }).click();
  const fields = page.getByRole('textbox', { name: /^If it were/ });
  for (const [index, cell] of cells.entries()) await fields.nth(index).fill(cell);
  await page.getByRole('button', { name: 'Save judgement' }).click();
  await page.getByText('What stands here is saved.').waitFor();
}

/** @returns the digest of the seal, as it is shown */
export async function handIn(page: Page): Promise<string> {
  await page.keyboard.press('Escape');
  await page.getByRole('button', { name: 'Hand in' }).click();
  const dialog = page.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Hand in' }).click();
  const digest = (await dialog.locator('code').textContent()) ?? '';
  await dialog.getByRole('button', { name: 'Back to the ledger' }).click();
  return digest.trim();
}

export async function unseal(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Unseal' }).click();
  await page.getByRole('button', { name: 'Unseal the round' }).click();
  await page.getByRole('alertdialog').or(page.getByRole('dialog')).waitFor({ state: 'detached' });
}

/** The percentages of the standing row as they are shown, none of these last. */
export async function standingShown(page: Page): Promise<string[]> {
  return page.locator('.ledger-standing .standing-big').allTextContents();
}
