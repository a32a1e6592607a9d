import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { PanelService } from '../differential/view/panel.service.js';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import type { Actor } from '../platform/http/actor.js';
import { differentialPdf } from './differential-pdf.js';
import { ExportReader } from './export-facts.js';
import { fhirBundle } from './fhir-bundle.js';
import { letterPdf } from './letter-pdf.js';

export type ExportFormat = 'pdf' | 'letter' | 'fhir' | 'panel';

/** A file to take away. */
export interface ExportFile {
  content: Buffer;
  mediaType: string;
  fileName: string;
}

const trailWords: Record<ExportFormat, string> = {
  pdf: 'took differential and plan out as PDF',
  letter: 'took the letter to the referrer out as PDF',
  fhir: 'took the case out as FHIR bundle',
  panel: 'took the panel out as JSON',
};

/** Takes what a person may see of a case out of the application. The patient stays a number, age and sex. */
@Injectable()
export class ExportService {
  constructor(
    private readonly access: CaseAccess,
    private readonly reader: ExportReader,
    private readonly panels: PanelService,
    private readonly audit: AuditLog,
    private readonly source: DataSource,
  ) {}

  /** @throws Refusal sealed for numbers of a sealed round; not-ready or wrong-state where there is nothing yet */
  async export(actor: Actor, caseId: string, format: ExportFormat): Promise<ExportFile> {
    const { file } = await this.access.open(actor, caseId, 'export.read');
    const made = await this.make(actor, caseId, format);
    await this.audit.record(this.source.manager, {
      caseId,
      actorId: actor.id,
      action: 'case.exported',
      sentence: trailWords[format],
    });
    const ending = made.mediaType === 'application/pdf' ? 'pdf' : 'json';
    return { ...made, fileName: `${file.number}-${format}.${ending}` };
  }

  private async make(
    actor: Actor,
    caseId: string,
    format: ExportFormat,
  ): Promise<Omit<ExportFile, 'fileName'>> {
    if (format === 'panel') {
      const panel = await this.panels.read(actor, caseId);
      return { content: json(panel), mediaType: 'application/json' };
    }
    const facts = await this.reader.read(actor, caseId);
    if (format === 'fhir') return { content: json(fhirBundle(facts)), mediaType: 'application/fhir+json' };
    const content = format === 'pdf' ? await differentialPdf(facts) : await letterPdf(facts);
    return { content, mediaType: 'application/pdf' };
  }
}

const json = (value: unknown): Buffer => Buffer.from(`${JSON.stringify(value, null, 2)}\n`);
