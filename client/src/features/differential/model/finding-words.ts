import { type Finding, reliabilityWords } from '@weighhouse/shared/contracts/findings';
import { capital } from '../../../lib/words';

/** Two levels are asked for with one number: how many would show the finding. */
export function isTwoLevel(finding: Pick<Finding, 'levelLabels'>): boolean {
  return finding.levelLabels.length <= 2;
}

/** The two levels are absent and present, and go without being named. */
export function isPresence({ levelLabels }: Pick<Finding, 'levelLabels'>): boolean {
  return levelLabels.length === 0 || (levelLabels.length === 2 && levelLabels.join() === 'absent,present');
}

/** What is asked for with one number for each candidate: "would show this", or the second of two levels by its name. */
export function askedWords(finding: Pick<Finding, 'levelLabels'>): string {
  if (!isTwoLevel(finding)) return 'would have each';
  return isPresence(finding) ? 'would show this' : `would have “${levelName(finding, 1)}”`;
}

export function levelCount(finding: Pick<Finding, 'levelLabels'>): number {
  return Math.max(2, finding.levelLabels.length);
}

/** The name of a level as it stands in a sentence: "absent", "present", or the label that was given. */
export function levelName(finding: Pick<Finding, 'levelLabels'>, level: number): string {
  return (
    finding.levelLabels[level] ??
    (level === 0 ? 'absent' : level === 1 ? 'present' : `level ${String(level + 1)}`)
  );
}

/** What is known of a finding, as the line under its title begins. */
export function stateWords(finding: Finding): string {
  if (finding.enteredInError) return 'Entered in error';
  if (finding.observed === null) return 'Not known yet';
  return capital(levelName(finding, finding.observed));
}

export function reliabilityWord(share: number): string {
  const known = Object.entries(reliabilityWords).find(([, value]) => Math.abs(value - share) < 0.005);
  return known ? known[0] : `reliability ${String(Math.round(share * 100))} of 100`;
}

/** Where it comes from: the words, or the report and its page. */
export function sourceWords(finding: Finding): string | null {
  const { source } = finding;
  if (!source) return null;
  if (source.text !== null && source.text !== '') return source.text;
  if (source.fileName === null) return null;
  return source.page === null ? source.fileName : `${source.fileName}, page ${String(source.page)}`;
}

const burdens = ['none', 'little', 'some', 'much'];

/** 0 to 3 in words; between two steps both: "little to some". */
export function burdenWords(burden: number | null): string {
  if (burden === null) return 'not said';
  const low = burdens[Math.floor(burden)] ?? 'much';
  return Number.isInteger(burden) ? low : `${low} to ${burdens[Math.ceil(burden)] ?? 'much'}`;
}

/** What a pending finding would take: money, days, burden; empty where nothing was said. */
export function effortWords(finding: Finding): string[] {
  const words: string[] = [];
  if (finding.cost !== null) words.push(`cost ${finding.cost.toLocaleString('en-GB')}`);
  if (finding.waitDays !== null)
    words.push(`wait ${String(finding.waitDays)} ${finding.waitDays === 1 ? 'day' : 'days'}`);
  if (finding.burden !== null) words.push(`burden ${burdenWords(finding.burden)}`);
  return words;
}

/** The line under a finding's title. `date` shows a calendar day. */
export function findingLine(finding: Finding, date: (day: string) => string): string {
  if (finding.enteredInError) return `Entered in error: ${finding.enteredInError.words}`;
  const from = [sourceWords(finding), finding.observedOn === null ? null : date(finding.observedOn)];
  const parts = [from.filter((part) => part !== null).join(', ')];
  if (finding.observed === null) parts.push(capital(effortWords(finding).join(', ')));
  if (finding.reliability < 0.995) parts.push(capital(reliabilityWord(finding.reliability)));
  return [stateWords(finding), ...parts].filter((part) => part !== '').join('. ');
}
