import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { Exposure } from '@weighhouse/shared/contracts/judgements';
import { figureOf, levelShares } from './cells';
import { type Voice, voicesOf } from './people';
import type { WeightOf } from './why';

/** One contributor's whole row. */
export interface RowVoice {
  voice: Voice;
  exposure: Exposure;
  weight: number | null;
  reason: string | null;
  /** For each column, what the cell shows: the share of what was observed; null for a blank. */
  shares: (number | null)[];
}

/** Everybody who judged a row, oneself first. */
export function rowVoices(
  differential: Differential,
  finding: Finding,
  columns: number,
  weightOf: WeightOf,
): RowVoice[] {
  return voicesOf(differential).flatMap((voice) => {
    const person = voice.you
      ? differential.mine
      : differential.others?.find((other) => other.key === voice.key);
    const row = person?.findings.find((one) => one.findingId === finding.id);
    if (!row?.outOf100.some((cell) => cell !== null)) return [];
    const shares = Array.from({ length: columns }, (_, column) => {
      const given = row.outOf100[column] ?? null;
      return given === null ? null : (figureOf(levelShares(given), finding)?.share ?? null);
    });
    return [{ voice, exposure: row.exposure, weight: weightOf(voice), reason: row.reason, shares }];
  });
}
