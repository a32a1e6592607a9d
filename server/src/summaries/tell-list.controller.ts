import { Controller, Get } from '@nestjs/common';
import { type TellList, tellListSchema } from '@weighhouse/shared/contracts/summaries';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { TellListService } from './tell-list.service.js';

@Controller('api/tell')
export class TellListController {
  constructor(private readonly service: TellListService) {}

  /** The cases of which one is the liaison. */
  @Get()
  @Access('signedIn')
  @Answers(tellListSchema)
  list(@CurrentActor() actor: Actor): Promise<TellList> {
    return this.service.list(actor);
  }
}
