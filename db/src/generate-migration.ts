import 'reflect-metadata';
import { writeFile } from 'node:fs/promises';
import path from 'node:path';
import { makeDataSource } from './data-source.js';

/**
 * Writes the next migration: what the entities have and the migrated database of DATABASE_URL does not.
 * Usage: DATABASE_URL=mysql://… node db/dist/generate-migration.js AddSomething
 */
const [name] = process.argv.slice(2);
const url = process.env['DATABASE_URL'];
if (!url || !name || !/^[A-Z][A-Za-z0-9]+$/.test(name)) {
  process.stderr.write('Give DATABASE_URL and the name of the change, like AddSomething.\n');
  process.exit(1);
}
const source = await makeDataSource(url).initialize();
await source.runMigrations();
const { upQueries, downQueries } = await source.driver.createSchemaBuilder().log();
await source.destroy();
if (upQueries.length === 0) {
  process.stdout.write('Nothing differs.\n');
  process.exit(0);
}
const stamp = String(Date.now());
const statement = ({ query }: { query: string }): string => `    await runner.query(${quoted(query)});`;
const text = `import type { MigrationInterface, QueryRunner } from 'typeorm';

export class ${name}${stamp} implements MigrationInterface {
  name = '${name}${stamp}';

  async up(runner: QueryRunner): Promise<void> {
${upQueries.map(statement).join('\n')}
  }

  async down(runner: QueryRunner): Promise<void> {
${downQueries.map(statement).reverse().join('\n')}
  }
}
`;
const file = path.resolve(import.meta.dirname, '../src/migrations', `${stamp}-${kebab(name)}.ts`);
await writeFile(file, text);
process.stdout.write(`Wrote ${file}. Format it, list it in migrations/index.ts and read it.\n`);

function quoted(query: string): string {
  return `\`${query.replaceAll('\\', '\\\\').replaceAll('`', '\\`').replaceAll('${', '\\${')}\``;
}

function kebab(words: string): string {
  return words.replace(/(?<!^)([A-Z])/g, '-$1').toLowerCase();
}
