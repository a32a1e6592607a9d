import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** What an illness turned out to be. Rows are only ever added; after a reopening the last one counts. */
@Entity('outcome')
@Index(['caseId', 'recordedAt'])
export class OutcomeRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** The candidate that it turned out to be; null for none of these. */
  @Column('char', { length: 36, nullable: true })
  candidateId: string | null;

  @Column('varchar', { length: 300 })
  diagnosis: string;

  @Column('text')
  howKnown: string;

  /** A calendar day. */
  @Column('date')
  knownOn: string;

  @Column('char', { length: 36 })
  recordedById: string;

  @Column(moment())
  recordedAt: Date;
}
