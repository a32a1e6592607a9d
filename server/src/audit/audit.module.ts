import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { DifferentialModule } from '../differential/differential.module.js';
import { PeopleModule } from '../people/people.module.js';
import { TrailController } from './trail.controller.js';
import { TrailService } from './trail.service.js';

/** Reads the trail that every domain writes. */
@Module({
  imports: [PeopleModule, CasesModule, DifferentialModule],
  controllers: [TrailController],
  providers: [TrailService],
})
export class AuditModule {}
