import { HandInsService } from '@weighhouse/server/differential/rounds/hand-ins.service';
import { JudgementsService } from '@weighhouse/server/differential/judgements/judgements.service';
import type { DemoCase, DemoContributor } from './demo-case.js';
import type { PreparedCase } from './prepare-case.js';
import type { Stage } from './stage.js';

/** A contributor's whole judgement of the first round: prior, rows, and the pending tests of the own field. */
export async function judgeAll(
  stage: Stage,
  story: DemoCase,
  prepared: PreparedCase,
  contributor: DemoContributor,
): Promise<void> {
  const judgements = stage.service(JudgementsService);
  const actor = stage.actor(contributor.id);
  const { caseId, candidateSet } = prepared;
  await judgements.savePrior(actor, caseId, {
    candidateSet,
    outOf100: contributor.prior,
    reason: contributor.reason,
  });
  await judgeRows(stage, prepared, contributor, contributor.rows);
  for (const test of story.tests.filter((one) => one.judgedBy.includes(contributor.id))) {
    await judgements.saveRow(actor, caseId, prepared.findingId(test.key), {
      candidateSet,
      exposure: 'often',
      outOf100: test.given,
    });
  }
}

/** Rows of observed findings: seen often where they are of the contributor's own field, else sometimes. */
export async function judgeRows(
  stage: Stage,
  { caseId, candidateSet, findingId }: PreparedCase,
  contributor: DemoContributor,
  rows: Record<string, number[]>,
  reason?: string,
): Promise<void> {
  for (const [key, outOf100] of Object.entries(rows)) {
    await stage.service(JudgementsService).saveRow(stage.actor(contributor.id), caseId, findingId(key), {
      candidateSet,
      exposure: contributor.ownField.includes(key) ? 'often' : 'sometimes',
      outOf100,
      ...(reason === undefined ? {} : { reason }),
    });
  }
}

export async function handIn(stage: Stage, roundId: string, contributor: DemoContributor): Promise<void> {
  await stage.service(HandInsService).handIn(stage.actor(contributor.id), roundId, { noMore: true });
}
