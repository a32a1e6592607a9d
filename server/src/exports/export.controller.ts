import { Controller, Get, Header, Param, Query, StreamableFile } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { exportQuerySchema } from '@weighhouse/shared/contracts/outcomes';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { AnswersFile } from '../platform/http/answers.decorator.js';
import { caution } from './caution.js';
import { ExportService } from './export.service.js';

@Controller('api/cases/:caseId/export')
export class ExportController {
  constructor(private readonly service: ExportService) {}

  /** Differential and plan or the letter to the referrer as PDF, the case as FHIR R4 bundle, or the panel as JSON. */
  @Get()
  @Access('export.read')
  @AnswersFile('application/pdf', 'application/fhir+json', 'application/json')
  // The panel is exactly what the method takes, so the caution cannot stand in it.
  @Header('X-Caution', caution.replaceAll('’', "'"))
  async export(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: z.infer<typeof caseParamsSchema>,
    @Query({ schema: exportQuerySchema }) { format }: z.infer<typeof exportQuerySchema>,
  ): Promise<StreamableFile> {
    const { content, mediaType, fileName } = await this.service.export(actor, caseId, format);
    return new StreamableFile(content, {
      type: mediaType,
      disposition: `attachment; filename="${fileName}"`,
      length: content.length,
    });
  }
}
