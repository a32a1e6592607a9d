import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Centre } from '@weighhouse/shared/contracts/people';
import { DataSource, type EntityManager } from 'typeorm';
import { AuditLog } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CentreRow } from './centre.entity.js';
import { isDuplicate } from './person-register.js';

/** The hospitals, clinics and practices of the network. */
@Injectable()
export class CentresService {
  constructor(
    private readonly source: DataSource,
    private readonly clock: Clock,
    private readonly work: UnitOfWork,
    private readonly audit: AuditLog,
  ) {}

  list(): Promise<Centre[]> {
    return this.source.manager.find(CentreRow, { order: { name: 'ASC' } });
  }

  /** The guard has asked for the administrator's role. @throws Refusal duplicate for a code that is taken */
  add(actor: Actor, input: { code: string; name: string }): Promise<Centre> {
    return this.work.run(async ({ em }) => {
      const centre = await insertCentre(em, input, this.clock.now());
      await this.audit.record(em, {
        actorId: actor.id,
        action: 'centre.added',
        sentence: `added the centre ${input.name}`,
      });
      return centre;
    });
  }
}

/** @throws Refusal duplicate for a code that is taken */
export async function insertCentre(
  em: EntityManager,
  input: { code: string; name: string },
  now: Date,
): Promise<Centre> {
  const centre = { id: randomUUID(), code: input.code, name: input.name };
  await em.insert(CentreRow, { ...centre, createdAt: now }).catch((error: unknown) => {
    throw isDuplicate(error) ? new Refusal('duplicate', 'A centre with this code is there already.') : error;
  });
  return centre;
}
