import { Inject, Injectable } from '@nestjs/common';
import { type Identity, identitySchema } from '@weighhouse/shared/contracts/summaries';
import type { EntityManager } from 'typeorm';
import { type Configuration, CONFIGURATION } from '../platform/config/configuration.js';
import { closeBox, openBox } from '../platform/crypto/identity-box.js';
import { Clock } from '../platform/clock/clock.js';
import { IdentityCardRow } from './identity-card.entity.js';

export type Card = NonNullable<Identity['card']>;

const cardSchema = identitySchema.shape.card.unwrap();

/** Identity cards at rest. */
@Injectable()
export class IdentityBoxes {
  private readonly key: Buffer;

  constructor(
    private readonly clock: Clock,
    @Inject(CONFIGURATION) configuration: Configuration,
  ) {
    this.key = Buffer.from(configuration.IDENTITY_KEY, 'hex');
  }

  /** @throws Error when the key is another one or the box was changed or moved */
  async open(em: EntityManager, caseId: string): Promise<{ version: number; card: Card } | null> {
    const row = await em.findOneBy(IdentityCardRow, { caseId });
    if (!row) return null;
    return { version: row.version, card: cardSchema.parse(JSON.parse(openBox(this.key, row.box, caseId))) };
  }

  /** @returns whether the version was still the one that is there */
  async close(
    em: EntityManager,
    caseId: string,
    personId: string,
    version: number,
    card: Card,
  ): Promise<boolean> {
    const row = {
      caseId,
      version: version + 1,
      box: closeBox(this.key, JSON.stringify(card), caseId),
      changedAt: this.clock.now(),
      changedById: personId,
    };
    if (version === 0) {
      if (await em.existsBy(IdentityCardRow, { caseId })) return false;
      await em.insert(IdentityCardRow, row);
      return true;
    }
    return (await em.update(IdentityCardRow, { caseId, version }, row)).affected === 1;
  }
}
