import { Body, Controller, Put } from '@nestjs/common';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { changePasswordSchema } from '@weighhouse/shared/contracts/people';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { MeService } from './me.service.js';

@Controller('api/me')
export class MeController {
  constructor(private readonly service: MeService) {}

  /** Changes one's password and signs out every other device. */
  @Put('password')
  @Access('signedIn')
  @Answers(doneSchema)
  async changePassword(
    @CurrentActor() actor: Actor,
    @Body({ schema: changePasswordSchema }) input: z.infer<typeof changePasswordSchema>,
  ) {
    await this.service.changePassword(actor, input.currentPassword, input.newPassword);
    return { done: true };
  }
}
