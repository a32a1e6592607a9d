import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** What the settings of a case were from a moment on, and why the chair changed them. Rows are only ever added. */
@Entity('settings_change')
@Index(['caseId', 'id'])
export class SettingsChange {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  @Column('char', { length: 36 })
  changedById: string;

  @Column(moment())
  changedAt: Date;

  @Column('double')
  coexistence: number;

  @Column('double')
  tempering: number;

  @Column('int')
  quorum: number;

  @Column(moment({ nullable: true }))
  conferenceAt: Date | null;

  /** The chair's words; they may be clinical, so they are not in the trail. */
  @Column('text')
  reason: string;
}
