import type { Exposure } from '@weighhouse/shared/contracts/judgements';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/database/columns.js';

/** One saved version of a contributor's prior or of one row; added, never changed. */
@Entity('judgement_version')
@Index(['caseId', 'personId', 'version'], { unique: true })
export class JudgementVersion {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  @Column('char', { length: 36 })
  personId: string;

  /** The round in which it was saved. */
  @Column('char', { length: 36 })
  roundId: string;

  /** Counts this person's saves on this case, over all targets. */
  @Column('int')
  version: number;

  /** The word prior, or the id of a finding. */
  @Column('varchar', { length: 36 })
  target: string;

  @Column('int')
  candidateSet: number;

  /** Of a row; null for a prior and for a row taken back. */
  @Column('varchar', { length: 10, nullable: true })
  exposure: Exposure | null;

  @Column('text', { nullable: true })
  reason: string | null;

  @Column(moment())
  savedAt: Date;
}
