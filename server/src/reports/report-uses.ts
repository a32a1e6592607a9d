import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';

type Uses = (reportId: string, em: EntityManager) => Promise<boolean>;

/** Later modules tell here whether something of theirs rests on a report, so that this module need not know them. */
@Injectable()
export class ReportUses {
  private readonly all: Uses[] = [];

  register(uses: Uses): void {
    this.all.push(uses);
  }

  async isUsed(reportId: string, em: EntityManager): Promise<boolean> {
    for (const uses of this.all) if (await uses(reportId, em)) return true;
    return false;
  }
}
