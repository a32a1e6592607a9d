import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Tables that only grow. */
const growing = [
  'audit_entry',
  'judgement_version',
  'judgement_value',
  'hand_in',
  'round_absence',
  'standing_snapshot',
  'standing_share',
  'settings_change',
  'plan_stance',
  'contact',
  'outcome',
];

const refuse = (words: string): string => `SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = '${words}'`;
const signedPlan = (id: string): string =>
  `EXISTS (SELECT 1 FROM plan WHERE plan.id = ${id} AND plan.signedAt IS NOT NULL)`;
const when = (condition: string, words: string): string => `IF ${condition} THEN ${refuse(words)}; END IF`;

/** Of a signed plan's action, that it is done can be written, once; what was agreed stays. */
const actionChanged = ['planId', 'position', 'what', 'ownerId', 'due', 'concernsPatient']
  .map((column) => `NOT (OLD.${column} <=> NEW.${column})`)
  .concat('OLD.doneAt IS NOT NULL')
  .join(' OR ');

const triggers: [name: string, on: string, body: string][] = [
  ...growing.flatMap((table): [string, string, string][] => [
    [`${table}_stays`, `BEFORE UPDATE ON ${table}`, refuse('history is not changed')],
    [`${table}_remains`, `BEFORE DELETE ON ${table}`, refuse('history is not removed')],
  ]),
  ['plan_stays', 'BEFORE UPDATE ON plan', when('OLD.signedAt IS NOT NULL', 'a signed plan is not changed')],
  ['plan_remains', 'BEFORE DELETE ON plan', when('OLD.signedAt IS NOT NULL', 'a signed plan is not removed')],
  [
    'plan_action_joins',
    'BEFORE INSERT ON plan_action',
    when(signedPlan('NEW.planId'), 'a signed plan is not changed'),
  ],
  [
    'plan_action_stays',
    'BEFORE UPDATE ON plan_action',
    when(`${signedPlan('OLD.planId')} AND (${actionChanged})`, 'a signed plan is not changed'),
  ],
  [
    'plan_action_remains',
    'BEFORE DELETE ON plan_action',
    when(signedPlan('OLD.planId'), 'a signed plan is not changed'),
  ],
];

/** The database itself refuses to rewrite history, whatever the application does. */
export class ProtectHistory1796000000001 implements MigrationInterface {
  name = 'ProtectHistory1796000000001';

  async up(runner: QueryRunner): Promise<void> {
    for (const [name, on, body] of triggers) {
      await runner.query(`CREATE TRIGGER ${name} ${on} FOR EACH ROW ${body}`);
    }
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const [name] of triggers) await runner.query(`DROP TRIGGER ${name}`);
  }
}
