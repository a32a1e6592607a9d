import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

describe('the outbox', () => {
  let running: RunningApp;
  beforeAll(async () => {
    running = await startApp();
  });
  afterAll(() => running.close());

  it('sends everything that waits in one run, each letter once, in the order of writing', async () => {
    const box = mailbox();
    box.clear();
    const { source, outbox } = running;
    const subjects = Array.from({ length: 47 }, (_, index) => `letter ${String(index + 1)}`);
    for (const subject of subjects)
      await outbox.put(source.manager, { to: 'a@tests.example', subject, body: 'Sign in to see it.' });
    await outbox.flush();
    await outbox.flush();
    expect((await box.messages()).map(({ subject }) => subject)).toEqual(subjects);
  });
});
