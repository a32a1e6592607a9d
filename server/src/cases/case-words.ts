import type { CaseFile } from './case-file.entity.js';

export type MoveWithWords = 'submitted' | 'returned' | 'accepted' | 'declined' | 'withdrawn' | 'reopened';

/** The columns that keep the words of a move; without words those of the move before stay. */
export function wordsColumns(
  move: MoveWithWords,
  words: string | undefined,
  byId: string,
  at: Date,
): Partial<CaseFile> {
  if (words === undefined || words === '') return {};
  return { lastMove: move, lastWords: words, lastWordsById: byId, lastWordsAt: at };
}
