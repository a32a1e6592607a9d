import type { Page } from 'playwright-core';
import { expect } from 'vitest';

export const question = 'Eleven weeks of evening fever and sore wrists: what is the cause?';

/** The referrer opens a case, fills every part, uploads two reports and submits. @returns the case's id */
export async function refer(page: Page, report: Buffer): Promise<string> {
  await page.getByRole('link', { name: 'Cases', exact: true }).click();
  await page.getByRole('link', { name: 'New referral' }).first().click();
  await page.getByRole('heading', { level: 1, name: 'A new referral' }).waitFor();
  await page.getByLabel('Question').fill(question);
  await page.getByRole('button', { name: 'Begin the referral' }).click();
  await page.waitForURL(/\/cases\/[0-9a-f-]{36}\/edit/);
  await page.getByLabel('Age').fill('47');
  await page.getByLabel('Sex').selectOption('female');
  await page.getByRole('radio', { name: 'Within 1 week' }).click();
  await page.getByLabel('Why so urgent').fill('Weight is falling.');
  await page.getByRole('radio', { name: 'Yes, signed' }).click();
  await page.getByLabel('Given on').fill(new Date().toISOString().slice(0, 10));
  await page.locator('.tiptap').click();
  await page.keyboard.type('Well until eleven weeks ago. Fever every evening since then.');
  await page
    .getByText(/^Saved/)
    .first()
    .waitFor();
  const caseId = /\/cases\/([0-9a-f-]{36})/.exec(page.url())?.[1] ?? '';
  await page.locator('input[type="file"]').setInputFiles([
    { name: 'Ultrasound.pdf', mimeType: 'application/pdf', buffer: report },
    { name: 'Letter.txt', mimeType: 'text/plain', buffer: Buffer.from('No murmur was heard.') },
  ]);
  await page.getByText('Ultrasound.pdf').first().waitFor();
  await page.getByText('Letter.txt').first().waitFor();
  await fillIdentityCard(page);
  await page.getByRole('heading', { name: 'Nothing is missing' }).waitFor();
  await page.getByRole('button', { name: 'Submit the referral' }).click();
  await page.waitForURL((url) => !url.pathname.endsWith('/edit'));
  expect(caseId).not.toBe('');
  return caseId;
}

async function fillIdentityCard(page: Page): Promise<void> {
  const open = page.getByRole('button', { name: 'Open the identity card' });
  if (await open.isVisible()) await open.click();
  const card = page.getByRole('group', { name: 'Identity card' });
  await card.getByLabel('Name').fill('Ottoline Brandvold');
  await card.getByLabel('Birth date').fill('1979-05-04');
  await card.getByLabel('Telephone').fill('+353 20 915 0199');
  await card.getByLabel('Language').fill('English');
  await card.getByRole('button', { name: 'Save the card' }).click();
  await page.getByText('Ottoline Brandvold').first().waitFor();
}

/** The chair accepts with both specialists and the liaison; no conference date yet, a quorum of two. */
export async function accept(
  page: Page,
  caseId: string,
  contributors: string[],
  liaison: string,
): Promise<void> {
  await page.goto(`/cases/${caseId}`);
  await page.getByRole('link', { name: 'Accept with a team' }).click();
  for (const name of [...contributors, liaison]) {
    await page.getByRole('button', { name: `Add ${name}` }).click();
  }
  await page.getByRole('radio', { name: 'No date yet' }).click();
  await page.getByRole('textbox', { name: 'Quorum' }).fill('2');
  await page.getByRole('button', { name: 'Accept the case' }).click();
  await page.waitForURL(/\/differential$/);
}
