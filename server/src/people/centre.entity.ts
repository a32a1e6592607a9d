import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** A hospital, clinic or practice of the network. */
@Entity('centre')
export class CentreRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  /** A short name for narrow places. */
  @Column('varchar', { length: 12, unique: true })
  code: string;

  @Column('varchar', { length: 120 })
  name: string;

  @Column(moment())
  createdAt: Date;
}
