import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { writeReportPdf } from '@weighhouse/db/demo/report-pdf';
import type { Browser } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { makePerson, type TestPerson } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';
import { type Desk, expectAccessible, openChromium, openDesk } from './chromium.js';
import { eavesdrop, formsOf, type Received } from './eavesdropping.js';
import { addCandidates, addFinding } from './steps/evidence.js';
import { givePrior, handIn, judgeRow, openRound, standingShown, unseal } from './steps/judging.js';
import { agree, conclude, dissent, safetyNet, writePlan } from './steps/plan.js';
import { accept, question, refer } from './steps/referral.js';
import { signIn } from './steps/sign-in.js';
import { approveSummary, tell, writeSummary } from './steps/telling.js';

const roles = {
  referrer: 'referrer',
  first: 'specialist',
  second: 'specialist',
  chair: 'chair',
  liaison: 'liaison',
} as const;
type Who = keyof typeof roles;
const everybody = Object.keys(roles) as Who[];

/** Numbers that stand nowhere else, so that finding one means that it leaked. */
const secret = {
  prior: ['37.3', '41.9', '20.8'],
  fever: ['73.7', '18.3', '27.9'],
  node: ['61.3', '83.9', '12.7'],
};
const rows = ['Fever every evening above 39 °C', 'Lymph nodes up to 2 cm', 'Heart murmur'];

