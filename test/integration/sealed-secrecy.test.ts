import type { Differential } from '@weighhouse/shared/contracts/differential';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Answered, everyGet } from '../factories/every-get.js';
import {
  acceptedCase,
  handIn,
  type JudgedCase,
  openRound,
  readDifferential,
  savePrior,
  saveRow,
  seat,
  type SeatedPerson,
  unseal,
} from '../factories/judgements.js';
import { closeListeners, listen, type Listener, quietly } from '../factories/live.js';
import { type RunningApp, startApp } from '../setup/app.js';
import { mailbox } from '../setup/mailbox.js';

/** Numbers out of 100 that nobody else gives, and words that nobody else writes. */
const secretNumbers = [37.3, 18.9, 43.8, 91.7, 6.3, 13.1, 28.7, 81.9, 64.9];
const secretWords = 'whispered-reason';
const typedNumber = '77.13';

/** Keys that hold something drawn from judgements, wherever they stand. */
const drawnKeys = [
  'assessment',
  'others',
  'standing',
  'pooledPrior',
  'pooledCells',
  'own',
  'linearPool',
  'disagreementBits',
  'leader',
  'leaderName',
  'leaderShare',
  'range',
  'contributors',
  'outOf100',
  'prior',
  'typed',
  'drafts',
  'random',
  'document',
  'before',
];

// Every route is walked several times by six people.
const long = 300_000;

/** Opening an identity card stands in the trail; an export carries the moment at which it was made. */
const moving = /identity|export/;
/** The moment of asking, and when people were last seen at all: both move without anybody judging. */
const clockText = /"(?:now|lastSeenAt)":"[^"]+"/g;

let running: RunningApp;
let case_: JudgedCase;
let ann: SeatedPerson;
let ben: SeatedPerson;
let others: [string, SeatedPerson][];
let pages: Listener[];

beforeAll(async () => {
  running = await startApp();
  case_ = await acceptedCase(running);
  const [first, second] = case_.contributors;
  if (!first || !second) throw new Error('two contributors are needed');
  [ann, ben] = [first, second];
  others = [
    ['the chair', case_.chair],
    ['another contributor', ben],
    ['the referrer', case_.referrer],
    ['the liaison', case_.liaison],
    ['an administrator', await seat(running, 'administrator')],
    ['a stranger', await seat(running, ['chair', 'specialist'])],
  ];
  pages = await Promise.all(others.map(([, person]) => listen(running, person, case_.id)));
});
afterAll(async () => {
  closeListeners();
  await running.close();
});

/** A number as it may be written: out of 100, as a fraction, in thousandths. */
function spellings(outOf100: number): RegExp {
  const decimal = String(outOf100).replace('.', '\\.');
  const fraction = String(Math.round(outOf100 * 10)).padStart(3, '0');
  return new RegExp(`(?<![\\w.:-])(?:${decimal}|0\\.${fraction}\\d*|${String(Number(fraction))})(?![\\w.-])`);
}
const secrets = [...secretNumbers.map(spellings), new RegExp(secretWords), new RegExp(typedNumber)];

const walk = async (roundId: string, skip = /^$/): Promise<Map<string, Answered[]>> => {
  const ids = { caseId: case_.id, roundId, findingId: case_.findings[0]?.id ?? '', personId: ann.id };
  const answers = others.map(async ([who, { agent }]): Promise<[string, Answered[]]> => {
    const all = await everyGet(running, agent, ids, skip);
    return [who, all.map((answer) => ({ ...answer, text: answer.text.replace(clockText, '') }))];
  });
  return new Map(await Promise.all(answers));
};

/** Every key of an answer with its value, however deep. */
function entriesOf(value: unknown): [string, unknown][] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, part]) => [
    [key, part] as [string, unknown],
    ...entriesOf(part),
  ]);
}

function expectNoSecret(where: string, text: string): void {
  for (const secret of secrets)
    expect(secret.test(text), `${where} tells ${String(secret)}: ${text}`).toBe(false);
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}

async function judgeInSecret(person: SeatedPerson): Promise<void> {
  await savePrior(case_, person, secretNumbers.slice(0, 3), { reason: secretWords });
  await saveRow(case_, person, 0, secretNumbers.slice(3, 6), { reason: secretWords });
  await saveRow(case_, person, 1, secretNumbers.slice(6, 9));
  const { candidateSet } = await readDifferential(case_, person);
  const target = case_.findings[2]?.id ?? '';
  await person.agent
    .put(`/api/cases/${case_.id}/judgement/drafts/${target}`)
    .send({ target, candidateSet, exposure: null, typed: [[typedNumber]], reason: secretWords })
    .expect(200);
}

