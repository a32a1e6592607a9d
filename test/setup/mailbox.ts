import { inject } from 'vitest';
import { openMailFolder } from '../fakes/mail-folder.mjs';
import type { RunningApp } from './app.js';

/** What the mail fake has received: `messages()`, `waitFor(predicate)`, `clear()`. */
export function mailbox(): Pick<ReturnType<typeof openMailFolder>, 'messages' | 'waitFor' | 'clear'> {
  return openMailFolder(inject('mail').directory);
}

/** What has arrived once every letter that waits has gone out, also those that the first of them bring about. */
export async function lettersSent(
  running: Pick<RunningApp, 'outbox'>,
  box: Pick<ReturnType<typeof mailbox>, 'messages'>,
) {
  await running.outbox.flush();
  await running.outbox.flush();
  return box.messages();
}
