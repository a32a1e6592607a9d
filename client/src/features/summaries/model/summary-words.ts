import type { Summary, TellList } from '@weighhouse/shared/contracts/summaries';
import { capital, counted, numberWord } from '../../../lib/words';

type State = Summary['state'];

/** What is so with the summary, as a title. */
export function summaryTitle({ state, planNumber, returnedWords }: Summary): string {
  if (planNumber === null) return 'Nothing to tell yet';
  const titles: Record<State, string> = {
    none: 'The summary is not written yet',
    draft:
      returnedWords === null ? 'The summary is being written' : 'The chair asks for changes to the summary',
    waiting: 'The summary waits for the chair',
    approved: 'The summary is approved and ready to tell',
    told: 'The patient has been told',
  };
  return titles[state];
}

type Item = TellList['items'][number];
export type TellGroup = 'ready' | 'write' | 'chair' | 'later' | 'told';

/** What a case waits for, ready to tell first. */
export function groupOf({ state, hasPlan }: Item): TellGroup {
  if (state === 'told') return 'told';
  if (state === 'approved') return 'ready';
  if (state === 'waiting') return 'chair';
  return hasPlan ? 'write' : 'later';
}

export const tellGroups: readonly { group: TellGroup; title: string; note: string }[] = [
  { group: 'ready', title: 'Ready to tell', note: 'approved by the chair' },
  { group: 'write', title: 'To be written', note: 'the plan is signed' },
  { group: 'chair', title: 'Waits for the chair', note: 'handed in for approval' },
  { group: 'later', title: 'No plan yet', note: 'the panel is still judging' },
  { group: 'told', title: 'Told', note: '' },
];

/** "Two patients can be told". */
export function tellTitle(items: readonly Item[]): string {
  const of = (group: TellGroup) => items.filter((item) => groupOf(item) === group).length;
  const [ready, write] = [of('ready'), of('write')];
  if (ready > 0) return `${capital(numberWord(ready))} ${ready === 1 ? 'patient' : 'patients'} can be told`;
  if (write > 0) return `${capital(numberWord(write))} ${write === 1 ? 'summary' : 'summaries'} to write`;
  return 'Nobody waits to be told';
}

export const attemptsWords = (attempts: number) =>
  attempts === 0 ? 'No contact yet' : counted(attempts, 'contact');

/** The paragraphs of a text: parted by empty lines. */
export function paragraphsOf(body: string): string[] {
  return body
    .split(/\n\s*\n/)
    .map((paragraph) => paragraph.trim())
    .filter((paragraph) => paragraph !== '');
}

/** "164 words in 17 sentences": short ones are easier to follow. */
export function lengthWords(body: string): string {
  const words = body.split(/\s+/).filter((word) => word !== '').length;
  const sentences = body.split(/[.!?]+(?:\s|$)/).filter((sentence) => sentence.trim() !== '').length;
  return `${counted(words, 'word')} in ${counted(sentences, 'sentence')}`;
}

export const howWords: Record<string, string> = {
  meeting: 'In a meeting',
  telephone: 'By telephone',
  video: 'By video',
  letter: 'By letter',
};
export const understoodWords = {
  yes: 'Understood',
  partly: 'Understood in part',
  no: 'Not understood',
} as const;
