const dayMs = 86_400_000;

/** Moves a story's dates so that its referral was received `daysAgo` days before today. */
export class DemoCalendar {
  private readonly shiftMs: number;

  constructor(
    private readonly today: Date,
    receivedAt: string,
    daysAgo: number,
  ) {
    const received = startOfDay(new Date(receivedAt)).getTime();
    this.shiftMs = startOfDay(today).getTime() - daysAgo * dayMs - received;
  }

  /** A day of the story as a day of now. */
  day(day: string): string {
    return new Date(Date.parse(`${day}T00:00:00Z`) + this.shiftMs).toISOString().slice(0, 10);
  }

  /** So many days before today, at this time, and never in the future. */
  daysAgo(days: number, time: string): Date {
    return at(new Date(startOfDay(this.today).getTime() - days * dayMs), time);
  }
}

/** The Wednesday of next week at this time, in UTC. */
export function conferenceNextWeek(today: Date, time: string): Date {
  const start = startOfDay(today);
  const sinceMonday = (start.getUTCDay() + 6) % 7;
  return at(new Date(start.getTime() + (7 - sinceMonday + 2) * dayMs), time);
}

const startOfDay = (moment: Date): Date => new Date(moment.toISOString().slice(0, 10) + 'T00:00:00Z');

function at(day: Date, time: string): Date {
  return new Date(`${day.toISOString().slice(0, 10)}T${time}:00.000Z`);
}
