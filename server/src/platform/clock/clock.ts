import { Injectable } from '@nestjs/common';

/** The one source of "now"; tests and the demo set it. */
@Injectable()
export class Clock {
  private offsetMs = 0;

  now(): Date {
    return new Date(Date.now() + this.offsetMs);
  }

  /** From here on time runs on from this moment. */
  set(moment: Date): void {
    this.offsetMs = moment.getTime() - Date.now();
  }

  reset(): void {
    this.offsetMs = 0;
  }
}
