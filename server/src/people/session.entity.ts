import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** One signed-in browser. The cookie names this row, so that it can be revoked at once. */
@Entity('session')
@Index(['personId', 'revokedAt'])
export class SessionRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  personId: string;

  @Column(moment())
  createdAt: Date;

  /** The end, however busy the session is. */
  @Column(moment())
  expiresAt: Date;

  @Column(moment({ nullable: true }))
  revokedAt: Date | null;

  /** Written at most once a minute; a session that rests too long is over. */
  @Column(moment())
  lastSeenAt: Date;

  @Column('varchar', { length: 255 })
  userAgent: string;
}
