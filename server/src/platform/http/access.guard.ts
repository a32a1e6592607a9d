import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import type { Role } from '@weighhouse/shared/contracts/people';
import { Refusal } from '../errors/refusal.js';
import { ACCESS, generalActions } from './access.decorator.js';
import type { RequestWithActor } from './actor.js';

/** Lets nobody past without a session, except on routes declared public; refuses a role that is not held. */
@Injectable()
export class AccessGuard extends AuthGuard('session') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const action = this.reflector.getAllAndOverride<string | undefined>(ACCESS, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (action === 'public') return true;
    await super.canActivate(context);
    const needed = (generalActions as Record<string, Role | null>)[action ?? ''] ?? null;
    const { user } = context.switchToHttp().getRequest<RequestWithActor>();
    if (needed !== null && !user?.roles.includes(needed)) {
      throw new Refusal('forbidden', 'Your roles do not open this.');
    }
    return true;
  }

  override handleRequest<T>(error: unknown, user: T | false | null): T {
    if (error instanceof Error) throw error;
    if (!user) throw new Refusal('signed-out', 'You are signed out. Sign in to go on.');
    return user;
  }
}
