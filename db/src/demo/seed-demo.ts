import type { INestApplicationContext } from '@nestjs/common';
import { EndRoundsService } from '@weighhouse/server/differential/rounds/end-rounds.service';
import { OpenRoundsService } from '@weighhouse/server/differential/rounds/open-rounds.service';
import { AuditLog } from '@weighhouse/server/platform/audit-log/audit-log';
import { AuditEntry } from '@weighhouse/server/platform/audit-log/audit-entry.entity';
import { Outbox } from '@weighhouse/server/platform/mail/outbox';
import { DataSource } from 'typeorm';
import { DemoCalendar } from './calendar.js';
import { type DemoCase, demoCases } from './demo-case.js';
import { handIn, judgeAll, judgeRows } from './judge-case.js';
import { accept, layOutEvidence, type PreparedCase, refer } from './prepare-case.js';
import { seedPeople } from './seed-people.js';
import { Stage } from './stage.js';

const seeded = 'demo.seeded';

/**
 * Fills an empty database with the invented network and its two cases, through the services.
 * @returns what was done, as a sentence
 * @throws Error when the database holds other data, or half of a demo
 */
export async function seedDemo(app: INestApplicationContext): Promise<string> {
  const source = app.get(DataSource);
  if (await source.manager.existsBy(AuditEntry, { action: seeded })) return 'The demo is there already.';
  if (await source.manager.exists(AuditEntry)) {
    throw new Error(
      'This database holds other data, or a demo that was interrupted. Set DEMO=0 to use it, or DATA_DIR to another folder for a fresh demo.',
    );
  }
  const stage = new Stage(app);
  await seedPeople(stage);
  await playCaseA(stage, demoCases.a);
  await playCaseB(stage, demoCases.b);
  stage.at(stage.now());
  await app
    .get(AuditLog)
    .record(source.manager, { actorId: null, action: seeded, sentence: 'seeded the demo' });
  await app.get(Outbox).flush();
  return 'The demo is seeded: fifteen people and two cases, all invented.';
}

/** Round 1 is unsealed and round 2 is live: all but the first have handed in what they changed. */
async function playCaseA(stage: Stage, story: DemoCase): Promise<void> {
  const { prepared, calendar } = await prepare(stage, story, 9);
  const roundOne = await openSealed(stage, story, prepared, calendar, 6);
  for (const [index, contributor] of story.contributors.entries()) {
    stage.at(calendar.daysAgo(4, `1${String(index)}:40`));
    await judgeAll(stage, story, prepared, contributor);
    await handIn(stage, roundOne, contributor);
  }
  const chair = stage.actor(story.chair);
  stage.at(calendar.daysAgo(2, '08:05'));
  await stage.service(EndRoundsService).unseal(chair, roundOne, undefined);
  const live = await stage.service(OpenRoundsService).open(chair, prepared.caseId, { kind: 'live' });
  for (const [index, contributor] of story.contributors.entries()) {
    stage.at(calendar.daysAgo(1, `1${String(index)}:20`));
    if (contributor.later) {
      await judgeRows(stage, prepared, contributor, contributor.later.rows, contributor.later.reason);
    }
    if (index > 0) await handIn(stage, live.id, contributor);
  }
}

/** In its first sealed round: two have handed in, a third has begun. */
async function playCaseB(stage: Stage, story: DemoCase): Promise<void> {
  const { prepared, calendar } = await prepare(stage, story, 7);
  const round = await openSealed(stage, story, prepared, calendar, 3);
  const [cardiology, , nephrology, neurology] = story.contributors;
  for (const contributor of [cardiology, nephrology]) {
    if (!contributor) continue;
    stage.at(calendar.daysAgo(2, '15:05'));
    await judgeAll(stage, story, prepared, contributor);
    await handIn(stage, round, contributor);
  }
  if (neurology) {
    stage.at(calendar.daysAgo(1, '17:30'));
    await judgeAll(stage, story, prepared, neurology);
  }
}

async function prepare(
  stage: Stage,
  story: DemoCase,
  receivedDaysAgo: number,
): Promise<{ prepared: PreparedCase; calendar: DemoCalendar }> {
  const calendar = new DemoCalendar(stage.now(), story.receivedAt, receivedDaysAgo);
  stage.at(calendar.daysAgo(receivedDaysAgo, '09:10'));
  const referred = await refer(stage, story, calendar);
  stage.at(calendar.daysAgo(receivedDaysAgo - 1, '11:25'));
  await accept(stage, story, referred.caseId);
  stage.at(calendar.daysAgo(receivedDaysAgo - 2, '13:50'));
  return { prepared: await layOutEvidence(stage, story, referred, calendar), calendar };
}

async function openSealed(
  stage: Stage,
  story: DemoCase,
  { caseId }: PreparedCase,
  calendar: DemoCalendar,
  daysAgo: number,
): Promise<string> {
  const deadline = new Date(stage.now().getTime() + 2 * 86_400_000).toISOString();
  stage.at(calendar.daysAgo(daysAgo, '08:30'));
  const round = await stage
    .service(OpenRoundsService)
    .open(stage.actor(story.chair), caseId, { kind: 'sealed', deadline });
  return round.id;
}
