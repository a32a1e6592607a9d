import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { assess } from '@weighhouse/shared/reasoning/assess';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  type JudgedCase,
  openRound,
  readDifferential,
  saveRow,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { type Desk, expectAccessible, expectNoSidewaysScroll, openChromium, openDesk } from './chromium.js';
import { standingShown } from './steps/judging.js';
import { signIn } from './steps/sign-in.js';

describe('other readings of the same numbers', () => {
  let running: RunningApp;
  let browser: Browser;
  let case_: JudgedCase;
  let mine: Desk;
  let chairs: Desk;

  beforeAll(async () => {
    running = await startApp();
    case_ = await unsealedCase(running, { contributors: 2, quorum: 2 });
    await openRound(case_, 'live');
    browser = await openChromium();
    mine = await openDesk(browser, running.url);
    chairs = await openDesk(browser, running.url);
    await signIn(mine.page, case_.contributors[0]!);
    await signIn(chairs.page, case_.chair);
    for (const { page } of [mine, chairs]) {
      await page.goto(`/cases/${case_.id}/differential`);
      await page.locator('.ledger-standing .standing-big').first().waitFor();
    }
  });
  afterAll(async () => {
    await browser.close();
    await running.close();
  });

  const panel = async () =>
    (await case_.chair.agent.get(`/api/cases/${case_.id}/panel`).expect(200)).body as PanelView;
  const percents = (standing: readonly number[]) => standing.map((share) => naturalFrequency(share).percent);
  const expectStanding = (desk: Desk, standing: readonly number[]) =>
    expect.poll(() => standingShown(desk.page)).toEqual(percents(standing));

  it('reads them as one cause or as candidates that may coexist, by the same function', async () => {
    const { page } = mine;
    await expectStanding(mine, assess(await panel()).standing);
    await page.getByRole('button', { name: 'may coexist' }).click();
    const read = assess({ ...(await panel()), coexistence: 0.05 });
    await expectStanding(mine, read.standing);
    await page.getByRole('button', { name: 'Which combinations' }).click();
    const most = naturalFrequency(read.sets[0]?.p ?? 0).words;
    await page
      .getByText(new RegExp(`(alone|together|None of these): ${most} like this`))
      .first()
      .waitFor();
    await expectAccessible(page);
    await page.keyboard.press('Escape');
    await page.getByRole('button', { name: 'Back to the panel’s reading' }).click();
    await expectStanding(mine, assess(await panel()).standing);
  });

  it('takes the chair’s share and a pair with a reason, and shows them to everybody', async () => {
    const { page } = chairs;
    await page.getByRole('button', { name: 'Assumption: what it means' }).click();
    await page.getByLabel(/how many have two or more/).fill('51');
    await page
      .getByRole('textbox', { name: 'Why' })
      .fill('Two illnesses at once are not seldom at this age.');
    await page.getByRole('button', { name: 'Save the share' }).click();
    await page.getByText(/must be a number from 0 to 50/i).waitFor();
    await page.getByLabel(/how many have two or more/).fill('20');
    await page.getByRole('button', { name: 'Save the share' }).click();
    await page.getByText('Saved. The panel reads its numbers so.').waitFor();
    await page.getByRole('button', { name: 'Note a pair' }).click();
    await page.getByLabel('This candidate').selectOption({ index: 1 });
    await page.getByLabel('makes this one').selectOption({ index: 2 });
    await page.getByLabel('so many times as likely').fill('3');
    await page.getByRole('textbox', { name: 'Why' }).last().fill('Both follow the same treatment.');
    await page.getByRole('button', { name: 'Save the pair' }).click();
    await page.getByText('Still’s disease makes Lymphoma three times as likely').first().waitFor();
    await expectAccessible(page);
    const now = await panel();
    expect(now).toMatchObject({ coexistence: 0.2, together: [{ a: 0, b: 1, times: 3 }] });
    await expectStanding(mine, assess(now).standing);
    await mine.page.getByRole('button', { name: 'may coexist', pressed: true }).waitFor();
  });

  it('shows the standing without a row, by mouse and by keyboard, and Escape ends it', async () => {
    const { page } = mine;
    const without = assess(await panel()).without.findings[case_.findings[0]?.id ?? ''] ?? [];
    const said = page.locator('.standing-without-said');
    await page.locator('.ledger-title').getByText('Fever every evening').hover();
    await said.getByText(/^Without “Fever every evening”/).waitFor();
    await expect
      .poll(() => page.locator('.ledger-standing .standing-without').first().textContent())
      .toBe(`${naturalFrequency(without[0] ?? 0).words} without`);
    await page.mouse.move(2, 2);
    await said.waitFor({ state: 'detached' });
    await page.locator('.ledger [tabindex="0"]').focus();
    await page.keyboard.press('Control+Home');
    await page.keyboard.press('ArrowDown');
    await said.getByText(/^Without “/).waitFor();
    await page.keyboard.press('Escape');
    await said.waitFor({ state: 'detached' });
  });

  it('tries other numbers that nobody else sees, on a base that moves with the others', async () => {
    const { page } = mine;
    const fever = case_.findings[0]?.id ?? '';
    const before = await standingShown(chairs.page);
    await page.getByRole('button', { name: 'What if' }).click();
    await page.getByLabel('Finding to try').selectOption(fever);
    await page.getByLabel('If it were', { exact: true }).selectOption({ label: 'absent' });
    await page.getByRole('textbox', { name: /^If it were A/ }).fill('12.3');
    await page.getByText('A trial. Only you see it.').waitFor();
    const tried = async () => {
      const own = (await readDifferential(case_, case_.contributors[0]!)).mine?.key;
      const base = await panel();
      for (const finding of base.findings) if (finding.id === fever) finding.observed = 0;
      for (const one of base.contributors) if (one.id === own) one.likelihoods[fever]!.given[0] = 0.123;
      return assess(base).standing;
    };
    await expectStanding(mine, await tried());
    await expectAccessible(page);
    expect(await standingShown(chairs.page)).toEqual(before);
    const answer = await readDifferential(case_, case_.contributors[0]!);
    expect(JSON.stringify(answer.mine)).not.toContain('12.3');

    await saveRow(case_, case_.contributors[1]!, 1, [5.5, 66.6, 44.4]);
    await expectStanding(mine, await tried());
  });

  it('survives loading the page again, keeps what is mine and drops the rest', async () => {
    const { page } = mine;
    await page.reload();
    await page.getByText('A trial. Only you see it.').waitFor();
    await page.setViewportSize({ width: 320, height: 640 });
    await page.locator('.cards').waitFor();
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
    await page.setViewportSize({ width: 1440, height: 900 });
    await page.getByRole('button', { name: 'Keep what is mine' }).first().click();
    await page
      .getByText(/What is not yours to judge stays a trial/)
      .first()
      .waitFor();
    const saved = await readDifferential(case_, case_.contributors[0]!);
    const row = saved.mine?.findings.find(({ findingId }) => findingId === case_.findings[0]?.id);
    expect(row).toMatchObject({ exposure: 'often', outOf100: [12.3, 48.9, 11.9] });
    expect(saved.findings[0]?.observed).toBe(1);
    await page.getByRole('button', { name: 'Drop the trial' }).first().click();
    await expectStanding(mine, assess(await panel()).standing);
    await expectStanding(chairs, assess(await panel()).standing);
    expect([...mine.complaints, ...chairs.complaints]).toEqual([]);
  });
});
