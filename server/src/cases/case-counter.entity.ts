import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The running number of each year. */
@Entity('case_counter')
export class CaseCounter {
  @PrimaryColumn('int')
  year: number;

  @Column('int')
  last: number;
}
