import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { RoundKind, SealedDocument } from '@weighhouse/shared/contracts/rounds';

/** Fewest that a pool can be made of when the quorum is not reached. */
const fewestAfterDeadline = 2;
const fewestCandidates = 2;
const fewestFindings = 3;

/** What is still missing before a round can be opened; empty when it can. */
export function missingToOpen(
  kind: RoundKind,
  has: { candidates: number; findings: number; unsealedRounds: number },
): FieldFault[] {
  const missing: FieldFault[] = [];
  if (has.candidates < fewestCandidates)
    missing.push({
      path: 'candidates',
      message: `two candidates are needed, there ${areNow(has.candidates)}`,
    });
  if (has.findings < fewestFindings)
    missing.push({ path: 'findings', message: `three findings are needed, there ${areNow(has.findings)}` });
  if (kind === 'live' && has.unsealedRounds === 0)
    missing.push({ path: 'kind', message: 'a sealed round comes first, and has to be unsealed' });
  return missing;
}

/** What is still missing before a judgement can be handed in. `noMore` says that nothing else will come. */
export function missingToHandIn({ judgement, findings }: SealedDocument, noMore: boolean): FieldFault[] {
  if (noMore) return [];
  const missing: FieldFault[] = [];
  if (judgement.prior === null)
    missing.push({ path: 'prior', message: 'the prior over the candidates in force is not given' });
  if (judgement.rows.length * 2 < findings.length)
    missing.push({
      path: 'findings',
      message: `${String(judgement.rows.length)} of ${String(findings.length)} rows are judged; half are needed, or say that no more will come from you`,
    });
  return missing;
}

/** What is still missing before a sealed round can be unsealed; empty when the quorum or the deadline allows it. */
export function missingToUnseal(round: {
  handedIn: number;
  quorum: number;
  deadline: Date | null;
  now: Date;
  reason: string | undefined;
}): FieldFault[] {
  if (round.handedIn >= round.quorum) return [];
  const missing: FieldFault[] = [
    {
      path: 'quorum',
      message: `${String(round.handedIn)} of the ${String(round.quorum)} of the quorum have handed in`,
    },
  ];
  const late = round.deadline !== null && round.deadline <= round.now;
  if (!late)
    missing.push({
      path: 'deadline',
      message:
        round.deadline === null
          ? 'no deadline was set, so the quorum has to be in'
          : 'the deadline is not past, so the quorum has to be in',
    });
  if (round.handedIn < fewestAfterDeadline)
    missing.push({ path: 'handedIn', message: 'after the deadline two have to be in' });
  if (!round.reason)
    missing.push({
      path: 'reason',
      message: 'after the deadline a reason is needed to go on without the quorum',
    });
  // After the deadline with two in and a reason, the missing quorum alone does not stand in the way.
  return missing.length === 1 ? [] : missing;
}

const areNow = (count: number): string => (count === 1 ? 'is 1' : `are ${String(count)}`);
