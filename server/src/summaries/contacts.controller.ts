import { Body, Controller, Param, Post } from '@nestjs/common';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import {
  type ContactInput,
  contactInputSchema,
  type Summary,
  summarySchema,
} from '@weighhouse/shared/contracts/summaries';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { ContactsService } from './contacts.service.js';

type Params = z.infer<typeof caseParamsSchema>;

@Controller('api/cases/:caseId/summary')
@Access('summary.tell')
export class ContactsController {
  constructor(private readonly service: ContactsService) {}

  /** The contact in which the approved summary was told. */
  @Post('told')
  @Answers(summarySchema)
  tell(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: contactInputSchema }) input: ContactInput,
  ): Promise<Summary> {
    return this.service.tell(actor, caseId, input);
  }

  /** An attempt, or a contact about something else. */
  @Post('contacts')
  @Answers(summarySchema)
  log(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: Params,
    @Body({ schema: contactInputSchema }) input: ContactInput,
  ): Promise<Summary> {
    return this.service.log(actor, caseId, input);
  }
}
