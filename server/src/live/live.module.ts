import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { DifferentialModule } from '../differential/differential.module.js';
import { PeopleModule } from '../people/people.module.js';
import { Audiences } from './audience.js';
import { LiveHandshake } from './handshake.js';
import { LiveGateway } from './live.gateway.js';
import { LivePushes } from './live-pushes.js';
import { LiveRooms } from './live-rooms.js';

/** Live changes on open pages. It listens to all domains; none of them knows it. */
@Module({
  imports: [PeopleModule, CasesModule, DifferentialModule],
  providers: [LiveGateway, LivePushes, LiveRooms, LiveHandshake, Audiences],
})
export class LiveModule {}
