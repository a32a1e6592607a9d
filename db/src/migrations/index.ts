import type { MigrationInterface } from 'typeorm';
import { Initial1796000000000 } from './1796000000000-initial.js';
import { ProtectHistory1796000000001 } from './1796000000001-protect-history.js';

/** Every step of the schema, oldest first. */
export const migrations: (new () => MigrationInterface)[] = [
  Initial1796000000000,
  ProtectHistory1796000000001,
];
