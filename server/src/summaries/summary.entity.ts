import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** The plain-language text that a patient is told from, one for each signed plan. */
@Entity('summary')
@Index(['caseId', 'planNumber'], { unique: true })
export class SummaryRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  @Column('int')
  planNumber: number;

  /** Guards the text against two writers; the chair approves one version of it. */
  @Column('int')
  version: number;

  @Column('varchar', { length: 10 })
  state: 'draft' | 'waiting' | 'approved' | 'told';

  @Column('mediumtext')
  body: string;

  /** What the chair asks to be changed. */
  @Column('text', { nullable: true })
  returnedWords: string | null;

  @Column(moment())
  changedAt: Date;

  @Column('char', { length: 36, nullable: true })
  approvedById: string | null;

  @Column(moment({ nullable: true }))
  approvedAt: Date | null;

  /** When the patient was first told. */
  @Column(moment({ nullable: true }))
  toldAt: Date | null;
}
