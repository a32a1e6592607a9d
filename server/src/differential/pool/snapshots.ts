import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';

/** Reads at one moment: what others commit meanwhile is not seen half. */
@Injectable()
export class Snapshots {
  constructor(private readonly source: DataSource) {}

  run<T>(read: (em: EntityManager) => Promise<T>): Promise<T> {
    return this.source.transaction('REPEATABLE READ', read);
  }
}
