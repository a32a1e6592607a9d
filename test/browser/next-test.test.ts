import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type JudgedCase, readDifferential } from '../factories/judgements.js';
import { openPendingCase, pendingCase } from '../factories/pending-case.js';
import { type TestPerson, testPassword } from '../factories/people.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { type Desk, expectAccessible, expectNoSidewaysScroll, openChromium, openDesk } from './chromium.js';

let running: RunningApp;
let browser: Browser;
let case_: JudgedCase & { round: Round };
const desks: Desk[] = [];

/** Somebody at a computer, signed in. */
async function seatAt(person: TestPerson, width = 1440): Promise<Page> {
  const desk = await openDesk(browser, running.url, width);
  desks.push(desk);
  const data = { email: person.email, password: testPassword };
  const answer = await desk.context.request.post('/api/session', { data });
  expect(answer.status()).toBe(200);
  return desk.page;
}
const at = (section: string) => `/cases/${case_.id}/${section}`;
const contributor = (index: number) => {
  const person = case_.contributors[index];
  if (!person) throw new Error('there are two contributors');
  return person;
};

beforeAll(async () => {
  running = await startApp();
  browser = await openChromium();
  case_ = await pendingCase(running);
});
afterAll(async () => {
  expect(desks.flatMap((desk) => desk.complaints)).toEqual([]);
  await browser.close();
  await running.close();
});

describe('the next test', () => {
  let page: Page;

  it('is worked out for nobody while the first round is sealed', async () => {
    page = await seatAt(contributor(0));
    await page.goto(at('next-test'));
    await page.getByText('The round is sealed, so no test is ranked').waitFor();
    await page.getByText('3 findings are not known yet').waitFor();
    expect(await page.getByText(/bits|settles/).count()).toBe(0);
    await expectAccessible(page);
  });

  it('ranks the pending findings by the server’s numbers once the round is unsealed', async () => {
    await openPendingCase(case_);
    await page.getByRole('heading', { name: 'Node biopsy would settle most' }).waitFor();
    const { assessment } = await readDifferential(case_, contributor(0));
    const [biopsy, serology] = assessment?.nextTests ?? [];
    expect(biopsy?.finding).toBe(case_.findings[2]?.id);
    const first = page.locator('.test').first();
    await first
      .getByText(`In ${naturalFrequency(biopsy?.leaderChanges ?? 0).words} the first place would go`)
      .waitFor();
    for (const [index, { p, standing }] of (biopsy?.levels ?? []).entries()) {
      const cells = first.locator('.results tbody tr').nth(index).locator('td');
      expect(await cells.nth(0).innerText()).toBe(naturalFrequency(p).words);
      expect(await cells.nth(1).innerText()).toContain(String(naturalFrequency(standing[0] ?? 0).outOf100));
    }
    expect(serology?.leaderChanges).toBe(0);
    const second = page.locator('.test').nth(1);
    await second.getByText('Whatever it shows, the standing hardly moves.').waitFor();
    await page.getByRole('heading', { name: '1 test waits for a judgement' }).waitFor();
    await expectAccessible(page);
  });

  it('shows wait or cost, by keyboard, and the same as a table', async () => {
    const drawing = page.getByRole('img', { name: /^Bits settled against/ });
    expect(await drawing.getAttribute('aria-label')).toContain('days until the result');
    await page.getByRole('radio', { name: 'Wait' }).focus();
    await page.keyboard.press('ArrowRight');
    await page.getByRole('img', { name: /against cost/ }).waitFor();
    const row = page.getByRole('row', { name: /Node biopsy/ });
    expect(await row.innerText()).toMatch(/settles most[\s\S]*900[\s\S]*5 days[\s\S]*some/);
  });

  it('lets what a test takes be corrected where it is compared', async () => {
    await page.getByRole('button', { name: 'Change cost, wait or burden of Node biopsy' }).click();
    const dialog = page.getByRole('dialog');
    await dialog.getByLabel('How far the report can be trusted').selectOption('firm');
    await dialog.getByRole('textbox', { name: 'Cost' }).fill('450');
    await dialog.getByRole('button', { name: /^Save/ }).click();
    await dialog.waitFor({ state: 'detached' });
    await page.getByText('Cost 450. Wait 5 days. Burden some.').waitFor();
  });

  it('leads to the row that nobody judged', async () => {
    await page.getByRole('link', { name: 'Judge it' }).click();
    await page.getByRole('heading', { level: 2, name: 'PET-CT' }).waitFor();
  });

  it('reads on every width', async () => {
    for (const width of [768, 320]) {
      await page.setViewportSize({ width, height: 800 });
      await page.goto(at('next-test'));
      await page.getByRole('heading', { name: 'Node biopsy would settle most' }).waitFor();
      await expectNoSidewaysScroll(page);
      await expectAccessible(page);
    }
  });
});

