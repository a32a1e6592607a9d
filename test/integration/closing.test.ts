import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

describe('the end of the server', () => {
  let running: RunningApp;
  const errors = vi.spyOn(console, 'error');
  const written: string[] = [];

  beforeAll(async () => {
    running = await startApp();
    vi.spyOn(process.stdout, 'write').mockImplementation((text) => written.push(String(text)) > 0);
    vi.spyOn(process.stderr, 'write').mockImplementation((text) => written.push(String(text)) > 0);
  });
  afterAll(() => {
    vi.restoreAllMocks();
  });

  it('finishes the letters that are being sent before the database goes, and begins no others', async () => {
    const box = mailbox();
    box.clear();
    const { source, outbox } = running;
    const put = (subject: string) =>
      outbox.put(source.manager, { to: 'a@tests.example', subject, body: 'Sign in to see it.' });
    await put('a letter before the end');
    const sending = outbox.flush();
    await running.close();
    await sending;
    await outbox.flush();
    const sent = await box.messages();
    expect(sent.length).toBeLessThanOrEqual(1);
    expect(source.isInitialized).toBe(false);
    expect(written.join('')).not.toMatch(/Connection|ERROR/);
    expect(errors).not.toHaveBeenCalled();
  });
});
