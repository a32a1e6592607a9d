import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** Two candidates that go together (more than 1 time as likely) or avoid each other (less). */
@Entity('candidate_pair')
@Index(['caseId'])
export class CandidatePair {
  @PrimaryColumn('char', { length: 36 })
  aId: string;

  @PrimaryColumn('char', { length: 36 })
  bId: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** 0 to 100. */
  @Column('double')
  times: number;

  @Column('text')
  reason: string;
}
