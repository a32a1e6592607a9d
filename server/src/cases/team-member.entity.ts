import type { Part } from '@weighhouse/shared/contracts/cases';
import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** One person's part on one case. A person may hold several parts, each in a row of its own. */
@Entity('team_member')
@Index(['caseId', 'personId', 'part'], { unique: true })
@Index(['personId'])
export class TeamMember {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  @Column('char', { length: 36 })
  personId: string;

  @Column('varchar', { length: 12 })
  part: Part;

  /** Contributors alone: 0 to 3. */
  @Column('double', { nullable: true })
  weight: number | null;

  @Column('text', { nullable: true })
  reason: string | null;

  @Column(moment())
  addedAt: Date;

  /** Taken off the team; the row stays because judgements refer to it. */
  @Column(moment({ nullable: true }))
  leftAt: Date | null;
}
