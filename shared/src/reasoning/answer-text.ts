import { type Assessment, type Fault, PanelRefused, assess } from './assess.js';

export interface Answer {
  answer: Assessment | { errors: readonly Fault[] };
  refused: boolean;
}

/**
 * The assessment of a panel given as JSON text, or every fault of it. For text
 * that is not JSON there is one fault, its path empty.
 *
 * @example answerTo('{').answer // { errors: [{ path: '', message: 'is not JSON' }] }
 */
export function answerTo(text: string): Answer {
  let panel: unknown;
  try {
    // Some editors put a byte order mark first; it is not part of the JSON.
    panel = JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch {
    return { answer: { errors: [{ path: '', message: 'is not JSON' }] }, refused: true };
  }
  try {
    return { answer: assess(panel), refused: false };
  } catch (error) {
    if (error instanceof PanelRefused) return { answer: { errors: error.errors }, refused: true };
    throw error;
  }
}
