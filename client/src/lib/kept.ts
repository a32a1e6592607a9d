/**
 * Text that the server has not acknowledged yet, kept in this browser so that a closed tab loses nothing. It can be
 * clinical text: it is removed as soon as the server has it, and all of it at signing out.
 */
const prefix = 'weighhouse.kept.';
/** What one tab remembers of how somebody reads a case; a trial in it holds their own numbers. */
const readingPrefix = 'weighhouse.reading.';
const ownerKey = 'weighhouse.keptFor';

export function keep(key: string, value: unknown): void {
  try {
    localStorage.setItem(prefix + key, JSON.stringify(value));
  } catch {
    // A full or forbidden storage must not stop the typing; the text is still on the page.
  }
}

export function kept(key: string): unknown {
  try {
    const text = localStorage.getItem(prefix + key);
    return text === null ? null : (JSON.parse(text) as unknown);
  } catch {
    return null;
  }
}

export function forget(key: string): void {
  localStorage.removeItem(prefix + key);
}

export function forgetAll(): void {
  removeFrom(localStorage, prefix);
  removeFrom(sessionStorage, readingPrefix);
}

/**
 * Says who is signed in from now on. Computers on a ward are shared, and sessions end by time without anybody signing
 * out: what somebody else left is removed before it can stand in this person's forms.
 */
export function keepFor(personId: string): void {
  try {
    const before = localStorage.getItem(ownerKey);
    if (before !== null && before !== personId) forgetAll();
    localStorage.setItem(ownerKey, personId);
  } catch {
    // Where nothing can be kept, nobody left anything.
  }
}

function removeFrom(storage: Storage, start: string): void {
  for (const key of Object.keys(storage)) if (key.startsWith(start)) storage.removeItem(key);
}
