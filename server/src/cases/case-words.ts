import type { WordedMove } from '@weighhouse/shared/contracts/cases';
import type { CaseFile } from './case-file.entity.js';

/** The columns that keep the words of a move; without words those of the move before stay. */
export function wordsColumns(
  move: WordedMove,
  words: string | undefined,
  byId: string,
  at: Date,
): Partial<CaseFile> {
  if (words === undefined || words === '') return {};
  return { lastMove: move, lastWords: words, lastWordsById: byId, lastWordsAt: at };
}
