import { Injectable, Logger } from '@nestjs/common';
import { EventEmitter2 } from '@nestjs/event-emitter';
import { DataSource, type EntityManager } from 'typeorm';

/** One transaction with what shall be heard once it is committed. */
export interface Work {
  em: EntityManager;
  /** Emits after commit, in order; never when the transaction is rolled back. */
  afterCommit(event: { readonly name: string }): void;
}

const deadlock = 1213;
const attempts = 4;

/** Transactions of the request handlers. A deadlock is tried again from the start, a few times. */
@Injectable()
export class UnitOfWork {
  private readonly logger = new Logger(UnitOfWork.name);

  constructor(
    private readonly source: DataSource,
    private readonly events: EventEmitter2,
  ) {}

  async run<T>(task: (work: Work) => Promise<T>): Promise<T> {
    for (let attempt = 1; ; attempt += 1) {
      const heard: { readonly name: string }[] = [];
      try {
        const result = await this.source.transaction('READ COMMITTED', (em) =>
          task({ em, afterCommit: (event) => heard.push(event) }),
        );
        for (const event of heard) this.announce(event);
        return result;
      } catch (error) {
        if (attempt >= attempts || !isDeadlock(error)) throw error;
        this.logger.warn(`deadlock, attempt ${String(attempt)}`);
      }
    }
  }

  /** What listeners do wrong must not look like a failed save: it is committed. */
  private announce(event: { readonly name: string }): void {
    this.events.emitAsync(event.name, event).catch((error: unknown) => {
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    });
  }
}

function isDeadlock(error: unknown): boolean {
  return typeof error === 'object' && error !== null && 'errno' in error && error.errno === deadlock;
}
