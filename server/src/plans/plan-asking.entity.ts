import { Column, Entity, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** That a contributor was asked about a plan, and when last. */
@Entity('plan_asking')
export class PlanAsking {
  @PrimaryColumn('char', { length: 36 })
  planId: string;

  @PrimaryColumn('char', { length: 36 })
  personId: string;

  @Column(moment())
  askedAt: Date;
}
