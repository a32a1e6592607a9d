import type { DataSourceOptions } from 'typeorm';

/** How every process of ours speaks to MariaDB: UTC, utf8mb4, and never a schema made up at start. */
export function databaseOptions(
  url: string,
  entities: NonNullable<DataSourceOptions['entities']>,
): DataSourceOptions {
  return {
    type: 'mariadb',
    url,
    entities,
    timezone: 'Z',
    // A calendar day stays the text it is: as a Date it would be yesterday in zones west of Greenwich.
    dateStrings: ['DATE'],
    charset: 'utf8mb4',
    supportBigNumbers: true,
    bigNumberStrings: true,
    synchronize: false,
    migrationsTransactionMode: 'each',
    extra: { connectionLimit: 20 },
  };
}
