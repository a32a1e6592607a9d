import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Role } from '@weighhouse/shared/contracts/people';

/** The signed-in person of a request. */
export interface Actor {
  id: string;
  name: string;
  roles: readonly Role[];
  sessionId: string;
}

/** What the session strategy puts on the request. */
export interface RequestWithActor {
  user?: Actor;
}

/** The signed-in person; only on routes that are not public. */
export const CurrentActor = createParamDecorator((_: unknown, context: ExecutionContext): Actor => {
  const { user } = context.switchToHttp().getRequest<RequestWithActor>();
  if (!user) throw new TypeError('a public route has no signed-in person');
  return user;
});