describe('a sealed round', () => {
  it(
    'keeps one person’s numbers from everybody else, on every route, push, mail and in every refusal',
    async () => {
      const round = await openRound(case_, 'sealed');
      await walk(round.id);
      const before = await walk(round.id, moving);
      for (const page of pages) page.heard.length = 0;

      await judgeInSecret(ann);
      await quietly();
      const after = await walk(round.id, moving);
      for (const [who] of others) {
        expect(after.get(who)?.length).toBeGreaterThan(15);
        // Not one byte, status or length differs from before anything was saved: revision, moments, trail, counts.
        expect(after.get(who), who).toEqual(before.get(who));
      }
      expect(pages.map((page) => page.heard)).toEqual(others.map(() => []));

      await savePrior(case_, ben, [20, 30, 50]);
      await handIn(round, ann);
      await quietly();
      const handedIn = await walk(round.id);
      for (const [who, answers] of handedIn) {
        for (const { route, text } of answers) {
          expectNoSecret(`${route} for ${who}`, text);
          if (who === 'another contributor' && /differential/.test(route)) continue;
          for (const [key, value] of entriesOf(jsonOf(text))) {
            if (!drawnKeys.includes(key) || (key === 'contributors' && typeof value === 'number')) continue;
            expect(value === null || value === 'sealed', `${route} for ${who} has ${key}`).toBe(true);
          }
        }
      }
      for (const page of pages) expectNoSecret('a push', JSON.stringify(page.heard));
      expect(pages.flatMap((page) => page.of('case.standing'))).toEqual([]);

      const { mine, ...rest } = await readDifferential(case_, ben);
      expect(mine?.prior?.outOf100).toEqual([20, 30, 50]);
      expect(mine?.findings).toEqual([]);
      const { assessment, others: numbers, before: mark, shownRound, sealed } = rest as Differential;
      expect([assessment, numbers, mark, shownRound, sealed]).toEqual([null, null, null, null, true]);

      for (const [who, person] of others) {
        const refusals = [
          await person.agent.post(`/api/rounds/${round.id}/unseal`).send({ reason: 'curious' }),
          await person.agent
            .put(`/api/cases/${case_.id}/judgement/prior`)
            .send({ candidateSet: 0, outOf100: [50, 50] }),
          await person.agent.post(`/api/rounds/${round.id}/hand-in`).send({ version: 99 }),
          await person.agent.post(`/api/cases/${case_.id}/conclude`).send({ password: 'not the password' }),
          await person.agent.get(`/api/cases/${case_.id}/panel`),
        ];
        for (const answer of refusals) {
          expect(answer.status, who).toBeGreaterThanOrEqual(400);
          expectNoSecret(`a refusal for ${who}`, answer.text);
        }
      }

      await running.outbox.flush();
      for (const mail of await mailbox().messages()) expectNoSecret('a mail', JSON.stringify(mail));

      // Nothing of it stands in the rows that lists, letters and the trail are made from.
      for (const table of ['case_file', 'audit_entry', 'outbox_mail', 'standing_share']) {
        const rows: unknown[] = await running.source.query(`SELECT * FROM ${table}`);
        const kept = rows.map((row) =>
          JSON.stringify(row, (_, value: unknown) => (value instanceof Date ? '' : value)),
        );
        expectNoSecret(
          table,
          kept.filter((row) => row.includes(case_.id) || table !== 'case_file').join('\n'),
        );
      }

      for (const person of case_.contributors.slice(1)) await handIn(round, person, { noMore: true });
      const last = await walk(round.id);
      await unseal(case_, round);
      const shown = await readDifferential(case_, case_.chair);
      // What the pool came to was nowhere before: every number of the assessment that is long enough to be told apart.
      const drawn = entriesOf(shown.assessment).flatMap(([, value]) =>
        typeof value === 'number' && String(value).length > 9 ? [String(value).slice(0, 9)] : [],
      );
      expect(drawn.length).toBeGreaterThan(10);
      const bensOwn = JSON.stringify((await readDifferential(case_, ben)).mine);
      for (const [who, answers] of last) {
        for (const { route, text } of answers) {
          for (const number of drawn) {
            if (who === 'another contributor' && bensOwn.includes(number)) continue;
            expect(text.includes(number), `${route} told ${who} ${number}`).toBe(false);
          }
        }
      }
      // And the search itself can find: now that it is unsealed, the numbers are there.
      expect(secretNumbers.every((number) => spellings(number).test(JSON.stringify(shown.others)))).toBe(
        true,
      );
    },
    long,
  );

  it(
    'keeps a later round’s numbers just the same, while those of the round before stay',
    async () => {
      const round = await openRound(case_, 'sealed');
      const shown = await walk(round.id, moving);
      for (const page of pages) page.heard.length = 0;
      await savePrior(case_, ann, [59.7, 22.9, 17.4], { reason: 'second-whisper' });
      await saveRow(case_, ann, 0, [97.9, 3.7, 52.3]);
      await quietly();
      expect(await walk(round.id, moving)).toEqual(shown);
      expect(pages.map((page) => page.heard)).toEqual(others.map(() => []));
      await handIn(round, ann);
      const later = [59.7, 22.9, 17.4, 97.9, 3.7, 52.3].map(spellings);
      for (const [who, answers] of await walk(round.id)) {
        for (const { route, text } of answers) {
          for (const secret of [...later, /second-whisper/])
            expect(secret.test(text), `${route} tells ${who} ${String(secret)}`).toBe(false);
        }
      }
    },
    long,
  );
});
