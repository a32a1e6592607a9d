import { Module } from '@nestjs/common';
import { CaseAccess } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import { CaseFacts } from './case-facts.js';

@Module({
  providers: [CaseAccess, CaseChanges, CaseFacts],
  exports: [CaseAccess, CaseChanges, CaseFacts],
})
export class CasesModule {}
