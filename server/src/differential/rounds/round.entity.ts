import type { RoundKind } from '@weighhouse/shared/contracts/rounds';
import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/database/columns.js';

/** A period of judging. While it is sealed and open, its numbers are nobody's but their giver's. */
@Entity('round')
@Index(['caseId', 'number'], { unique: true })
export class RoundRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** 1 for the first round of the case. */
  @Column('int')
  number: number;

  @Column('varchar', { length: 10 })
  kind: RoundKind;

  @Column('varchar', { length: 10 })
  state: 'open' | 'unsealed' | 'closed';

  /** The candidate set when it was opened; frozen while the round is sealed. */
  @Column('int')
  candidateSet: number;

  @Column(moment())
  openedAt: Date;

  @Column('char', { length: 36 })
  openedById: string;

  @Column(moment({ nullable: true }))
  deadline: Date | null;

  /** Of a sealed round: since when everybody on the case sees its numbers. */
  @Column(moment({ nullable: true }))
  unsealedAt: Date | null;

  @Column('text', { nullable: true })
  unsealReason: string | null;

  @Column(moment({ nullable: true }))
  closedAt: Date | null;
}
