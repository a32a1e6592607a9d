import type { Worker } from 'node:worker_threads';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { type Fault, PanelRefused } from '@weighhouse/shared/reasoning/assess';
import type { Answers, Asked } from './computations.js';

export interface Question {
  asked: Asked;
  panel: PanelView;
}
export type Reply = { answer: Answers[Asked] } | { refused: readonly Fault[] };

interface Waiting {
  question: Question;
  answer: (value: Answers[Asked]) => void;
  fail: (reason: Error) => void;
}

/**
 * One thread that answers questions one after the other. It is started when it is first needed; one that breaks takes
 * with it the question it was at, and the next question starts another.
 */
export class AssessingThread {
  private worker: Worker | null = null;
  private current: Waiting | null = null;
  private readonly queue: Waiting[] = [];
  private closed = false;

  /** @param start starts a thread that answers every Question with a Reply */
  constructor(private readonly start: () => Worker) {}

  /** @throws PanelRefused; Error when the thread broke or is closed */
  async ask<K extends Asked>(asked: K, panel: PanelView): Promise<Answers[K]> {
    if (this.closed) throw new Error('no panel is assessed any more: the server is closing');
    const value = await new Promise<Answers[Asked]>((answer, fail) => {
      this.queue.push({ question: { asked, panel }, answer, fail });
      this.next();
    });
    return value as Answers[K];
  }

  /** Ends the thread; whoever still waits is told. */
  async close(): Promise<void> {
    this.closed = true;
    const waiting = [...(this.current ? [this.current] : []), ...this.queue.splice(0)];
    this.current = null;
    for (const one of waiting) one.fail(new Error('the server is closing'));
    const { worker } = this;
    this.worker = null;
    await worker?.terminate();
  }

  private next(): void {
    if (this.current || this.closed) return;
    const next = this.queue.shift();
    if (!next) return;
    this.current = next;
    this.worker ??= this.started();
    this.worker.postMessage(next.question);
  }

  private started(): Worker {
    const worker = this.start();
    worker.on('message', (reply: Reply) => {
      const done = this.current;
      this.current = null;
      if ('refused' in reply) done?.fail(new PanelRefused(reply.refused));
      else done?.answer(reply.answer);
      this.next();
    });
    let reason = new Error('the thread that assessed the panel ended');
    worker.on('error', (error) => {
      reason = error instanceof Error ? error : new Error(String(error));
    });
    worker.on('exit', () => {
      if (this.worker !== worker) return;
      this.worker = null;
      const lost = this.current;
      this.current = null;
      lost?.fail(reason);
      this.next();
    });
    // An idle thread keeps no process alive.
    worker.unref();
    return worker;
  }
}