describe('what to discuss first', () => {
  let chair: Page;
  let other: Page;
  const line = () => chair.locator('.discuss-list li').filter({ hasText: 'Fever every evening' });

  it('begins with the row on which most depends, and says who is apart', async () => {
    chair = await seatAt(case_.chair);
    await chair.goto(at('differential'));
    await chair.getByRole('button', { name: 'Discuss first' }).click();
    await chair.getByText('The agenda is empty').waitFor();
    const names = case_.contributors.map(({ name }) => name);
    await line()
      .getByText(`${names[0] ?? ''}: 30, ${names[1] ?? ''}: 70 of 100 would show this, on A Illness 1.`)
      .waitFor();
    await expectAccessible(chair);
  });

  it('is put on the agenda by the chair, and marks the row on everybody’s ledger without a reload', async () => {
    other = await seatAt(contributor(1));
    await other.goto(at('differential'));
    await other.locator('.ledger').waitFor();
    await line()
      .getByRole('button', { name: /Put on the agenda/ })
      .click();
    await chair.getByRole('button', { name: 'Put on the agenda', exact: true }).click();
    await chair.getByText('must say in words what to discuss').first().waitFor();
    await chair.getByLabel('What to discuss').fill('Was it measured?');
    await chair.getByRole('button', { name: 'Put on the agenda', exact: true }).click();
    await chair.locator('.discuss-note').getByText('Was it measured?').waitFor();
    await other.locator('.ledger-row', { hasText: 'Fever' }).getByText('Discuss first.').waitFor();
    expect(await other.getByRole('button', { name: /Take off/ }).count()).toBe(0);
  });

  it('shows both notes where the chair wrote at two computers', async () => {
    await line()
      .getByRole('button', { name: /Change the note/ })
      .click();
    await chair.getByLabel('What to discuss').fill('By whom was it measured?');
    await case_.chair.agent
      .put(`/api/cases/${case_.id}/agenda/${case_.findings[0]?.id ?? ''}`)
      .send({ note: 'With which thermometer?' })
      .expect(200);
    await chair.getByRole('button', { name: 'Save the note' }).click();
    await chair.getByText('Saved meanwhile').waitFor();
    expect(await chair.locator('.both-texts').innerText()).toContain('With which thermometer?');
    await chair.getByRole('button', { name: 'Keep mine' }).click();
    await chair.locator('.discuss-note').getByText('By whom was it measured?').waitFor();
  });

  it('names nobody to the referrer', async () => {
    const referrer = await seatAt(case_.referrer, 320);
    await referrer.goto(at('differential'));
    await referrer.getByRole('button', { name: 'Discuss first' }).click();
    const panel = referrer.locator('.discuss');
    await panel.getByText('By whom was it measured?').waitFor();
    const words = await panel.innerText();
    for (const { name } of case_.contributors) expect(words).not.toContain(name);
    await expectNoSidewaysScroll(referrer);
    await expectAccessible(referrer);
  });

  it('leaves the agenda after a question', async () => {
    await line()
      .getByRole('button', { name: /Take off/ })
      .click();
    await chair.getByRole('button', { name: 'Take it off' }).click();
    await chair.getByText('The agenda is empty').waitFor();
    expect((await readDifferential(case_, case_.chair)).agenda).toEqual([]);
  });
});

