import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** Findings that one mechanism explains, and how far they overlap. */
@Entity('finding_group')
@Index(['caseId', 'position'])
export class FindingGroup {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  @Column('int')
  position: number;

  @Column('varchar', { length: 120 })
  label: string;

  /** 0: each counts in full; 1: together they count as one. */
  @Column('double')
  overlap: number;

  @Column('text', { nullable: true })
  reason: string | null;
}
