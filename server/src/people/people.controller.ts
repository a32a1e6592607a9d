import { Body, Controller, Get, Param, Patch, Post, Query } from '@nestjs/common';
import {
  type ChangePerson,
  changePersonSchema,
  type InvitePerson,
  invitePersonSchema,
  type Person,
  personListSchema,
  personParamsSchema,
  personQuerySchema,
  personSchema,
} from '@weighhouse/shared/contracts/people';
import type { z } from 'zod';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { ChangePeopleService } from './change-people.service.js';
import { InvitePeopleService } from './invite-people.service.js';
import { PeopleList } from './people-list.js';

@Controller('api/people')
export class PeopleController {
  constructor(
    private readonly people: PeopleList,
    private readonly invitations: InvitePeopleService,
    private readonly changes: ChangePeopleService,
  ) {}

  @Get()
  @Access('people.list')
  @Answers(personListSchema)
  async list(
    @CurrentActor() actor: Actor,
    @Query({ schema: personQuerySchema }) query: z.infer<typeof personQuerySchema>,
  ): Promise<{ items: Person[] }> {
    return { items: await this.people.list(actor, query) };
  }

  @Post()
  @Access('people.manage')
  @Answers(personSchema, 201)
  invite(
    @CurrentActor() actor: Actor,
    @Body({ schema: invitePersonSchema }) input: InvitePerson,
  ): Promise<Person> {
    return this.invitations.invite(actor, input);
  }

  @Patch(':personId')
  @Access('people.manage')
  @Answers(personSchema)
  change(
    @CurrentActor() actor: Actor,
    @Param({ schema: personParamsSchema }) { personId }: z.infer<typeof personParamsSchema>,
    @Body({ schema: changePersonSchema }) input: ChangePerson,
  ): Promise<Person> {
    return this.changes.change(actor, personId, input);
  }

  /** Sends a new link. */
  @Post(':personId/invite')
  @Access('people.manage')
  @Answers(personSchema)
  inviteAgain(
    @CurrentActor() actor: Actor,
    @Param({ schema: personParamsSchema }) { personId }: z.infer<typeof personParamsSchema>,
  ): Promise<Person> {
    return this.invitations.inviteAgain(actor, personId);
  }
}
