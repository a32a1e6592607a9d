import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** One possible diagnosis on a case's differential. Retired ones stay, because judgements refer to them. */
@Entity('candidate')
@Index(['caseId', 'position'], { unique: true })
export class CandidateRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** The order of the columns; never used again on this case. */
  @Column('int')
  position: number;

  @Column('varchar', { length: 160 })
  name: string;

  @Column('varchar', { length: 1000, default: '' })
  detail: string;

  @Column('boolean', { default: false })
  mustNotMiss: boolean;

  /** The first candidate set that has it. */
  @Column('int')
  addedInSet: number;

  /** The first candidate set that no longer has it. */
  @Column('int', { nullable: true })
  retiredInSet: number | null;

  @Column('text', { nullable: true })
  retiredWords: string | null;

  @Column('char', { length: 36 })
  addedById: string;

  @Column(moment())
  addedAt: Date;

  @Column('char', { length: 36, nullable: true })
  retiredById: string | null;

  @Column(moment({ nullable: true }))
  retiredAt: Date | null;
}
