// @ts-check
// Measures what one live change costs the browser of somebody who has the ledger open: 12 candidates, 40 rows, 12
// contributors. Milliseconds of the page's main thread for each change: scripting, and all its tasks together.
// Usage: node test/load/live-change-scripting.mjs http://localhost:4180 [changes] [--still]
// (a running demo, loopback only; --still: under reduced motion)
import { chromium } from 'playwright-core';
import { makeBigCase } from './big-case.mjs';

const [base = 'http://localhost:4180', count = '30', still] = process.argv.slice(2);
if (!['localhost', '127.0.0.1'].includes(new URL(base).hostname))
  throw new Error('Only a server on this machine.');
const changes = Math.min(200, Number(count));

const big = await makeBigCase(base, { candidates: 12, findings: 40, pending: 10, contributors: 12 });
const [writer] = big.people;
if (!writer) throw new Error('nobody judges');

const browser = await chromium.launch({
  executablePath: process.env['CHROMIUM'] ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking', '--no-first-run'],
});
const context = await browser.newContext({
  baseURL: base,
  viewport: { width: 1440, height: 900 },
  reducedMotion: still === '--still' ? 'reduce' : 'no-preference',
});
await context.request.post('/api/session', {
  data: { email: 'sp-id@lantern.example', password: 'lantern-coast-demo' },
  headers: { origin: base },
});
const page = await context.newPage();
await page.goto(`/cases/${big.id}/differential`);
await page.locator('.ledger-standing .standing-big').first().waitFor();
await page.waitForLoadState('networkidle');
const devtools = await context.newCDPSession(page);
// Processor time of the page's thread, so that a busy machine does not count.
await devtools.send('Performance.enable', { timeDomain: 'threadTicks' });

const asked = ['ScriptDuration', 'TaskDuration'];
async function spent() {
  const { metrics } = await devtools.send('Performance.getMetrics');
  return asked.map((name) => (metrics.find((one) => one.name === name)?.value ?? 0) * 1000);
}

const ledger = await writer.client.get(`/api/cases/${big.id}/differential`);
const rows = ledger.findings.filter(
  (/** @type {{ observed: number | null, levelLabels: string[] }} */ one) =>
    one.observed !== null && one.levelLabels.length === 2,
);
/** @type {number[][]} */
const took = [];
// Two more at the beginning, so that what is made ready once is not counted.
for (let index = -2; index < changes; index += 1) {
  const before = await spent();
  const finding = rows[(index + 2) % rows.length];
  const outOf100 = ledger.candidates
    .concat('none')
    .map(
      (/** @type {unknown} */ _, /** @type {number} */ column) => ((index + 2) * 17 + column * 29) % 98 || 50,
    );
  const answered = page.waitForResponse((answer) => answer.url().endsWith(`/${big.id}/differential`));
  await writer.client.send('PUT', `/api/cases/${big.id}/judgement/findings/${finding.id}`, {
    candidateSet: ledger.candidateSet,
    exposure: 'often',
    outOf100,
  });
  await answered;
  // Until every number has moved and nothing more is drawn.
  await page.waitForTimeout(900);
  const after = await spent();
  if (index >= 0) took.push(after.map((value, place) => value - (before[place] ?? 0)));
}
await browser.close();

/** @param {number} place */
const summary = (place) => {
  const sorted = took.map((one) => one[place] ?? 0).sort((one, other) => one - other);
  const at = (/** @type {number} */ share) =>
    Number((sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? 0).toFixed(1));
  return { medianMs: at(0.5), p95Ms: at(0.95) };
};
process.stdout.write(
  `${JSON.stringify({
    case: big.number,
    changes: took.length,
    reducedMotion: still === '--still',
    scripting: summary(0),
    allTasks: summary(1),
  })}\n`,
);
