import type { Role } from '@weighhouse/shared/contracts/people';
import { Entity, Index, PrimaryColumn } from 'typeorm';

/** One of the roles that a person holds. */
@Entity('person_role')
@Index(['role'])
export class PersonRole {
  @PrimaryColumn('char', { length: 36 })
  personId: string;

  @PrimaryColumn('varchar', { length: 16 })
  role: Role;
}
