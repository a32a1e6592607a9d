import { Module } from '@nestjs/common';
import { PeopleModule } from '../people/people.module.js';
import { CaseAccess } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import { CaseDirectory } from './case-directory.js';
import { CaseFacts } from './case-facts.js';
import { TeamReader } from './team-reader.js';

const shared = [CaseAccess, CaseChanges, CaseDirectory, CaseFacts, TeamReader];

@Module({
  imports: [PeopleModule],
  providers: shared,
  exports: shared,
})
export class CasesModule {}
