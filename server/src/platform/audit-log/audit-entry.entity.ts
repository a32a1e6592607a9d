import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** One line of the trail. Rows are only ever added; triggers refuse to change or delete them. */
@Entity('audit_entry')
@Index(['caseId', 'id'])
export class AuditEntry {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id: string;

  @Column('datetime', { precision: 3 })
  at: Date;

  @Column('char', { length: 36, nullable: true })
  caseId: string | null;

  @Column('char', { length: 36, nullable: true })
  actorId: string | null;

  /** A stable word, like case.submitted. */
  @Column('varchar', { length: 60 })
  action: string;

  /** The rest of the sentence that begins with the actor's name. */
  @Column('text')
  sentence: string;

  /** Set for acts within a sealed round that only the actor may see before it is unsealed. */
  @Column('char', { length: 36, nullable: true })
  sealedRoundId: string | null;
}