describe('five people close a case together', () => {
  let running: RunningApp;
  let browser: Browser;
  let caseId = '';
  let firstDigest = '';
  const people = {} as Record<Who, TestPerson>;
  const desks = {} as Record<Who, Desk>;
  const heard = {} as Record<Who, Received>;
  const page = (who: Who) => desks[who].page;

  beforeAll(async () => {
    running = await startApp();
    browser = await openChromium();
    for (const who of everybody) {
      people[who] = await makePerson(running, roles[who], { name: `Dr ${who} Example` });
      desks[who] = await openDesk(browser, running.url);
      heard[who] = eavesdrop(page(who));
    }
  });
  afterAll(async () => {
    await browser.close();
    await running.close();
  });

  /** With SCREENSHOTS set to a folder, every desk is photographed after each chapter, to be looked at. */
  afterEach(async ({ task }) => {
    const folder = process.env['SCREENSHOTS'];
    if (folder === undefined) return;
    const chapter = task.name.replace(/[^a-z]+/gi, '-').slice(0, 40);
    for (const who of everybody)
      await page(who).screenshot({ path: path.join(folder, `${chapter}-${who}.png`) });
  });

  it('all sign in', async () => {
    await page('chair').goto('/');
    await expectAccessible(page('chair'));
    for (const who of everybody) await signIn(page(who), people[who]);
    await expectAccessible(page('first'));
  });

  it('the referrer opens, fills and submits the case', async () => {
    caseId = await refer(page('referrer'), await smallPdf());
    await expectAccessible(page('referrer'));
  });

  it('the referrer reads the uploaded report in the page', async () => {
    await page('referrer').goto(`/cases/${caseId}/reports`);
    await page('referrer')
      .getByRole('button', { name: /Ultrasound\.pdf/ })
      .or(page('referrer').getByRole('link', { name: /Ultrasound\.pdf/ }))
      .first()
      .click();
    await page('referrer').locator('canvas').first().waitFor();
    await expectAccessible(page('referrer'));
  });

  it('the chair accepts it, and the contributors get letters with a number and a link only', async () => {
    await page('chair').goto('/cases');
    await page('chair').getByText(question).first().waitFor();
    await expectAccessible(page('chair'));
    await accept(page('chair'), caseId, [people.first.name, people.second.name], people.liaison.name);
    await running.outbox.flush();
    const letters = await mailbox().messages();
    for (const who of ['first', 'second'] as const) {
      const letter = letters.find(
        (one) => one.to.includes(people[who].email) && /\d\d-\d{4}/.test(one.subject),
      );
      expect(letter?.text).toContain('/cases/');
      expect(letter?.text).not.toMatch(/fever|wrists|\b47\b/i);
    }
  });

  it('candidates and findings are laid out', async () => {
    await addCandidates(page('chair'), ['Inflammatory fever', 'Lymphoma']);
    await page('first').goto(`/cases/${caseId}/differential`);
    await addFinding(page('first'), { title: rows[0] ?? '', kind: 'Symptom', known: 'Present' });
    await addFinding(page('first'), { title: rows[1] ?? '', kind: 'Sign on examination', known: 'Present' });
    await addFinding(page('first'), { title: rows[2] ?? '', kind: 'Sign on examination', known: 'Absent' });
    await expectAccessible(page('first'));
    // The chair's page has them without a reload.
    await page('chair')
      .locator('.ledger')
      .getByText(rows[2] ?? '')
      .waitFor();
  });

  it('the first specialist judges in the sealed round and hands in', async () => {
    await openRound(page('chair'), 'Sealed');
    for (const who of everybody) heard[who].clear();
    for (const who of ['referrer', 'second', 'chair'] as const)
      await page(who).goto(`/cases/${caseId}/differential`);
    await givePrior(page('first'), caseId, secret.prior);
    await judgeRow(page('first'), rows[0] ?? '', 'Often', secret.fever);
    await judgeRow(page('first'), rows[1] ?? '', 'Sometimes', secret.node);
    await expectAccessible(page('first'));
    firstDigest = await handIn(page('first'));
    expect(firstDigest).toMatch(/^[0-9a-f]{64}$/);
  });

  it('the sealed round leaks nothing to the other four', async () => {
    await page('chair').getByText('1 of 2').first().waitFor();
    const numbers = Object.values(secret).flat().map(formsOf);
    for (const who of everybody.filter((one) => one !== 'first')) {
      for (const path of [`/cases/${caseId}/differential`, `/cases/${caseId}/trail`, '/cases', '/']) {
        await page(who).goto(path);
        await page(who).waitForLoadState('networkidle');
        const shown = await page(who).locator('body').innerText();
        for (const number of numbers) expect(shown, `${who} at ${path}`).not.toMatch(number);
      }
      const received = (await heard[who].texts()).join('\n');
      expect(received.length, who).toBeGreaterThan(0);
      for (const number of numbers) expect(received, who).not.toMatch(number);
      expect(received, who).not.toMatch(/"(standing|pooledPrior|pooledCells)":\s*[[{]/);
    }
    const letters = (await mailbox().messages()).map((letter) => letter.text).join('\n');
    for (const number of numbers) expect(letters).not.toMatch(number);
  });

  it('the second specialist hands in, and the chair unseals', async () => {
    await givePrior(page('second'), caseId, ['25', '55', '20']);
    await judgeRow(page('second'), rows[0] ?? '', 'Sometimes', ['60', '30', '25']);
    await judgeRow(page('second'), rows[1] ?? '', 'Often', ['50', '85', '15']);
    await handIn(page('second'));
    await page('chair').goto(`/cases/${caseId}/differential`);
    await expectAccessible(page('chair'));
    await unseal(page('chair'));
    await page('second').locator('.ledger-standing .standing-big').first().waitFor();
    const shown = await standingShown(page('second'));
    expect(shown).toHaveLength(3);
    await expectAccessible(page('second'));
  });

  it('the seals are verified in the browser', async () => {
    await page('second').goto(`/cases/${caseId}/differential`);
    await page('second').getByRole('button', { name: /seal/i }).first().click();
    await page('second').getByRole('button', { name: 'Verify 2 seals now' }).click();
    await page('second').getByText('2 seals hold.').waitFor();
    await page('second').getByText(firstDigest.slice(0, 8)).first().waitFor();
  });

  it('in the live round the standing moves in the second window after a save in the first, without reload', async () => {
    await openRound(page('chair'), 'Live');
    await page('second').keyboard.press('Escape');
    await page('first').goto(`/cases/${caseId}/differential`);
    const before = await standingShown(page('second'));
    await page('second').evaluate(() => {
      document.body.dataset['sameDocument'] = 'yes';
    });
    await judgeRow(page('first'), rows[1] ?? '', 'Often', ['95', '5', '20']);
    await page('second').waitForFunction(
      (old) => {
        const now = [...document.querySelectorAll('.ledger-standing .standing-big')].map(
          (cell) => cell.textContent,
        );
        return now.length === old.length && now.some((text, index) => text !== old[index]);
      },
      before,
      { timeout: 10_000 },
    );
    expect(await page('second').evaluate(() => document.body.dataset['sameDocument'])).toBe('yes');
    await handIn(page('first'));
  });

  it('the chair closes the case with a plan that the contributors have answered', async () => {
    await writePlan(page('chair'), caseId, people.referrer.name);
    await expectAccessible(page('chair'));
    await agree(page('first'), caseId);
    await dissent(page('second'), caseId, 'I keep lymphoma first.');
    await expectAccessible(page('second'));
    await conclude(page('chair'), caseId);
    await page('chair').getByText('I keep lymphoma first.').first().waitFor();
    await expectAccessible(page('chair'));
  });

  it('the liaison writes, the chair approves, and the patient is told', async () => {
    heard.liaison.clear();
    await writeSummary(page('liaison'), caseId, 'We will call you on Friday.');
    await expectAccessible(page('liaison'));
    await approveSummary(page('chair'), caseId);
    await expectAccessible(page('chair'));
    await tell(page('liaison'), caseId);
    await expectAccessible(page('liaison'));
    const received = (await heard.liaison.texts()).join('\n');
    expect(received).toContain(safetyNet);
    for (const word of [question, 'Lymph nodes up to 2 cm', 'I keep lymphoma first', 'standing']) {
      expect(received).not.toContain(word);
    }
  });

  it('the trail tells who did what, and no page complained', async () => {
    await page('chair').goto(`/cases/${caseId}/trail`);
    await page('chair')
      .getByText(/signed plan 1/)
      .first()
      .waitFor();
    await expectAccessible(page('chair'));
    expect(everybody.flatMap((who) => desks[who].complaints)).toEqual([]);
  });
});

async function smallPdf(): Promise<Buffer> {
  const folder = await mkdtemp(path.join(tmpdir(), 'weighhouse-pdf-'));
  const file = path.join(folder, 'report.pdf');
  const report = {
    key: '',
    title: 'Ultrasound of the abdomen',
    centre: '',
    on: '',
    text: 'FINDINGS: Spleen 14 cm.',
  };
  await writeReportPdf(file, report, { centre: 'Test Hospital', day: '2026-11-02', network: 'Tests' });
  const content = await readFile(file);
  await rm(folder, { recursive: true });
  return content;
}
