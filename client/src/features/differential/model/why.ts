import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { Exposure, RowJudgement } from '@weighhouse/shared/contracts/judgements';
import { figureOf, levelShares } from './cells';
import { type Voice, voicesOf } from './people';

/** How much an exposure lets a judgement of the row count (reasoning.md, section 1). */
export const exposureWeight: Record<Exposure, number> = { seldom: 0.25, sometimes: 0.5, often: 1 };

/** One contributor's part in a pooled number. */
export interface WhyLine {
  voice: Voice;
  /** Their number (0 to 1) for what the cell shows; null where they left it blank. */
  share: number | null;
  exposure: Exposure | null;
  /** Their weight times their exposure; null where the weight is not told. */
  counts: number | null;
  reason: string | null;
}

/** Who said what about a cell, and how much each counts, those with a number first. */
export function whyCell(
  differential: Differential,
  finding: Finding,
  column: number,
  weightOf: WeightOf,
): WhyLine[] {
  const lines = voicesOf(differential).map((voice) => {
    const row = rowOf(differential, voice, finding.id);
    const given = row?.outOf100[column] ?? null;
    const weight = weightOf(voice);
    return {
      voice,
      share: given === null ? null : (figureOf(levelShares(given), finding)?.share ?? null),
      exposure: row?.exposure ?? null,
      counts: row && given !== null && weight !== null ? weight * exposureWeight[row.exposure] : null,
      reason: row?.reason ?? null,
    };
  });
  return withNumbersFirst(lines);
}

/** The same for the starting share of a candidate. */
export function whyPrior(differential: Differential, column: number, weightOf: WeightOf): WhyLine[] {
  const { mine, others } = differential;
  const lines = voicesOf(differential).map((voice) => {
    const person = voice.you ? mine : others?.find((other) => other.key === voice.key);
    const prior = person?.prior && person.priorInForce ? person.prior : null;
    const given = prior?.outOf100[column];
    return {
      voice,
      share: given === undefined ? null : given / 100,
      exposure: null,
      counts: given === undefined ? null : weightOf(voice),
      reason: prior?.reason ?? null,
    };
  });
  return withNumbersFirst(lines);
}

/** The weight that the chair gave a contributor; null where it is not known here. */
export type WeightOf = (voice: Voice) => number | null;

function rowOf({ mine, others }: Differential, voice: Voice, findingId: string): RowJudgement | undefined {
  const person = voice.you ? mine : others?.find((other) => other.key === voice.key);
  return person?.findings.find((row) => row.findingId === findingId);
}

const withNumbersFirst = (lines: WhyLine[]) => [
  ...lines.filter((line) => line.share !== null),
  ...lines.filter((line) => line.share === null),
];
