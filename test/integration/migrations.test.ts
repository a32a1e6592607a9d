import { randomUUID } from 'node:crypto';
import { makeDataSource } from '@weighhouse/db/data-source';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DataSource } from 'typeorm';
import { type FreshDatabase, freshDatabase } from '../setup/fresh-database.js';

describe('the migrations', () => {
  let database: FreshDatabase;
  let source: DataSource;

  beforeAll(async () => {
    database = await freshDatabase();
    source = await makeDataSource(database.url).initialize();
    await source.runMigrations();
  });
  afterAll(async () => {
    await source.destroy();
    await database.drop();
  });

  it('leave no difference between the database and the entities', async () => {
    const { upQueries } = await source.driver.createSchemaBuilder().log();
    expect(upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('leave nothing to do when they are run again', async () => {
    expect(await source.runMigrations()).toEqual([]);
  });

  it('refuse to change or remove a line of the trail', async () => {
    await source.query(
      `INSERT INTO audit_entry (at, action, sentence) VALUES (NOW(3), 'case.submitted', 'submitted the case')`,
    );
    await expect(source.query(`UPDATE audit_entry SET sentence = 'did nothing'`)).rejects.toThrow(
      'history is not changed',
    );
    await expect(source.query('DELETE FROM audit_entry')).rejects.toThrow('history is not removed');
    expect(await source.query('SELECT sentence FROM audit_entry')).toEqual([
      { sentence: 'submitted the case' },
    ]);
  });

  it('refuse to change a saved number', async () => {
    await source.query(
      `INSERT INTO judgement_value (judgementVersionId, candidateId, level, thousandths) VALUES (?, ?, 1, 300)`,
      [randomUUID(), randomUUID()],
    );
    await expect(source.query('UPDATE judgement_value SET thousandths = 900')).rejects.toThrow(
      'history is not changed',
    );
  });

  describe('with a signed plan', () => {
    const planId = randomUUID();
    const actionId = randomUUID();

    beforeAll(async () => {
      await source.query(
        `INSERT INTO plan (id, caseId, number, version, workingDiagnosis, remainingDoubt, safetyNet, changedAt, changedById)
         VALUES (?, ?, 1, 1, 'A', 'B', 'C', NOW(3), ?)`,
        [planId, randomUUID(), randomUUID()],
      );
      await source.query(
        `INSERT INTO plan_action (id, planId, position, what, concernsPatient) VALUES (?, ?, 0, 'biopsy', 0)`,
        [actionId, planId],
      );
      await source.query('UPDATE plan SET signedAt = NOW(3) WHERE id = ?', [planId]);
    });

    it.each([
      [`UPDATE plan SET workingDiagnosis = 'D'`],
      ['UPDATE plan SET signedAt = NULL'],
      ['DELETE FROM plan'],
      [`UPDATE plan_action SET what = 'nothing'`],
      ['DELETE FROM plan_action'],
      [
        `INSERT INTO plan_action (id, planId, position, what, concernsPatient) VALUES (UUID(), '${planId}', 1, 'more', 0)`,
      ],
    ])('refuse %s', async (statement) => {
      await expect(source.query(statement)).rejects.toThrow(/a signed plan is not (changed|removed)/);
    });

    it('let an action be reported done once', async () => {
      await source.query(`UPDATE plan_action SET doneAt = NOW(3), doneWords = 'taken' WHERE id = ?`, [
        actionId,
      ]);
      await expect(
        source.query(`UPDATE plan_action SET doneWords = 'not taken' WHERE id = ?`, [actionId]),
      ).rejects.toThrow('a signed plan is not changed');
    });
  });
});
