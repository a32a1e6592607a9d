import { Injectable } from '@nestjs/common';

type Count = (caseId: string) => Promise<number>;

/** Later modules tell here how many of their things a case has, so that this module need not know them. */
@Injectable()
export class CaseFacts {
  private readonly counts = new Map<string, Count>();

  register(name: 'reports' | 'findings' | 'candidates', count: Count): void {
    this.counts.set(name, count);
  }

  async countsOf(caseId: string): Promise<{ reports: number; findings: number; candidates: number }> {
    const count = async (name: string): Promise<number> => (await this.counts.get(name)?.(caseId)) ?? 0;
    const [reports, findings, candidates] = await Promise.all(
      ['reports', 'findings', 'candidates'].map(count),
    );
    return { reports: reports ?? 0, findings: findings ?? 0, candidates: candidates ?? 0 };
  }
}
