import type { MigrationInterface } from 'typeorm';
import { Initial1796000000000 } from './1796000000000-initial.js';
import { ProtectHistory1796000000001 } from './1796000000001-protect-history.js';
import { Agenda1796130947922 } from './1796130947922-agenda.js';

/** Every step of the schema, oldest first. */
export const migrations: (new () => MigrationInterface)[] = [
  Initial1796000000000,
  ProtectHistory1796000000001,
  Agenda1796130947922,
];
