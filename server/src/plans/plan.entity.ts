import type { Certainty } from '@weighhouse/shared/contracts/plans';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** What the panel agreed on. One draft at a time; once signed it is never changed, and the next one has its own row. */
@Entity('plan')
@Index(['caseId', 'number'], { unique: true })
export class PlanRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** 1 for the first plan of the case. */
  @Column('int')
  number: number;

  /** Guards the draft against two writers. */
  @Column('int')
  version: number;

  @Column('varchar', { length: 500 })
  workingDiagnosis: string;

  /** The candidate that the working diagnosis is; null for none of these or where it was not said. */
  @Column('char', { length: 36, nullable: true })
  candidateId: string | null;

  @Column('varchar', { length: 20, nullable: true })
  certainty: Certainty | null;

  @Column('text')
  remainingDoubt: string;

  @Column('text')
  safetyNet: string;

  /** When the text last changed; what was said before it was said of an older text. */
  @Column(moment())
  changedAt: Date;

  @Column('char', { length: 36 })
  changedById: string;

  /** When contributors were last asked for agreement or dissent. */
  @Column(moment({ nullable: true }))
  askedAt: Date | null;

  @Column(moment({ nullable: true }))
  signedAt: Date | null;

  @Column('char', { length: 36, nullable: true })
  signedById: string | null;

  /** Where the panel stood at signing. */
  @Column('char', { length: 36, nullable: true })
  snapshotId: string | null;
}
