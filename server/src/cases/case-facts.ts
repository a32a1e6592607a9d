import { Injectable } from '@nestjs/common';
import type { Case } from '@weighhouse/shared/contracts/cases';

type Counts = Case['counts'];
type Count = (caseId: string) => Promise<number>;

/** Later modules tell here how many of their things a case has, so that this module need not know them. */
@Injectable()
export class CaseFacts {
  private readonly counts = new Map<keyof Counts, Count>();

  register(name: keyof Counts, count: Count): void {
    this.counts.set(name, count);
  }

  async countsOf(caseId: string): Promise<Counts> {
    const count = async (name: keyof Counts): Promise<number> => (await this.counts.get(name)?.(caseId)) ?? 0;
    const [reports, findings, pending, candidates] = await Promise.all([
      count('reports'),
      count('findings'),
      count('pending'),
      count('candidates'),
    ]);
    return { reports, findings, pending, candidates };
  }
}
