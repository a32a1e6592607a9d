import { Entity, PrimaryColumn } from 'typeorm';

/** A contributor who had not handed in when a round ended; written then, because teams change later. */
@Entity('round_absence')
export class RoundAbsence {
  @PrimaryColumn('char', { length: 36 })
  roundId: string;

  @PrimaryColumn('char', { length: 36 })
  personId: string;
}
