import type { MigrationInterface, QueryRunner } from 'typeorm';

export class Agenda1796130947922 implements MigrationInterface {
  name = 'Agenda1796130947922';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(
      `CREATE TABLE \`agenda_item\` (\`findingId\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`version\` int NOT NULL, \`note\` varchar(1000) NOT NULL, \`addedById\` char(36) NOT NULL, \`addedAt\` datetime(3) NOT NULL, INDEX \`IDX_69d5106aca4cf6befda8751845\` (\`caseId\`), PRIMARY KEY (\`findingId\`)) ENGINE=InnoDB`,
    );
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`DROP INDEX \`IDX_69d5106aca4cf6befda8751845\` ON \`agenda_item\``);
    await runner.query(`DROP TABLE \`agenda_item\``);
  }
}
