import type { MigrationInterface } from 'typeorm';

/** Every step of the schema, oldest first. */
export const migrations: (new () => MigrationInterface)[] = [];
