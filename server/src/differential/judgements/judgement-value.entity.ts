import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** One number of a saved version. A version without any is a judgement taken back. */
@Entity('judgement_value')
@Index(['judgementVersionId'])
export class JudgementValue {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id: string;

  @Column('char', { length: 36 })
  judgementVersionId: string;

  /** Null: none of these. */
  @Column('char', { length: 36, nullable: true })
  candidateId: string | null;

  /** Of a prior 0. Of a two-level row 1, the share that shows the finding; else a row for each level. */
  @Column('int')
  level: number;

  /** The number out of 100, times ten. */
  @Column('int')
  thousandths: number;
}
