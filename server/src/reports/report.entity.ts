import { Column, Entity, Index, PrimaryColumn } from 'typeorm';
import { moment } from '../platform/database/columns.js';

/** One uploaded file. The content is in the file storage under a random key. */
@Entity('report')
@Index(['caseId', 'uploadedAt'])
export class ReportRow {
  @PrimaryColumn('char', { length: 36 })
  id: string;

  @Column('char', { length: 36 })
  caseId: string;

  /** The name as it was uploaded, made safe. */
  @Column('varchar', { length: 200 })
  fileName: string;

  @Column('varchar', { length: 60 })
  mediaType: string;

  @Column('int')
  sizeBytes: number;

  /** SHA-256 of the content, hexadecimal. */
  @Column('char', { length: 64 })
  sha256: string;

  @Column('varchar', { length: 80 })
  storageKey: string;

  @Column('char', { length: 36 })
  uploadedById: string;

  @Column(moment())
  uploadedAt: Date;

  /** Removed from the draft; the content is gone, the row stays. */
  @Column(moment({ nullable: true }))
  removedAt: Date | null;
}
