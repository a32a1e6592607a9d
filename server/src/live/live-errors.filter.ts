import { type ArgumentsHost, Catch, HttpException, Logger } from '@nestjs/common';
import { BaseWsExceptionFilter } from '@nestjs/websockets';
import type { ErrorBody } from '@weighhouse/shared/contracts/errors';
import { Refusal } from '../platform/errors/refusal.js';
import type { LiveSocket } from './live-socket.js';

const failed: ErrorBody = { error: { id: 'failed', message: 'Something went wrong here. Try again.' } };

/**
 * Refusals over a socket have the form that they have over HTTP. They answer the message where it asked for an
 * answer, and are heard as `exception` in any case.
 */
@Catch()
export class LiveErrorsFilter extends BaseWsExceptionFilter {
  private readonly log = new Logger('Live');

  override catch(error: unknown, host: ArgumentsHost): void {
    const body = error instanceof Refusal ? (error.getResponse() as ErrorBody) : failed;
    if (!(error instanceof HttpException))
      this.log.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    host.switchToWs().getClient<LiveSocket>().emit('exception', body);
    for (const part of host.getArgs<unknown[]>()) {
      if (typeof part === 'function') (part as (answer: ErrorBody) => void)(body);
    }
  }
}
