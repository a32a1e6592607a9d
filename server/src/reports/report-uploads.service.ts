import { createHash, randomUUID } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Injectable, Logger } from '@nestjs/common';
import type { Report } from '@weighhouse/shared/contracts/reports';
import type { Request, Response } from 'express';
import { CaseAccess } from '../cases/case-access.js';
import { ObjectStore } from '../platform/storage/object-store.js';
import { invalid, Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { safeFileName } from './file-name.js';
import { type ReceivedFile, receiveUpload } from './receive-upload.js';
import { recognise } from './recognise.js';
import { ReportRegister } from './report-register.js';

/** Takes files in: nothing is kept of one that is refused or that broke off. */
@Injectable()
export class ReportUploads {
  private readonly logger = new Logger(ReportUploads.name);

  constructor(
    private readonly access: CaseAccess,
    private readonly register: ReportRegister,
    private readonly store: ObjectStore,
  ) {}

  /**
   * Reads one file of a multipart request. Who may not add reports is refused before a byte is taken.
   * @throws Refusal 400 without a file or for an empty one, 413 beyond 25 MB, 415 for another kind of content
   */
  async receive(actor: Actor, caseId: string, request: Request, response: Response): Promise<Report> {
    await this.access.open(actor, caseId, 'report.add');
    return inFolder(async (directory) => {
      const file = await receiveUpload(request, response, directory);
      return this.keep(actor, caseId, file, () => !response.destroyed);
    });
  }

  /** Adds a file whose content is at hand. */
  async add(
    actor: Actor,
    caseId: string,
    report: { fileName: string; mediaType: string; content: Buffer },
  ): Promise<Report> {
    await this.access.open(actor, caseId, 'report.add');
    return inFolder(async (directory) => {
      const target = path.join(directory, 'content');
      await writeFile(target, report.content, { mode: 0o600 });
      return this.keep(actor, caseId, {
        path: target,
        fileName: safeFileName(report.fileName),
        declared: report.mediaType,
        sizeBytes: report.content.length,
        sha256: createHash('sha256').update(report.content).digest('hex'),
      });
    });
  }

  private async keep(
    actor: Actor,
    caseId: string,
    file: ReceivedFile,
    wanted: () => boolean = () => true,
  ): Promise<Report> {
    if (file.sizeBytes === 0) {
      throw invalid([
        { path: 'file', message: `“${file.fileName}” is empty. Look at the original and add it again.` },
      ]);
    }
    const { mediaType } = await recognise(file.path, file.fileName, file.declared);
    const storageKey = `reports/${randomUUID()}`;
    try {
      await this.put(storageKey, file.path, mediaType);
      return await this.register.enter(actor, caseId, { ...file, mediaType, storageKey }, wanted);
    } catch (error) {
      await this.store.remove(storageKey).catch((failure: unknown) => {
        this.logger.warn(`content ${storageKey} stayed behind: ${String(failure)}`);
      });
      throw error;
    }
  }

  private async put(storageKey: string, file: string, mediaType: string): Promise<void> {
    try {
      await this.store.put(storageKey, createReadStream(file), mediaType);
    } catch (error) {
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
      throw new Refusal('unavailable', 'The file storage does not answer. Add the file again in a moment.');
    }
  }
}

/** Gives a folder that is gone afterwards, whatever happened. */
async function inFolder<T>(task: (directory: string) => Promise<T>): Promise<T> {
  const directory = await mkdtemp(path.join(tmpdir(), 'weighhouse-upload-'));
  try {
    return await task(directory);
  } finally {
    await rm(directory, { recursive: true, force: true });
  }
}
