import { inject } from 'vitest';
import { openMailFolder } from '../fakes/mail-folder.mjs';

/** What the mail fake has received: `messages()`, `waitFor(predicate)`, `clear()`. */
export function mailbox(): Pick<ReturnType<typeof openMailFolder>, 'messages' | 'waitFor' | 'clear'> {
  return openMailFolder(inject('mail').directory);
}
