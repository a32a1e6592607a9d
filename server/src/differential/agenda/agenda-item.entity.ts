import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/database/columns.js';

/** A row of the ledger that the chair wants discussed first, and why. */
@Entity('agenda_item')
@Index(['caseId'])
export class AgendaItemRow {
  @PrimaryColumn('char', { length: 36 })
  findingId: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** The case's revision at the last save: it also tells an item put back from the one that was taken off. */
  @Column('int')
  version: number;

  @Column('varchar', { length: 1000 })
  note: string;

  @Column('char', { length: 36 })
  addedById: string;

  @Column(moment())
  addedAt: Date;
}
