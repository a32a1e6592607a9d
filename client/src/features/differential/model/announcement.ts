import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { Column } from './columns';

/**
 * A change of the standing as a sentence, about the column that moved most: "Still's disease now 61 of 100, was 58".
 * @returns null where no whole number changed, or where the columns are others than before
 */
export function changeSentence(
  before: readonly number[],
  after: readonly number[],
  columns: readonly Column[],
): string | null {
  if (before.length !== after.length || after.length !== columns.length) return null;
  let most: { by: number; sentence: string } | null = null;
  for (const column of columns) {
    const was = before[column.index] ?? 0;
    const now = after[column.index] ?? 0;
    const words = [was, now].map((share) => naturalFrequency(share).outOf100);
    if (words[0] === words[1]) continue;
    const by = Math.abs(now - was);
    if (most && by <= most.by + 1e-9) continue;
    most = { by, sentence: `${column.short} now ${naturalFrequency(now).words}, was ${String(words[0])}` };
  }
  return most?.sentence ?? null;
}

/** Milliseconds between two announcements at least. */
export const announcementPause = 5000;

/**
 * Says the standing's changes at most once in five seconds. A change inside the pause is not lost: at its end, what
 * is said is the change since the last announcement.
 */
export class StandingAnnouncer {
  #said: readonly number[] | null = null;
  #saidAt = Number.NEGATIVE_INFINITY;

  /**
   * @param now milliseconds
   * @returns a sentence to say now, or how long to wait before asking again (null: nothing to say)
   */
  hear(
    standing: readonly number[],
    columns: readonly Column[],
    now: number,
  ): { say: string } | { wait: number } | null {
    if (this.#said?.length !== standing.length) {
      this.#said = standing;
      return null;
    }
    const sentence = changeSentence(this.#said, standing, columns);
    if (sentence === null) return null;
    const wait = this.#saidAt + announcementPause - now;
    if (wait > 0) return { wait };
    this.#said = standing;
    this.#saidAt = now;
    return { say: sentence };
  }
}
