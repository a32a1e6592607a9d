import type { Finding } from '@weighhouse/shared/contracts/findings';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { CellView, Figure } from './cells';
import { isPresence, levelName } from './finding-words';

/** What would be seen, as it follows "88 of 100": "would show this", "would not show this", "would have few". */
export function shownWords(finding: Finding, level: number): string {
  if (!isPresence(finding)) return `would have “${levelName(finding, level)}”`;
  return level === 0 ? 'would not show this' : 'would show this';
}

export function figureWords(finding: Finding, figure: Figure): string {
  return `${naturalFrequency(figure.share).words} ${shownWords(finding, figure.level)}`;
}

/** "counts for, 4 decibans" */
export function decibanWords(decibans: number): string {
  const whole = Math.round(Math.abs(decibans));
  if (whole === 0) return 'counts neither way';
  return `counts ${decibans > 0 ? 'for' : 'against'}, ${String(whole)} ${whole === 1 ? 'deciban' : 'decibans'}`;
}

/** A cell as a sentence, for whoever does not see the marks. The row's and the column's names are read before it. */
export function cellSentence(cell: CellView, finding: Finding): string {
  if (finding.enteredInError) return 'Counted nowhere.';
  if (cell.sealed) {
    const own = cell.figure ? `You: ${figureWords(finding, cell.figure)}.` : 'No number of yours.';
    return `${own} The others are sealed.`;
  }
  if (!cell.figure) return 'Not judged yet.';
  const sentences = [`${cell.ownFigure ? 'You: ' : ''}${figureWords(finding, cell.figure)}`];
  if (cell.unjudged === 'cell') sentences.push('Nobody judged this cell');
  if (cell.decibans !== null) sentences.push(`It ${decibanWords(cell.decibans)}`);
  if (cell.own !== null) sentences.push(`Yours ${decibanWords(cell.own)}`);
  if (finding.observed === null) sentences.push('Not known yet');
  return `${sentences.join('. ')}.`;
}
