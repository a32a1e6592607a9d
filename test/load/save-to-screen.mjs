// Measures how long a saved judgement takes to move the standing on somebody else's screen.
// Usage: node test/load/save-to-screen.mjs http://localhost:4180 [saves]   (a running demo, loopback only)
import { chromium } from 'playwright-core';

const [base = 'http://localhost:4180', saves = '50'] = process.argv.slice(2);
if (!['localhost', '127.0.0.1'].includes(new URL(base).hostname))
  throw new Error('Only a server on this machine.');
const times = Math.min(200, Number(saves));

const browser = await chromium.launch({
  executablePath: process.env['CHROMIUM'] ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking', '--no-first-run'],
});

/** @param {string} id */
async function signedIn(id) {
  const context = await browser.newContext({
    baseURL: base,
    reducedMotion: 'reduce',
    viewport: { width: 1440, height: 900 },
  });
  const data = { email: `${id}@lantern.example`, password: 'lantern-coast-demo' };
  const answer = await context.request.post('/api/session', { data });
  if (!answer.ok()) throw new Error(`${id} cannot sign in: ${String(answer.status())}`);
  return context;
}

const writer = await signedIn('sp-rheum');
const reader = await signedIn('sp-id');
const { items } = await (await writer.request.get('/api/cases?sort=number')).json();
const { id } = items.find(
  (/** @type {{ round: { kind: string } | null }} */ one) => one.round?.kind === 'live',
);
const ledger = await (await writer.request.get(`/api/cases/${id}/differential`)).json();
const finding = ledger.findings.find((/** @type {{ observed: number | null }} */ one) => one.observed === 1);
const others = ledger.candidates.map(() => 30);

const page = await reader.newPage();
await page.goto(`/cases/${id}/differential`);
await page.locator('.ledger-standing .standing-big').first().waitFor();
await page.evaluate(() => {
  const row = document.querySelector('.ledger-standing');
  const read = () =>
    [...document.querySelectorAll('.ledger-standing .standing-big')].map((cell) => cell.textContent).join();
  let known = read();
  if (!row) return;
  Object.assign(window, { movedAt: 0 });
  new MutationObserver(() => {
    const now = read();
    if (now === known) return;
    known = now;
    Object.assign(window, { movedAt: Date.now() });
  }).observe(row, { subtree: true, childList: true, characterData: true });
});

const took = [];
for (let index = 0; index < times; index += 1) {
  const outOf100 = [index % 2 === 0 ? 95 : 5, ...others];
  const began = Date.now();
  const saved = await writer.request.put(`/api/cases/${id}/judgement/findings/${finding.id}`, {
    data: { candidateSet: ledger.candidateSet, exposure: 'often', outOf100 },
  });
  if (!saved.ok()) throw new Error(await saved.text());
  await page.waitForFunction((since) => Reflect.get(window, 'movedAt') >= since, began, {
    timeout: 10_000,
    polling: 5,
  });
  took.push((await page.evaluate(() => Reflect.get(window, 'movedAt'))) - began);
}
await browser.close();
took.sort((a, b) => a - b);
const at = (/** @type {number} */ share) => took[Math.min(took.length - 1, Math.floor(took.length * share))];
process.stdout.write(`${JSON.stringify({ saves: took.length, medianMs: at(0.5), p95Ms: at(0.95) })}\n`);
