import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { type ErrorBody, type ErrorId } from '@weighhouse/shared/contracts/errors';
import type { Response } from 'express';
import { Refusal, TooMany } from './refusal.js';

const byStatus: Record<number, { id: ErrorId; message: string }> = {
  400: { id: 'malformed', message: 'The request could not be read.' },
  401: { id: 'signed-out', message: 'You are signed out. Sign in to go on.' },
  403: { id: 'forbidden', message: 'This is not open to you.' },
  404: { id: 'not-found', message: 'There is nothing here, or it is not open to you.' },
  413: { id: 'too-large', message: 'The request is larger than what is accepted.' },
  415: { id: 'wrong-type', message: 'This kind of content is not accepted here.' },
  429: { id: 'too-many', message: 'Too many attempts. Wait a minute and try again.' },
  503: { id: 'unavailable', message: 'The service is not ready. Try again in a moment.' },
};

/** Every error leaves in one form; what was not expected is logged and tells the outside nothing. */
@Catch()
export class ErrorFilter implements ExceptionFilter {
  private readonly logger = new Logger('Error');

  catch(error: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const { status, body } = this.describe(error);
    if (response.headersSent) {
      response.destroy();
      return;
    }
    if (error instanceof TooMany) response.setHeader('Retry-After', String(error.retryAfterSeconds));
    response.status(status).json(body);
  }

  private describe(error: unknown): { status: number; body: ErrorBody } {
    if (error instanceof Refusal)
      return { status: error.getStatus(), body: error.getResponse() as ErrorBody };
    const status = error instanceof HttpException ? error.getStatus() : statusOf(error);
    const known = byStatus[status];
    if (known) return { status, body: { error: known } };
    this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    return {
      status: 500,
      body: {
        error: { id: 'failed', message: 'Something went wrong here. Nothing you typed is lost; try again.' },
      },
    };
  }
}

/** Middleware below Nest (body parser, multer) throws plain errors that carry a status. */
function statusOf(error: unknown): number {
  if (typeof error === 'object' && error !== null && 'code' in error && error.code === 'LIMIT_FILE_SIZE')
    return 413;
  if (typeof error === 'object' && error !== null && 'status' in error && typeof error.status === 'number')
    return error.status;
  return 500;
}
