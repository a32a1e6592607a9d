import type { Readable } from 'node:stream';
import { Injectable, Logger } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { notFound, Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { ObjectStore } from '../platform/storage/object-store.js';
import type { ByteRange } from './byte-range.js';
import { ReportRow } from './report.entity.js';

/** A report that somebody may read, and its content when it is asked for. */
export interface ReadableReport {
  fileName: string;
  mediaType: string;
  sizeBytes: number;
  sha256: string;
  /** @throws Refusal 503 where the storage does not answer */
  open(range: ByteRange | null): Promise<Readable>;
}

@Injectable()
export class ReportContent {
  private readonly logger = new Logger(ReportContent.name);

  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly store: ObjectStore,
  ) {}

  async read(actor: Actor, reportId: string): Promise<ReadableReport> {
    const row = await this.source.manager.findOneBy(ReportRow, { id: reportId, removedAt: IsNull() });
    if (!row) throw notFound();
    await this.access.open(actor, row.caseId, 'report.read');
    return {
      fileName: row.fileName,
      mediaType: row.mediaType,
      sizeBytes: row.sizeBytes,
      sha256: row.sha256,
      open: (range) => this.stream(row.storageKey, range),
    };
  }

  private async stream(storageKey: string, range: ByteRange | null): Promise<Readable> {
    try {
      return await this.store.get(storageKey, range ?? undefined);
    } catch (error) {
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
      throw new Refusal(
        'unavailable',
        'The file storage does not answer. Open the report again in a moment.',
      );
    }
  }
}
