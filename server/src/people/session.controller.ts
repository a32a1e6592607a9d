import { Body, Controller, Delete, Get, Headers, Inject, Post, Req, Res, UseGuards } from '@nestjs/common';
import { doneSchema } from '@weighhouse/shared/contracts/common';
import { type Me, meSchema, type SignIn, signInSchema } from '@weighhouse/shared/contracts/people';
import type { Response } from 'express';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { MeService } from './me.service.js';
import { absoluteLifeMs, cookieOptions, sessionCookie } from './session-cookie.js';
import { type RequestWithPerson, SignInGuard } from './sign-in.guard.js';

/** Signing in and out. */
@Controller('api')
export class SessionController {
  constructor(
    private readonly service: MeService,
    @Inject(CONFIGURATION) private readonly configuration: Configuration,
  ) {}

  /** Signs in. The same answer for an unknown e-mail, a wrong password and somebody who may not come in. */
  @Post('session')
  @Access('public')
  @UseGuards(SignInGuard)
  @Answers(meSchema)
  async signIn(
    @Body({ schema: signInSchema }) _: SignIn,
    @Req() request: RequestWithPerson,
    @Headers('user-agent') userAgent: string | undefined,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Me> {
    const { token, me } = await this.service.signIn(request.user?.id ?? '', userAgent ?? '');
    response.cookie(sessionCookie, token, {
      ...cookieOptions(this.configuration.PUBLIC_URL),
      maxAge: absoluteLifeMs,
    });
    return me;
  }

  /** Who is signed in. */
  @Get('session')
  @Access('signedIn')
  @Answers(meSchema)
  me(@CurrentActor() actor: Actor): Promise<Me> {
    return this.service.me(actor.id);
  }

  @Delete('session')
  @Access('signedIn')
  @Answers(doneSchema)
  async signOut(@CurrentActor() actor: Actor, @Res({ passthrough: true }) response: Response) {
    await this.service.signOut(actor);
    response.clearCookie(sessionCookie, cookieOptions(this.configuration.PUBLIC_URL));
    return { done: true };
  }

  /** Signs out on every device. */
  @Delete('sessions')
  @Access('signedIn')
  @Answers(doneSchema)
  async signOutEverywhere(@CurrentActor() actor: Actor, @Res({ passthrough: true }) response: Response) {
    await this.service.signOutEverywhere(actor);
    response.clearCookie(sessionCookie, cookieOptions(this.configuration.PUBLIC_URL));
    return { done: true };
  }
}
