import type { Exposure } from '@weighhouse/shared/contracts/judgements';
import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/database/columns.js';

/** What a contributor has typed and not saved; private, pooled nowhere, gone when its target is saved. */
@Entity('judgement_draft')
export class JudgementDraftRow {
  @PrimaryColumn('char', { length: 36 })
  caseId: string;

  @PrimaryColumn('char', { length: 36 })
  personId: string;

  /** The word prior, or the id of a finding. */
  @PrimaryColumn('varchar', { length: 36 })
  target: string;

  @Column('int')
  candidateSet: number;

  @Column('varchar', { length: 10, nullable: true })
  exposure: Exposure | null;

  /** The texts as typed, in the form they arrived in; nobody searches in them. */
  @Column('text')
  typed: string;

  @Column('text')
  reason: string;

  @Column(moment())
  savedAt: Date;
}
