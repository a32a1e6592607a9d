import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { type TestPerson, testPassword } from '../../factories/people.js';

export async function signIn(page: Page, person: TestPerson): Promise<void> {
  await page.goto('/');
  await page.getByLabel('E-mail').fill(person.email);
  await page.getByLabel('Password').fill(testPassword);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { level: 1, name: /wait/ }).waitFor();
  expect(new URL(page.url()).pathname).toBe('/');
}
