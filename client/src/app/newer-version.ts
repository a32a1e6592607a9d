/**
 * A page that was open while the product was upgraded asks for code that is gone. Loading the page anew brings the new
 * code; drafts are kept, so it happens by itself, but never twice in a row.
 */
const key = 'weighhouse.reloaded';
/** Milliseconds within which a second failure is not met with another loading. */
const pause = 60_000;

const missing = new WeakSet<object>();

// Vite's own event, for every part of the code that could not be loaded.
window.addEventListener('vite:preloadError', (event) => {
  if (typeof event.payload === 'object') missing.add(event.payload);
});

/** True when the page lacks a part of its code and was not loaded anew just now. */
export function lacksCode(error: unknown): boolean {
  if (typeof error !== 'object' || error === null || !missing.has(error)) return false;
  return Date.now() - Number(sessionStorage.getItem(key) ?? 0) > pause;
}

/** Loads the page anew if the server answers; false when it does not, so that the page can say so. */
export async function loadAnew(): Promise<boolean> {
  const answer = await fetch('/', { cache: 'no-store' }).catch(() => null);
  if (answer?.ok !== true) return false;
  sessionStorage.setItem(key, String(Date.now()));
  location.reload();
  return true;
}
