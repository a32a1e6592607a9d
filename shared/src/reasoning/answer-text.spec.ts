import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { answerTo } from './answer-text.js';

const panel = '{"candidates":["a"],"contributors":[{"id":"__proto__","prior":[0.5,0.5]}]}';

describe('a panel as text', () => {
  it('is answered', () => {
    const { answer, refused } = answerTo(panel);
    expect(refused).toBe(false);
    expect(JSON.stringify(answer)).toContain('"standing":[0.5,0.5]');
    expect(JSON.stringify(answer)).toContain('"own":{"__proto__":[0.5,0.5]}');
  });

  it('may begin with a byte order mark', () => expect(answerTo(`\uFEFF${panel}`).refused).toBe(false));

  it.each(['', '{', 'panel', '{"candidates":["a"],}', 'NaN'])(
    'is refused at the empty path when it is %j',
    (text) => {
      expect(answerTo(text)).toEqual({
        answer: { errors: [{ path: '', message: 'is not JSON' }] },
        refused: true,
      });
    },
  );

  it('is refused with every fault', () => {
    const { answer, refused } = answerTo('{"candidates":["a","a"],"tempering":9}');
    expect(refused).toBe(true);
    expect(answer).toHaveProperty('errors.length', 2);
  });
});

describe('the command', () => {
  const launcher = fileURLToPath(new URL('../../commands/assess.mjs', import.meta.url));
  const run = (input: string) => spawnSync(process.execPath, [launcher], { input, encoding: 'utf8' });

  it('prints the assessment and exits 0, or the faults and exits 1', { timeout: 120_000 }, () => {
    const taken = run(panel);
    expect(JSON.parse(taken.stdout)).toMatchObject({ method: 'weighhouse/1', standing: [0.5, 0.5] });
    expect(taken.status).toBe(0);
    const refused = run('{"candidates":[]}');
    expect(JSON.parse(refused.stdout)).toEqual({
      errors: [{ path: 'candidates', message: expect.any(String) }],
    });
    expect(refused.status).toBe(1);
    expect(JSON.parse(run('{').stdout)).toEqual({ errors: [{ path: '', message: 'is not JSON' }] });
  });
});
