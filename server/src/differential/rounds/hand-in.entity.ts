import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/database/columns.js';

/** A contributor's word that a version of their judgement is theirs for a round, with its seal. */
@Entity('hand_in')
export class HandInRow {
  @PrimaryColumn('char', { length: 36 })
  roundId: string;

  @PrimaryColumn('char', { length: 36 })
  personId: string;

  @Column(moment())
  handedInAt: Date;

  /** The version of the person's judgement that it confirms; 0 where nothing was judged. */
  @Column('int')
  version: number;

  /** SHA-256 over random and text, 64 hexadecimal digits; the whole team sees it at once. */
  @Column('char', { length: 64 })
  digest: string;

  /** 32 random bytes as 64 hexadecimal digits; secret until the round is unsealed. */
  @Column('char', { length: 64 })
  random: string;

  /** The sealed document in canonical JSON, as it was hashed; secret until the round is unsealed. */
  @Column('mediumtext')
  text: string;
}
