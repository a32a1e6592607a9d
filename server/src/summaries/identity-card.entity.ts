import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** Who the patient of a case is, encrypted: whoever reads the database alone learns nothing. */
@Entity('identity_card')
export class IdentityCardRow {
  @PrimaryColumn('char', { length: 36 })
  caseId: string;

  /** Guards the card against two writers. */
  @Column('int')
  version: number;

  /** AES-256-GCM, bound to the case. */
  @Column('blob')
  box: Buffer;

  @Column(moment())
  changedAt: Date;

  @Column('char', { length: 36 })
  changedById: string;
}
