import type { Page } from 'playwright-core';

/** Everything that reached a browser: the bodies of all answers and what was pushed to it. */
export interface Received {
  texts(): Promise<string[]>;
  clear(): void;
}

const carriesText = /json|text/;

/** Begins to note what reaches this page. */
export function eavesdrop(page: Page): Received {
  let pending: Promise<string>[] = [];
  page.on('response', (response) => {
    const isData = /^\/(api|live)\//.test(new URL(response.url()).pathname);
    if (!isData || !carriesText.test(response.headers()['content-type'] ?? '')) return;
    pending.push(response.text().catch(() => ''));
  });
  page.on('websocket', (socket) => {
    socket.on('framereceived', ({ payload }) => {
      pending.push(Promise.resolve(payload.toString()));
    });
  });
  return {
    texts: () => Promise.all(pending),
    clear: () => {
      pending = [];
    },
  };
}

/** The forms in which a number out of 100 could travel: 37.3, 0.373 and 373. */
export function formsOf(outOf100: string): RegExp {
  const tenths = String(Math.round(Number(outOf100) * 10));
  const share = `0?\\.${tenths.padStart(3, '0')}`;
  const number = `${outOf100.replace('.', '\\.')}|${share}|${tenths}`;
  // Not a part of an identifier, a digest or a time.
  return new RegExp(`(?<![\\w.-])(${number})(?![\\w-])`);
}
