import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** What a contributor said of a plan. Rows are only ever added; the last one of a person counts. */
@Entity('plan_stance')
@Index(['planId', 'personId', 'id'])
export class PlanStance {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id: string;

  @Column('char', { length: 36 })
  planId: string;

  @Column('char', { length: 36 })
  personId: string;

  @Column('varchar', { length: 10 })
  stance: 'agree' | 'dissent';

  /** Stand in the plan with a dissent. */
  @Column('text', { nullable: true })
  words: string | null;

  @Column(moment())
  at: Date;
}
