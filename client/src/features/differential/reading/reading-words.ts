import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import type { Assumption } from './wish';

/** The assumption of a share of patients with two or more of the candidates. */
export const assumptionOf = (coexistence: number): Assumption =>
  coexistence > 0 ? 'may coexist' : 'one cause';

/** An assumption in plain words: "one cause: only one of these can be there". */
export function assumptionWords(coexistence: number): string {
  if (coexistence === 0) return 'one cause, so that the candidates exclude each other';
  const { words } = naturalFrequency(coexistence);
  return `candidates that may coexist, with two or more of these in ${words} patients like this`;
}

/**
 * What is on the screen when it is not the panel's own reading, and what the panel's own is.
 * @param coexistence the share on the screen
 * @param panels the share that the case has
 * @param trial whether something else is tried besides
 */
export function readingSentences(coexistence: number, panels: number, trial: boolean): string[] {
  const sentences: string[] = [];
  if (coexistence !== panels || !trial) {
    sentences.push(`Read as ${assumptionWords(coexistence)}.`);
    sentences.push(
      panels > 0 && coexistence > 0
        ? `The case says ${naturalFrequency(panels).words}.`
        : `The panel reads the same numbers as ${assumptionOf(panels)}.`,
    );
    if (panels === 0 && coexistence === 0.05)
      sentences.push('5 of 100 is taken because the chair has set no share.');
  }
  return sentences;
}
