import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** A single-use link by which a person sets a password. The link's token itself is kept nowhere. */
@Entity('invitation')
@Index(['personId'])
export class InvitationRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  personId: string;

  /** SHA-256 of the token, hexadecimal. */
  @Column('char', { length: 64, unique: true })
  tokenHash: string;

  @Column(moment())
  createdAt: Date;

  @Column(moment())
  expiresAt: Date;

  @Column(moment({ nullable: true }))
  usedAt: Date | null;

  /** Replaced by a later invitation, or its person was deactivated. */
  @Column(moment({ nullable: true }))
  withdrawnAt: Date | null;
}
