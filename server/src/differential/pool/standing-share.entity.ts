import { Column, Entity, PrimaryColumn } from 'typeorm';

/** One column of a snapshot, with the candidate's name as it was. */
@Entity('standing_share')
export class StandingShare {
  @PrimaryColumn('char', { length: 36 })
  snapshotId: string;

  /** The column; none of these is the last. */
  @PrimaryColumn('int')
  position: number;

  @Column('char', { length: 36, nullable: true })
  candidateId: string | null;

  @Column('varchar', { length: 160 })
  name: string;

  @Column('double')
  share: number;
}
