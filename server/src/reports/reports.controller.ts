import { Controller, Delete, Get, Param, Post, Req, Res } from '@nestjs/common';
import { ApiBody, ApiConsumes } from '@nestjs/swagger';
import { caseParamsSchema, doneSchema } from '@weighhouse/shared/contracts/common';
import {
  type Report,
  reportListSchema,
  reportMediaTypes,
  reportParamsSchema,
  reportSchema,
} from '@weighhouse/shared/contracts/reports';
import type { Request, Response } from 'express';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers, AnswersFile } from '../platform/http/answers.decorator.js';
import { ReportContent } from './report-content.service.js';
import { ReportRemoval } from './report-removal.service.js';
import { ReportUploads } from './report-uploads.service.js';
import { ReportsService } from './reports.service.js';
import { sendReport } from './send-report.js';

const oneFile = {
  type: 'object',
  required: ['file'],
  properties: { file: { type: 'string', format: 'binary' } },
};

@Controller('api')
export class ReportsController {
  constructor(
    private readonly reports: ReportsService,
    private readonly uploads: ReportUploads,
    private readonly content: ReportContent,
    private readonly removal: ReportRemoval,
  ) {}

  /** Adds one file: PDF, JPEG, PNG or plain text, at most 25 MB. */
  @Post('cases/:caseId/reports')
  @Access('report.add')
  @ApiConsumes('multipart/form-data')
  @ApiBody({ schema: oneFile })
  @Answers(reportSchema, 201)
  add(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Report> {
    return this.uploads.receive(actor, caseId, request, response);
  }

  @Get('cases/:caseId/reports')
  @Access('report.read')
  @Answers(reportListSchema)
  list(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
  ): Promise<{ items: Report[] }> {
    return this.reports.list(actor, caseId);
  }

  /** The file itself, whole or a part of it. */
  @Get('reports/:reportId/content')
  @Access('report.read')
  @AnswersFile(...reportMediaTypes)
  async read(
    @CurrentActor() actor: Actor,
    @Param({ schema: reportParamsSchema }) { reportId }: { reportId: string },
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    await sendReport(await this.content.read(actor, reportId), request, response);
  }

  @Delete('reports/:reportId')
  @Access('report.remove')
  @Answers(doneSchema)
  async remove(
    @CurrentActor() actor: Actor,
    @Param({ schema: reportParamsSchema }) { reportId }: { reportId: string },
  ): Promise<{ done: true }> {
    await this.removal.remove(actor, reportId);
    return { done: true };
  }
}
