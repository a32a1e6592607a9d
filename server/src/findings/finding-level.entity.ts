import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The name of one level of a finding; a plain finding has two, absent and present. */
@Entity('finding_level')
export class FindingLevel {
  @PrimaryColumn('char', { length: 36 })
  findingId: string;

  /** 0 to 5. */
  @PrimaryColumn('int')
  position: number;

  @Column('varchar', { length: 80 })
  label: string;
}
