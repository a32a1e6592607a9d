import { type ExecutionContext, Injectable } from '@nestjs/common';
import { AuthGuard } from '@nestjs/passport';
import { signInSchema } from '@weighhouse/shared/contracts/people';
import type { Request } from 'express';
import { DataSource } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { invalid, Refusal } from '../platform/errors/refusal.js';
import { fieldPath } from '../platform/http/validation.js';
import { AttemptLimits } from './attempt-limits.js';
import { networkOf } from './network-of.js';
import type { PersonRow } from './person.entity.js';

/** The person that a password let in, on the request. */
export interface RequestWithPerson extends Request {
  user?: PersonRow;
}

/** Lets in by e-mail and password: counts the attempt first, and writes a refused one into the trail. */
@Injectable()
export class SignInGuard extends AuthGuard('password') {
  constructor(
    private readonly limits: AttemptLimits,
    private readonly audit: AuditLog,
    private readonly source: DataSource,
  ) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const request = context.switchToHttp().getRequest<Request>();
    const address = networkOf(request.ip ?? '');
    await this.limits.take('address', address);
    // Guards run before the validation of the body, and the strategy takes what it finds.
    const input = signInSchema.safeParse(request.body);
    if (!input.success) {
      throw invalid(
        input.error.issues.map((issue) => ({ path: fieldPath(issue.path), message: issue.message })),
      );
    }
    const account = `${address} ${input.data.email}`;
    await this.limits.take('account', account);
    await this.limits.take('anywhere', input.data.email);
    request.body = input.data;
    try {
      await super.canActivate(context);
    } catch (error) {
      if (error instanceof Refusal) await this.recordRefusal();
      throw error;
    }
    this.limits.succeeded('account', account);
    this.limits.succeeded('anywhere', input.data.email);
    return true;
  }

  override handleRequest<T>(error: unknown, person: T | false | null): T {
    if (error instanceof Error) throw error;
    if (!person) throw new Refusal('wrong-credentials', 'E-mail and password do not go together.');
    return person;
  }

  /** Not what was typed: people type passwords into the field above. */
  private recordRefusal(): Promise<void> {
    return this.audit.record(this.source.manager, {
      actorId: null,
      action: 'session.refused',
      sentence: 'refused a sign-in: e-mail and password did not go together',
    });
  }
}
