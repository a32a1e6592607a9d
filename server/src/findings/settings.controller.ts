import { Body, Controller, Param, Patch } from '@nestjs/common';
import {
  type ChangeSettings,
  changeSettingsSchema,
  type Settings,
  settingsSchema,
} from '@weighhouse/shared/contracts/cases';
import { caseParamsSchema } from '@weighhouse/shared/contracts/common';
import { Access } from '../platform/http/access.decorator.js';
import { type Actor, CurrentActor } from '../platform/http/actor.js';
import { Answers } from '../platform/http/answers.decorator.js';
import { ChangeSettingsService } from './change-settings.service.js';

@Controller('api/cases/:caseId/settings')
export class SettingsController {
  constructor(private readonly settings: ChangeSettingsService) {}

  @Patch()
  @Access('settings.change')
  @Answers(settingsSchema)
  change(
    @CurrentActor() actor: Actor,
    @Param({ schema: caseParamsSchema }) { caseId }: { caseId: string },
    @Body({ schema: changeSettingsSchema }) input: ChangeSettings,
  ): Promise<Settings> {
    return this.settings.change(actor, caseId, input);
  }
}
