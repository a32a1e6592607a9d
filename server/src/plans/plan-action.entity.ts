import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** What somebody does by a day. Of a signed plan's action only the three last columns are ever written, once. */
@Entity('plan_action')
@Index(['planId', 'position'])
@Index(['ownerId', 'doneAt'])
export class PlanActionRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  planId: string;

  @Column('int')
  position: number;

  @Column('varchar', { length: 500 })
  what: string;

  @Column('char', { length: 36, nullable: true })
  ownerId: string | null;

  /** A calendar day. */
  @Column('date', { nullable: true })
  due: string | null;

  /** The patient is told of it. */
  @Column('boolean')
  concernsPatient: boolean;

  @Column(moment({ nullable: true }))
  doneAt: Date | null;

  @Column('char', { length: 36, nullable: true })
  doneById: string | null;

  @Column('text', { nullable: true })
  doneWords: string | null;
}
