import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** A contact with the patient, or an attempt. Rows are only ever added. */
@Entity('contact')
@Index(['caseId', 'at'])
export class ContactRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  @Column(moment())
  at: Date;

  @Column('varchar', { length: 12 })
  how: 'meeting' | 'telephone' | 'video' | 'letter';

  @Column('boolean')
  reached: boolean;

  @Column('varchar', { length: 8, nullable: true })
  understood: 'yes' | 'partly' | 'no' | null;

  @Column('text')
  questions: string;

  @Column('text')
  notes: string;

  /** This contact told the summary of the plan with this number; null for an attempt. */
  @Column('int', { nullable: true })
  toldPlanNumber: number | null;

  @Column('char', { length: 36 })
  byId: string;

  @Column(moment())
  recordedAt: Date;
}
