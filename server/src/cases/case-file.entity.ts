import type { CaseState, Sex, Urgency, WordedMove } from '@weighhouse/shared/contracts/cases';
import type { RoundKind } from '@weighhouse/shared/contracts/rounds';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** One patient's one question, from referral to outcome. Who the patient is stands elsewhere, encrypted. */
@Entity('case_file')
@Index(['state', 'updatedAt'])
export class CaseFile {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  /** Year and running number, like 26-0417. */
  @Column('varchar', { length: 12, unique: true })
  number: string;

  @Column('varchar', { length: 20 })
  state: CaseState;

  /** Guards the draft against two writers. Only a save of the draft raises it, so that an upload is no conflict. */
  @Column('int', { default: 1 })
  version: number;

  /** Rises with every change that the team may have to see; never with a save in a sealed round. */
  @Column('int', { default: 1 })
  revision: number;

  @Column('char', { length: 36 })
  referrerId: string;

  @Column('varchar', { length: 300, default: '' })
  question: string;

  @Column('int', { nullable: true })
  age: number | null;

  @Column('varchar', { length: 10, nullable: true })
  sex: Sex | null;

  @Column('varchar', { length: 20, nullable: true })
  urgency: Urgency | null;

  @Column('varchar', { length: 1000, default: '' })
  urgencyReason: string;

  @Column('boolean', { nullable: true })
  consentGiven: boolean | null;

  @Column('varchar', { length: 10, nullable: true })
  consentHow: 'signed' | 'spoken' | null;

  @Column('date', { nullable: true })
  consentGivenOn: string | null;

  @Column('mediumtext')
  historyHtml: string;

  @Column(moment({ nullable: true }))
  conferenceAt: Date | null;

  @Column('int', { default: 3 })
  quorum: number;

  @Column('double')
  tempering: number;

  @Column('double')
  coexistence: number;

  @Column('int', { default: 0 })
  candidateSet: number;

  /** The open or last round, in figures that tell nobody's number. */
  @Column('int', { nullable: true })
  roundNumber: number | null;

  @Column('varchar', { length: 10, nullable: true })
  roundKind: RoundKind | null;

  @Column('boolean', { default: false })
  roundOpen: boolean;

  @Column('int', { default: 0 })
  roundHandedIn: number;

  /** The leader of the last standing that may be shown; kept for lists, written with every change of the pool. */
  @Column('varchar', { length: 160, nullable: true })
  leaderName: string | null;

  @Column('double', { nullable: true })
  leaderShare: number | null;

  @Column('double', { nullable: true })
  disagreementBits: number | null;

  /** The words of the last return, decline, withdrawal or reopening. */
  @Column('varchar', { length: 20, nullable: true })
  lastMove: WordedMove | null;

  @Column('text', { nullable: true })
  lastWords: string | null;

  @Column('char', { length: 36, nullable: true })
  lastWordsById: string | null;

  @Column(moment({ nullable: true }))
  lastWordsAt: Date | null;

  @Column(moment({ nullable: true }))
  submittedAt: Date | null;

  @Column(moment({ nullable: true }))
  acceptedAt: Date | null;

  @Column(moment({ nullable: true }))
  concludedAt: Date | null;

  @Column(moment())
  createdAt: Date;

  @Column(moment())
  updatedAt: Date;
}
