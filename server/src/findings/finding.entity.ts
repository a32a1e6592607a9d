import type { FindingKind } from '@weighhouse/shared/contracts/findings';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** One row of evidence. Entered in error: it stays in the table and counts nowhere. */
@Entity('finding')
@Index(['caseId', 'position'], { unique: true })
@Index(['sourceReportId'])
export class FindingRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** The order of the rows, as they were added. */
  @Column('int')
  position: number;

  @Column('int', { default: 1 })
  version: number;

  @Column('varchar', { length: 300 })
  title: string;

  @Column('varchar', { length: 2000, default: '' })
  detail: string;

  @Column('varchar', { length: 12 })
  kind: FindingKind;

  /** The index of the observed level; null while pending. */
  @Column('int', { nullable: true })
  observed: number | null;

  /** A share from 0.05 to 1. */
  @Column('double')
  reliability: number;

  @Column('char', { length: 36, nullable: true })
  groupId: string | null;

  @Column('date', { nullable: true })
  observedOn: string | null;

  /** Money, in the network's currency. */
  @Column('double', { nullable: true })
  cost: number | null;

  @Column('double', { nullable: true })
  waitDays: number | null;

  /** 0 to 3. */
  @Column('double', { nullable: true })
  burden: number | null;

  @Column('char', { length: 36, nullable: true })
  sourceReportId: string | null;

  @Column('int', { nullable: true })
  sourcePage: number | null;

  @Column('varchar', { length: 300, nullable: true })
  sourceText: string | null;

  @Column('text', { nullable: true })
  errorWords: string | null;

  @Column('char', { length: 36, nullable: true })
  errorById: string | null;

  @Column(moment({ nullable: true }))
  errorAt: Date | null;

  @Column('char', { length: 36 })
  addedById: string;

  @Column(moment())
  addedAt: Date;
}
