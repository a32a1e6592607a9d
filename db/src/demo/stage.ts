import { randomUUID } from 'node:crypto';
import type { INestApplicationContext } from '@nestjs/common';
import { Clock } from '@weighhouse/server/platform/clock/clock';
import type { Actor } from '@weighhouse/server/platform/http/actor';

/** The running services, the people who act and the clock they act by. */
export class Stage {
  private readonly cast = new Map<string, Actor>();

  constructor(private readonly app: INestApplicationContext) {}

  service<T>(type: new (...parts: never[]) => T): T {
    return this.app.get<T>(type, { strict: false });
  }

  enter(key: string, person: { id: string; name: string; roles: Actor['roles'] }): void {
    this.cast.set(key, { ...person, sessionId: randomUUID() });
  }

  /** @throws Error for somebody who has not entered */
  actor(key: string): Actor {
    const actor = this.cast.get(key);
    if (!actor) throw new Error(`Nobody of the demo is called ${key}.`);
    return actor;
  }

  /** What follows happens at this moment; never later than now. */
  at(moment: Date): void {
    const clock = this.service(Clock);
    clock.reset();
    if (moment < clock.now()) clock.set(moment);
  }

  /** The real moment; what follows still happens at the one that was set. */
  now(): Date {
    const clock = this.service(Clock);
    const shown = clock.now();
    clock.reset();
    const now = clock.now();
    clock.set(shown);
    return now;
  }
}
