import { AxeBuilder } from '@axe-core/playwright';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';
import { expect } from 'vitest';

const executablePath = process.env['CHROMIUM'] ?? '/usr/bin/chromium';
const quiet = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Debian's Chromium, with nothing of it that calls outside. */
export const openChromium = (): Promise<Browser> => chromium.launch({ executablePath, args: quiet });

/** One person at one computer: a context of their own, and everything their page complained of. */
export interface Desk {
  context: BrowserContext;
  page: Page;
  /** Errors of scripts and of the console; a test ends with none. */
  complaints: string[];
}

export async function openDesk(browser: Browser, baseURL: string, width = 1440): Promise<Desk> {
  const context = await browser.newContext({
    baseURL,
    viewport: { width, height: 900 },
    reducedMotion: 'reduce',
    timezoneId: 'UTC',
    locale: 'en-GB',
  });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    // A refused request is an answer, not a fault of the page.
    if (message.type() === 'error' && !message.text().startsWith('Failed to load resource')) {
      complaints.push(message.text());
    }
  });
  return { context, page, complaints };
}

const rules = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];

/**
 * The page has no fault that axe-core knows.
 * @source Web Content Accessibility Guidelines 2.2, levels A and AA, by the rules of axe-core
 */
export async function expectAccessible(page: Page): Promise<void> {
  // A page that is still loading has no heading yet, and nothing to judge.
  await page.getByRole('heading', { level: 1 }).first().waitFor();
  const { violations } = await new AxeBuilder({ page }).withTags(rules).analyze();
  const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(' | ')}`);
  expect(found, page.url()).toEqual([]);
}

/** Nothing makes the page scroll sideways. */
export async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(over, page.url()).toBeLessThanOrEqual(0);
}
