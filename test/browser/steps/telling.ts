import type { Page } from 'playwright-core';

/** The liaison opens the waiting case and hands the summary, drafted by template, to the chair with a sentence more. */
export async function writeSummary(page: Page, caseId: string, sentence: string): Promise<void> {
  await page.goto('/tell');
  await page.locator(`a[href="/tell/${caseId}"]`).first().click();
  const text = page.getByLabel('The text');
  const drafted = await text.inputValue();
  await text.fill(`${drafted}\n\n${sentence}`);
  await page.getByRole('button', { name: 'Hand to the chair for approval' }).click();
  await page
    .getByText(/waits for/i)
    .first()
    .waitFor();
}

export async function approveSummary(page: Page, caseId: string): Promise<void> {
  await page.goto(`/cases/${caseId}/summary`);
  await page.getByRole('button', { name: 'Approve the summary' }).click();
  await page
    .getByText(/approved/i)
    .first()
    .waitFor();
}

export async function tell(page: Page, caseId: string): Promise<void> {
  await page.goto(`/tell/${caseId}`);
  await page.getByRole('button', { name: 'Tell', exact: true }).click();
  await page.getByRole('radio', { name: 'Telephone' }).check();
  const reached = page.getByRole('radio', { name: /^Yes/ });
  for (const radio of await reached.all()) await radio.check();
  await page.getByRole('button', { name: 'Log that it was told' }).click();
  await page.getByRole('button', { name: 'Tell again' }).waitFor();
}
