import { randomUUID } from 'node:crypto';
import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { Assessment } from '@weighhouse/shared/reasoning/assess';
import type { EntityManager } from 'typeorm';
import { CaseChanges, type Consequence } from '../../cases/case-changes.js';
import { Clock } from '../../platform/clock/clock.js';
import { Assessments } from './assessments.js';
import { type CasePool, openRound, panelOf, type PoolView } from './case-pool.js';
import { columnNames, leaderColumns } from './leader.js';
import { PoolReader } from './pool-reader.js';
import { Snapshots } from './snapshots.js';
import { StandingShare } from './standing-share.entity.js';
import { StandingSnapshot } from './standing-snapshot.entity.js';

/** A standing that is kept: the names of the columns as they were, none of these last. */
export interface KeptStanding {
  id: string;
  rows: { name: string; share: number }[];
  /** The method's name and version. */
  method: string;
}

/** The standing as it is pushed. */
export interface CurrentStanding {
  revision: number;
  candidateSet: number;
  standing: number[];
}

/** What is pushed of a case: its standing, and whether the rest takes so long that it follows by itself. */
export interface CurrentPool {
  standing: CurrentStanding;
  follows: boolean;
}

/** The whole assessment as it is pushed, for those who see whose numbers they are and for those who don't. */
export interface CurrentAssessment {
  revision: number;
  candidateSet: number;
  assessments: Record<PoolView, Assessment>;
}

const movers: readonly string[] = ['team', 'settings', 'candidates', 'findings', 'round', 'judgements'];

/** Where the panel stands, by the numbers that everybody on the case may see. */
@Injectable()
export class StandingService implements OnModuleInit {
  constructor(
    private readonly pools: PoolReader,
    private readonly snapshots: Snapshots,
    private readonly assessments: Assessments,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.changes.follow(this.columnsAfter);
  }

  /** The standing to push; null while a sealed round is open or nothing may be seen yet. */
  async current(caseId: string): Promise<CurrentPool | null> {
    const pool = await this.open(caseId);
    const alone = pool && (await this.assessments.standingOf(pool));
    if (!alone) return null;
    const { revision, candidateSet } = pool;
    const standing = { revision, candidateSet, standing: alone.standing };
    return { standing, follows: this.assessments.follows(pool) };
  }

  /** The whole assessment to push; null while a sealed round is open or nothing may be seen yet. */
  async currentAssessment(caseId: string): Promise<CurrentAssessment | null> {
    const pool = await this.open(caseId);
    const named = pool && (await this.assessments.of(pool, 'named'));
    const anonymous = pool && (await this.assessments.of(pool, 'anonymous'));
    if (!named || !anonymous) return null;
    const { revision, candidateSet } = pool;
    return { revision, candidateSet, assessments: { named, anonymous } };
  }

  /** What may be seen, unless a sealed round is open. */
  private async open(caseId: string): Promise<CasePool | null> {
    const pool = await this.snapshots.run((em) => this.pools.read(caseId, em));
    return openRound(pool)?.kind === 'sealed' ? null : pool;
  }

  /**
   * Keeps where the panel stands now.
   * @param em the running transaction, which holds the case's row
   * @param roundId the round that is being opened; left out for a plan
   * @returns null where nothing may be seen yet
   */
  async snapshot(
    em: EntityManager,
    caseId: string,
    roundId: string | null = null,
  ): Promise<KeptStanding | null> {
    const pool = await this.pools.read(caseId, em);
    const assessment = await this.assessments.standing(panelOf(pool, 'named'));
    if (!assessment) return null;
    const id = randomUUID();
    const { candidateSet } = pool;
    const { method, standing } = assessment;
    await em.insert(StandingSnapshot, {
      id,
      caseId,
      roundId,
      candidateSet,
      method,
      takenAt: this.clock.now(),
    });
    const rows = columnNames(pool).map((name, k) => ({ name, share: standing[k] ?? 0 }));
    await em.insert(
      StandingShare,
      rows.map((row, position) => ({
        ...row,
        snapshotId: id,
        position,
        candidateId: pool.candidates[position]?.id ?? null,
      })),
    );
    return { id, rows, method };
  }

  /** A standing that was kept, for instance with a signed plan. */
  async kept(snapshotId: string, em: EntityManager): Promise<KeptStanding | null> {
    const snapshot = await em.findOneBy(StandingSnapshot, { id: snapshotId });
    if (!snapshot) return null;
    const shares = await em.find(StandingShare, { where: { snapshotId }, order: { position: 'ASC' } });
    const rows = shares.map(({ name, share }) => ({ name, share }));
    return { id: snapshot.id, rows, method: snapshot.method };
  }

  /** Where the panel stood before a round, by the columns in force now; null where a column is newer. */
  async before(pool: CasePool, roundId: string, em: EntityManager): Promise<(number | null)[] | null> {
    const snapshot = await em.findOneBy(StandingSnapshot, { roundId });
    if (!snapshot) return null;
    const shares = await em.findBy(StandingShare, { snapshotId: snapshot.id });
    const byCandidate = new Map(shares.map((row) => [row.candidateId, row.share]));
    return [...pool.candidates.map((candidate) => candidate.id), null].map(
      (candidateId) => byCandidate.get(candidateId) ?? null,
    );
  }

  /** The list's columns after a change, by what may be seen: a sealed round's numbers never reach them. */
  private readonly columnsAfter: Consequence = async (em, file, what) => {
    if (!movers.includes(what) || file.roundNumber === null) return {};
    const pool = await this.pools.read(file.id, em);
    return {
      ...leaderColumns(pool, await this.assessments.leading(panelOf(pool, 'named'))),
      roundHandedIn: handedInNow(pool),
    };
  };
}

/** How many of the contributors now have handed in, in the open or last round. */
export function handedInNow(pool: CasePool): number {
  const round = openRound(pool) ?? pool.rounds.at(-1);
  const now = new Set(pool.contributors.map((one) => one.personId));
  return pool.handIns.filter((handIn) => handIn.roundId === round?.id && now.has(handIn.personId)).length;
}
