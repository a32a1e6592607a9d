import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

/** A letter waiting to be sent, written in the transaction of what it tells of. */
@Entity('outbox_mail')
@Index(['sentAt', 'nextAttemptAt'])
export class OutboxMail {
  @PrimaryGeneratedColumn({ type: 'bigint', unsigned: true })
  id: string;

  @Column('varchar', { length: 254 })
  recipient: string;

  @Column('varchar', { length: 200 })
  subject: string;

  @Column('text')
  body: string;

  @Column('datetime', { precision: 3 })
  createdAt: Date;

  @Column('datetime', { precision: 3 })
  nextAttemptAt: Date;

  @Column('int', { default: 0 })
  attempts: number;

  @Column('datetime', { precision: 3, nullable: true })
  sentAt: Date | null;
}
