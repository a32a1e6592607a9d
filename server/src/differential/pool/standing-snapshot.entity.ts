import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../../platform/database/columns.js';

/** Where the panel stood at one moment: when a round was opened, or when a plan was signed. */
@Entity('standing_snapshot')
@Index(['caseId', 'takenAt'])
export class StandingSnapshot {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** The round before whose opening it was taken; null for a plan's. */
  @Column('char', { length: 36, nullable: true, unique: true })
  roundId: string | null;

  @Column('int')
  candidateSet: number;

  /** The name and version of the method, as assess() says it. */
  @Column('varchar', { length: 40 })
  method: string;

  @Column(moment())
  takenAt: Date;
}
