import { Column, Entity, PrimaryColumn, VersionColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** Somebody who can be invited, sign in and sit on cases. Never deleted: judgements and plans name their people. */
@Entity('person')
export class PersonRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  /** In lower case. */
  @Column('varchar', { length: 254, unique: true })
  email: string;

  @Column('varchar', { length: 120 })
  name: string;

  @Column('varchar', { length: 120 })
  specialty: string;

  @Column('char', { length: 36 })
  centreId: string;

  /** Argon2id; null until the first invitation is accepted. */
  @Column('varchar', { length: 255, nullable: true, select: false })
  passwordHash: string | null;

  /** Has accepted an invitation. */
  @Column('boolean', { default: false })
  accepted: boolean;

  /** Deactivated people cannot sign in. */
  @Column('boolean', { default: true })
  active: boolean;

  @VersionColumn()
  version: number;

  @Column(moment())
  createdAt: Date;
}
