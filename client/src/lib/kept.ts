/**
 * Text that the server has not acknowledged yet, kept in this browser so that a closed tab loses nothing. It can be
 * clinical text: it is removed as soon as the server has it, and all of it at signing out.
 */
const prefix = 'weighhouse.kept.';

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
  for (const key of Object.keys(localStorage)) if (key.startsWith(prefix)) localStorage.removeItem(key);
}