describe('many columns', () => {
  const heads = (page: Page) => page.locator('.ledger thead .ledger-letter').allInnerTexts();

  it('are pinned and folded by keyboard, remembered, and nobody else’s', async () => {
    const page = await seatAt(contributor(1), 1280);
    await page.goto(at('differential'));
    const cell = page.locator('.ledger td[data-row="1"][data-column="4"]');
    await cell.focus();
    await page.keyboard.press('m');
    await page.getByRole('menuitem', { name: 'Pin at the left' }).focus();
    await page.keyboard.press('Enter');
    await expect.poll(() => heads(page)).toEqual(['D', 'A', 'B', 'C', 'E', 'F', 'G', 'H', 'I', 'J', '—']);
    await page.getByRole('button', { name: 'Columns' }).click();
    const { assessment } = await readDifferential(case_, contributor(1));
    const small = (assessment as NonNullable<Differential['assessment']>).standing
      .slice(0, -1)
      .filter((share, index) => share < 0.02 && index !== 3).length;
    expect(small).toBeGreaterThan(2);
    await page.getByRole('button', { name: `Fold ${String(small)} columns below 2 of 100` }).click();
    expect(await page.locator('.ledger thead .ledger-folded').count()).toBe(small);
    await expectAccessible(page);
    await page.reload();
    await expect.poll(() => page.locator('.ledger thead .ledger-folded').count()).toBe(small);
    expect((await heads(page)).at(0)).toBe('D');
    expect((await heads(page)).at(-1)).toBe('—');
    await expectNoSidewaysScroll(page);

    const neighbour = await seatAt(contributor(0), 1280);
    await neighbour.goto(at('differential'));
    await neighbour.locator('.ledger').waitFor();
    expect((await heads(neighbour)).at(0)).toBe('A');
  });

  it('are few on a phone, with the rest to be asked for', async () => {
    const page = await seatAt(contributor(0), 320);
    await page.goto(at('differential'));
    const lines = page.locator('.card .cell-list li');
    await page.getByRole('button', { name: /^and \d others under 2 of 100$/ }).click();
    await expect.poll(() => lines.count()).toBe(11);
    await expectNoSidewaysScroll(page);
    await expectAccessible(page);
  });
});

describe('a finding of four levels', () => {
  it('is made, judged with all levels at once, and shown on a phone', async () => {
    const page = await seatAt(contributor(0));
    await page.goto(at('differential'));
    await page.getByRole('button', { name: 'Add a finding' }).click();
    await page.getByLabel('Finding', { exact: true }).fill('Ferritin');
    await page.getByLabel('Where it comes from').selectOption({ label: 'Laboratory' });
    await page.getByLabel('How far the report can be trusted').selectOption('firm');
    await page.getByRole('button', { name: 'It has more than two levels' }).click();
    await page.getByRole('button', { name: 'One more level' }).click();
    for (const [index, label] of ['normal', 'raised', 'high', 'above five times'].entries())
      await page.getByRole('textbox', { name: `Level ${String(index + 1)}` }).fill(label);
    await page.getByRole('radio', { name: 'High' }).check();
    await page.getByRole('button', { name: 'Add finding' }).click();
    await page.getByRole('heading', { level: 2, name: 'Ferritin' }).waitFor();

    await page.locator('.exposure').getByText('Often', { exact: true }).click();
    const fields = page.getByRole('textbox', { name: /^If it were A Illness 1, how many of 100 would have/ });
    for (const [index, share] of ['10', '20', '30'].entries()) await fields.nth(index).fill(share);
    await page.getByText('40 of 100 left, 1 share still blank').waitFor();
    await page.getByRole('button', { name: 'Save judgement' }).click();
    await page.getByText(/all levels together must be 100/).waitFor();
    await fields.nth(3).fill('40');
    await page.getByText('All 100 are given').waitFor();
    await page.getByRole('button', { name: 'Save judgement' }).click();
    await page.getByText('What stands here is saved.').waitFor();
    await expectAccessible(page);

    const row = page.locator('.ledger-row', { hasText: 'Ferritin' });
    expect(await row.locator('.ledger-line').innerText()).toMatch(/^High/);
    expect(await row.locator('.ledger-figure').first().innerText()).toBe('30');
    await page.setViewportSize({ width: 320, height: 700 });
    await page.goto(at('differential'));
    for (let step = 0; step < 3; step += 1)
      await page.getByRole('button', { name: 'Next', exact: true }).click();
    await page.getByRole('heading', { level: 2, name: 'Ferritin' }).waitFor();
    await expectNoSidewaysScroll(page);
  });
});
