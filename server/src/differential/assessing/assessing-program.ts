import { parentPort } from 'node:worker_threads';
import { PanelRefused } from '@weighhouse/shared/reasoning/assess';
import type { Question, Reply } from './assessing-thread.js';
import { computations } from './computations.js';

/** What a thread for heavy panels runs: one question at a time, answered in the order in which they come. */
parentPort?.on('message', ({ asked, panel }: Question) => {
  parentPort?.postMessage(replyTo(asked, panel));
});

function replyTo(asked: Question['asked'], panel: Question['panel']): Reply {
  try {
    return { answer: computations[asked](panel) };
  } catch (error) {
    if (error instanceof PanelRefused) return { refused: error.errors };
    throw error;
  }
}
