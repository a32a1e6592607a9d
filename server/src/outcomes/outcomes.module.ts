import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { FindingsModule } from '../findings/findings.module.js';
import { PeopleModule } from '../people/people.module.js';
import { OutcomeRegister } from './outcome-register.js';
import { OutcomesController } from './outcomes.controller.js';
import { OutcomesService } from './outcomes.service.js';

/** What the illness turned out to be, how that is known, and when. */
@Module({
  imports: [PeopleModule, CasesModule, FindingsModule],
  controllers: [OutcomesController],
  providers: [OutcomeRegister, OutcomesService],
  exports: [OutcomesService, OutcomeRegister],
})
export class OutcomesModule {}
