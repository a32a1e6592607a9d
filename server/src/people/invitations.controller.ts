import { Body, Controller, Get, Param, Post } from '@nestjs/common';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import {
  acceptInvitationSchema,
  invitationParamsSchema,
  invitationSchema,
} from '@weighhouse/shared/contracts/people';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { InvitationsService } from './invitations.service.js';

type Params = z.infer<typeof invitationParamsSchema>;

/** The single-use link; whoever holds it is let in, so a token that works is the access check. */
@Controller('api/invitations/:token')
@Access('public')
export class InvitationsController {
  constructor(private readonly service: InvitationsService) {}

  @Get()
  @Answers(invitationSchema)
  read(@Param({ schema: invitationParamsSchema }) { token }: Params) {
    return this.service.read(token);
  }

  @Post()
  @Answers(doneSchema)
  async accept(
    @Param({ schema: invitationParamsSchema }) { token }: Params,
    @Body({ schema: acceptInvitationSchema }) input: z.infer<typeof acceptInvitationSchema>,
  ) {
    await this.service.accept(token, input.password);
    return { done: true };
  }
}
