import { Body, Controller, Param, Post } from '@nestjs/common';
import {
  type Accept,
  acceptSchema,
  type Case,
  caseSchema,
  submitSchema,
  wordsInputSchema,
} from '@weighhouse/shared/contracts/cases';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { AcceptService } from './accept.service.js';
import { ChairMoves } from './chair-moves.service.js';
import { ReferrerMoves } from './referrer-moves.service.js';

interface OnCase {
  caseId: string;
}
interface Words {
  words: string;
}

/** The moves of a case's life. Each answers the case as it stands afterwards. */
@Controller('api/cases/:caseId')
export class CaseMovesController {
  constructor(
    private readonly referrer: ReferrerMoves,
    private readonly chair: ChairMoves,
    private readonly acceptance: AcceptService,
  ) {}

  @Post('submit')
  @Access('case.submit')
  @Answers(caseSchema)
  submit(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: OnCase,
    @Body({ schema: submitSchema }) { words }: { words?: string },
  ): Promise<Case> {
    return this.referrer.submit(actor, caseId, words);
  }

  @Post('withdraw')
  @Access('case.withdraw')
  @Answers(caseSchema)
  withdraw(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: OnCase,
    @Body({ schema: wordsInputSchema }) { words }: Words,
  ): Promise<Case> {
    return this.referrer.withdraw(actor, caseId, words);
  }

  @Post('return')
  @Access('case.return')
  @Answers(caseSchema)
  return(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: OnCase,
    @Body({ schema: wordsInputSchema }) { words }: Words,
  ): Promise<Case> {
    return this.chair.make(actor, caseId, 'return', words);
  }

  @Post('decline')
  @Access('case.decline')
  @Answers(caseSchema)
  decline(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: OnCase,
    @Body({ schema: wordsInputSchema }) { words }: Words,
  ): Promise<Case> {
    return this.chair.make(actor, caseId, 'decline', words);
  }

  @Post('accept')
  @Access('case.accept')
  @Answers(caseSchema)
  accept(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: OnCase,
    @Body({ schema: acceptSchema }) input: Accept,
  ): Promise<Case> {
    return this.acceptance.accept(actor, caseId, input);
  }

  @Post('reopen')
  @Access('case.reopen')
  @Answers(caseSchema)
  reopen(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: OnCase,
    @Body({ schema: wordsInputSchema }) { words }: Words,
  ): Promise<Case> {
    return this.chair.make(actor, caseId, 'reopen', words);
  }
}
