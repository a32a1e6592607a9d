import type { Person } from '@weighhouse/shared/contracts/people';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makePerson, signedIn, testPassword } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { openChromium, openDesk } from './chromium.js';
import { signIn } from './steps/sign-in.js';

describe('somebody who is deactivated', () => {
  let running: RunningApp;
  let browser: Browser;
  beforeAll(async () => {
    running = await startApp();
    browser = await openChromium();
  });
  afterAll(async () => {
    await browser.close();
    await running.close();
  });

  it('is shown nothing more at once, on a page without a case too, and not let in again', async () => {
    const administrator = await signedIn(running, await makePerson(running, 'administrator'));
    const leaving = await makePerson(running, 'specialist', { name: 'Dr Leaving Example' });
    const { page, complaints } = await openDesk(browser, running.url);
    const connected = page.waitForEvent('websocket').then((socket) => socket.waitForEvent('framereceived'));
    await signIn(page, leaving);
    await page.getByRole('heading', { level: 1, name: 'Nothing waits for you' }).waitFor();
    // The server's first word on the socket: it stands.
    await connected;

    const { items } = (await administrator.get('/api/people').expect(200)).body as { items: Person[] };
    const version = items.find(({ id }) => id === leaving.id)?.version;
    await administrator.patch(`/api/people/${leaving.id}`).send({ version, active: false }).expect(200);
    await page.getByRole('heading', { level: 1, name: 'Your session is over' }).waitFor({ timeout: 5_000 });
    expect(await page.getByRole('heading', { name: 'Nothing waits for you' }).isVisible()).toBe(false);

    await page.getByLabel('Password').fill(testPassword);
    await page.getByRole('button', { name: 'Sign in' }).click();
    expect(await page.getByRole('alert').innerText()).toContain('do not belong together');
    expect(complaints).toEqual([]);
  });
});
