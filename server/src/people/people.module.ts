import { Module } from '@nestjs/common';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { ThrottlerModule } from '@nestjs/throttler';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { AttemptLimits } from './attempt-limits.js';
import { CentresController } from './centres.controller.js';
import { CentresService } from './centres.service.js';
import { ChangePeopleService } from './change-people.service.js';
import { InvitationsController } from './invitations.controller.js';
import { InvitationsService } from './invitations.service.js';
import { InvitePeopleService } from './invite-people.service.js';
import { MeController } from './me.controller.js';
import { MeService } from './me.service.js';
import { PasswordStrategy } from './password.strategy.js';
import { PasswordsService } from './passwords.service.js';
import { PeopleController } from './people.controller.js';
import { PeopleDirectory } from './people-directory.js';
import { PeopleList } from './people-list.js';
import { PersonRegister } from './person-register.js';
import { SessionController } from './session.controller.js';
import { SessionStrategy } from './session.strategy.js';
import { SessionsService } from './sessions.service.js';

const tokens = JwtModule.registerAsync({
  inject: [CONFIGURATION],
  useFactory: (configuration: Configuration) => ({
    secret: configuration.SESSION_SECRET,
    signOptions: { algorithm: 'HS256' as const },
    verifyOptions: { algorithms: ['HS256' as const] },
  }),
});

/** Who people are, how they come in, and what they may be given. */
@Module({
  imports: [PassportModule, tokens, ThrottlerModule.forRoot({ throttlers: [] })],
  controllers: [SessionController, MeController, PeopleController, InvitationsController, CentresController],
  providers: [
    AttemptLimits,
    PeopleDirectory,
    PeopleList,
    PersonRegister,
    PasswordsService,
    SessionsService,
    MeService,
    InvitationsService,
    InvitePeopleService,
    ChangePeopleService,
    CentresService,
    SessionStrategy,
    PasswordStrategy,
  ],
  exports: [
    PeopleDirectory,
    PasswordsService,
    SessionsService,
    PersonRegister,
    InvitationsService,
    CentresService,
  ],
})
export class PeopleModule {}
