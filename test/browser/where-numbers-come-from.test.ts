import { readFile } from 'node:fs/promises';
import { assess } from '@weighhouse/shared/reasoning/assess';
import type { Panel } from '@weighhouse/shared/reasoning/panel';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  handIn,
  type JudgedCase,
  openRound,
  savePrior,
  saveRow,
  unseal,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { type Desk, expectAccessible, expectNoSidewaysScroll, openChromium, openDesk } from './chromium.js';
import { signIn } from './steps/sign-in.js';

const candidates = ['Still’s disease', 'Lymphoma', 'Endocarditis'];
const findings = [
  { title: 'Fever every evening', observed: 1 },
  { title: 'Salmon-coloured rash', observed: 1 },
  { title: 'Heart murmur', observed: 0 },
];
/** Fever and rash push alike, so that they may count twice. */
const rows = [
  [80, 30, 25, 20],
  [70, 20, 16, 12],
  [5, 6, 60, 10],
];

describe('where the numbers come from', () => {
  let running: RunningApp;
  let browser: Browser;
  let case_: JudgedCase;
  let chair: Desk;
  let specialist: Desk;
  const side = (page: Page) => page.getByRole('complementary', { name: 'At the side of the ledger' });
  const ledgerPath = () => `/cases/${case_.id}/differential`;

  beforeAll(async () => {
    running = await startApp();
    browser = await openChromium();
    case_ = await acceptedCase(running, { candidates, findings, ownPeople: true });
    const round = await openRound(case_, 'sealed');
    for (const [index, person] of case_.contributors.entries()) {
      await savePrior(case_, person, [20 + index, 30, 10, 40 - index]);
      for (const [finding, shares] of rows.entries())
        await saveRow(
          case_,
          person,
          finding,
          shares.map((share) => share + index),
          { reason: `Reason ${String(index)}` },
        );
      await handIn(round, person);
    }
    await unseal(case_, round);
    chair = await openDesk(browser, running.url);
    specialist = await openDesk(browser, running.url);
    await signIn(chair.page, case_.chair);
    await signIn(specialist.page, case_.contributors[0] ?? case_.chair);
  });
  afterAll(async () => {
    await browser.close();
    await running.close();
  });

  it('a standing cell opens a sum by keyboard, and the sum is where the panel stands', async () => {
    const { page } = specialist;
    await page.goto(ledgerPath());
    const cell = page.locator('.ledger-standing td').first();
    await cell.focus();
    await cell.press('Enter');
    await side(page)
      .getByRole('heading', { name: /^Why A Still’s disease stands at \d+ of 100$/ })
      .waitFor();
    await expectSum(page);
    expect(
      await side(page)
        .getByText(/times as often in A as in/)
        .count(),
    ).toBeGreaterThan(0);
    for (const against of ['Everything else', 'C Endocarditis']) {
      await side(page).getByLabel('Held against').selectOption({ label: against });
      await expectSum(page);
    }
    await expectAccessible(page);
    const said = await side(page).getByRole('heading').first().innerText();
    const drawn = await side(page)
      .getByRole('img', { name: /where the panel stands/ })
      .getAttribute('data-whole');
    expect(said).toContain(`${String(drawn)} of 100`);
    await page.keyboard.press('Escape');
    expect(await cell.evaluate((element) => element === document.activeElement)).toBe(true);
  });

  it('where candidates may coexist the sum still adds up, and says that it holds in this order', async () => {
    const { page } = specialist;
    await page.getByRole('button', { name: 'may coexist' }).click();
    await page.locator('.ledger-standing td').first().click();
    await side(page)
      .getByText(/in this order: what matters most stands first/)
      .waitFor();
    await expectSum(page);
    await page.getByRole('button', { name: 'Back to the panel’s reading' }).click();
  });

  it('a row says who said what, with reasons, to the panel', async () => {
    const { page } = specialist;
    await page.locator('.ledger').getByText('Heart murmur').click();
    const voices = side(page).getByRole('region', { name: 'Who said what' });
    await voices.getByText('“Reason 2”').waitFor();
    expect(await voices.getByRole('row').count()).toBe(1 + 2 * case_.contributors.length);
    await expectAccessible(page);
  });

  it('how it was pooled prints on one page, and nothing else with it', async () => {
    const { page } = chair;
    await page.goto(ledgerPath());
    await page.getByRole('button', { name: 'How it was pooled' }).click();
    await side(page)
      .getByText(/They part where people are far apart/)
      .waitFor();
    await expectAccessible(page);
    await page.evaluate(() => {
      window.print = () => document.documentElement.setAttribute('data-printed', '');
    });
    await side(page).getByRole('button', { name: 'Print this page' }).click();
    await page.locator('html[data-printed]').waitFor();
    await page.emulateMedia({ media: 'print' });
    await page.locator('.pooled-sheet').waitFor();
    const paper = await page.locator('body').innerText();
    await page.emulateMedia({ media: null });
    expect(paper).toContain(`How it was pooled: ${case_.number}`);
    for (const { name } of case_.contributors) expect(paper).toContain(name);
    expect(paper).not.toContain('Where the panel stands');
    const pdf = await page.pdf({ preferCSSPageSize: true });
    expect(pdf.toString('latin1').match(/\/Type\s*\/Page\b(?!s)/g)).toHaveLength(1);
  });

  it('the panel as JSON gives the standing on the screen', async () => {
    const { page } = chair;
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      side(page).getByRole('button', { name: 'Panel as JSON' }).click(),
    ]);
    const file = await download.path();
    const { standing } = assess(JSON.parse(await readFile(file, 'utf8')) as Panel, { only: 'standing' });
    const shown = await page.locator('.ledger-standing .standing-big').first().innerText();
    expect(shown).toBe(`${String(Math.round((standing[0] ?? 0) * 100))}%`);
  });

  it('findings that may count twice are asked about; one puts it away, the chair groups them at one click', async () => {
    const question = (page: Page) =>
      page.locator('.ledger-foot').getByText('These two have nearly the same beams: do they count twice?');
    await specialist.page.goto(ledgerPath());
    await question(specialist.page).waitFor();
    await specialist.page.getByRole('button', { name: 'No, put away for me' }).click();
    await question(specialist.page).waitFor({ state: 'detached' });
    await specialist.page.reload();
    await specialist.page.getByRole('button', { name: /Show 1 question about counting twice/ }).waitFor();

    await question(chair.page).waitFor();
    await chair.page
      .locator('.ledger-foot')
      .getByRole('button', { name: 'Group them, overlap 50 of 100' })
      .click();
    await question(chair.page).waitFor({ state: 'detached' });
    const { body } = await case_.chair.agent.get(`/api/cases/${case_.id}/panel`).expect(200);
    const panel = body as Panel;
    expect(panel.groups?.map(({ overlap }) => overlap)).toEqual([0.5]);
    expect(panel.findings?.map(({ group }) => group === panel.groups?.[0]?.id)).toEqual([true, true, false]);
  });

  it('the chair changes the overlap by keyboard, and a group made meanwhile is not lost', async () => {
    const { page } = chair;
    await page.getByRole('button', { name: 'Findings that overlap' }).click();
    const overlap = side(page).getByLabel('Overlap, of 100');
    await overlap.focus();
    await page.keyboard.press('ControlOrMeta+a');
    await page.keyboard.type('80');
    await side(page).getByLabel('Reason for the change').focus();
    await page.keyboard.type('The rash comes with the fever');
    await page.keyboard.press('Enter');
    await side(page).getByText('Saved.').waitFor();
    await expectAccessible(page);
    const { body } = await case_.chair.agent.get(`/api/cases/${case_.id}/panel`).expect(200);
    expect((body as Panel).groups?.map((group) => group.overlap)).toEqual([0.8]);
  });

  it('the referrer reads the same without names', async () => {
    const desk = await openDesk(browser, running.url);
    await signIn(desk.page, case_.referrer);
    await desk.page.goto(ledgerPath());
    await desk.page.locator('.ledger').getByText('Heart murmur').click();
    const voices = side(desk.page).getByRole('region', { name: 'Who said what' });
    await voices.waitFor();
    const said = await voices.innerText();
    for (const { name } of case_.contributors) expect(said).not.toContain(name);
    expect(said).not.toContain('Reason');
    expect(desk.complaints).toEqual([]);
  });

  it('while a later round is sealed, page and JSON hold what the earlier one left, and only reports are compared', async () => {
    await case_.chair.agent.post(`/api/rounds/${await openRoundId()}/close`).send({});
    await openRound(case_, 'sealed');
    const { page } = chair;
    await page.goto(ledgerPath());
    await page.getByRole('button', { name: 'How it was pooled' }).click();
    await side(page)
      .getByText(/Both hold what round 1 left/)
      .waitFor();
    expect(await page.getByText(/nearly the same beams/).count()).toBe(0);
  });

  it('nothing of it scrolls sideways on a phone, and no page complained', async () => {
    const { page } = specialist;
    await page.setViewportSize({ width: 320, height: 640 });
    await page.goto(ledgerPath());
    await page.getByRole('button', { name: /^Why A Still’s disease stands there$/ }).click();
    await expectSum(page);
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
    expect([...chair.complaints, ...specialist.complaints]).toEqual([]);
  });

  async function openRoundId(): Promise<string> {
    const { body } = await case_.chair.agent.get(`/api/cases/${case_.id}/rounds`).expect(200);
    return (body as { items: { id: string }[] }).items.at(-1)?.id ?? '';
  }

  /** The last "so far" is the start and every push that is shown, to the tenths of as many figures. */
  async function expectSum(page: Page): Promise<void> {
    await side(page).locator('[data-adds-up="true"]').waitFor();
    const figures = await side(page).locator('.sum-table tbody td').allInnerTexts();
    const numbers = figures.map((figure) => (figure === '' ? null : Number(figure.replace('−', '-'))));
    const pushes = numbers.filter((_, index) => index % 2 === 0).flatMap((push) => push ?? []);
    const end = numbers.at(-1) ?? Number.NaN;
    expect(Math.abs(pushes.reduce((sum, push) => sum + push, 0) - end)).toBeLessThanOrEqual(
      0.05 * (pushes.length + 1) + 1e-9,
    );
  }
});
