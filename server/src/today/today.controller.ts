import { Controller, Get } from '@nestjs/common';
import { type Today, todaySchema } from '@weighhouse/shared/contracts/today';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { TodayService } from './today.service.js';

@Controller('api/today')
export class TodayController {
  constructor(private readonly service: TodayService) {}

  /** What waits for one, oldest first. */
  @Get()
  @Access('signedIn')
  @Answers(todaySchema)
  read(@CurrentActor() actor: Actor): Promise<Today> {
    return this.service.read(actor);
  }
}
