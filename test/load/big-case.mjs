// @ts-check
// Plays a large case through the API of a running demo, up to its live round, for measuring and for looking at.

/** @typedef {{ get(path: string): Promise<any>, send(method: string, path: string, body?: unknown): Promise<any> }} Client */

/**
 * Somebody of the demo, signed in.
 * @param {string} base
 * @param {string} id such as sp-rheum
 * @returns {Promise<Client>}
 */
export async function signedIn(base, id) {
  const headers = { origin: base, 'content-type': 'application/json' };
  const body = JSON.stringify({ email: `${id}@lantern.example`, password: 'lantern-coast-demo' });
  const answer = await fetch(`${base}/api/session`, { method: 'POST', headers, body });
  if (!answer.ok) throw new Error(`${id} cannot sign in: ${String(answer.status)}`);
  const cookie = answer.headers
    .getSetCookie()
    .map((one) => one.split(';')[0])
    .join('; ');
  /** @param {string} method @param {string} path @param {unknown} [content] */
  const send = async (method, path, content) => {
    const sent = content === undefined ? {} : { body: JSON.stringify(content) };
    const got = await fetch(`${base}${path}`, { method, headers: { ...headers, cookie }, ...sent });
    if (!got.ok) throw new Error(`${method} ${path}: ${String(got.status)} ${await got.text()}`);
    return got.json();
  };
  return { send, get: (path) => send('GET', path) };
}

const names = ['sp-rheum', 'sp-id', 'sp-haem', 'sp-gim', 'sp-neuro', 'sp-rad', 'sp-neph', 'sp-card'];
const alsoSpecialists = ['chair-2', 'ref-2', 'lia-2', 'ref-1'];

/**
 * The people who judge: the demo's specialists, and where they are too few others, who get that role too.
 * @param {string} base
 * @param {number} count up to 12
 */
async function contributors(base, count) {
  const ids = [...names, ...alsoSpecialists].slice(0, count);
  const administrator = await signedIn(base, 'adm-1');
  const { items } = await administrator.get('/api/people?size=100');
  const people = [];
  for (const id of ids) {
    const person = items.find((/** @type {{ email: string }} */ one) => one.email.startsWith(`${id}@`));
    if (!person.roles.includes('specialist'))
      await administrator.send('PATCH', `/api/people/${person.id}`, {
        version: person.version,
        roles: [...person.roles, 'specialist'],
      });
    people.push({ id: person.id, client: await signedIn(base, id) });
  }
  const liaison = items.find((/** @type {{ email: string }} */ one) => one.email.startsWith('lia-1@'));
  return { people, liaisonId: liaison.id };
}

/**
 * Numbers that look like judgements and are the same at every run (Park and Miller's minimal standard generator, 1988).
 * @param {number} seed
 */
function numbersFrom(seed) {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}

/** @param {number[]} parts @returns {number[]} shares in tenths of 100 that sum to 100 exactly */
function sharesOf(parts) {
  const sum = parts.reduce((known, part) => known + part, 0);
  const tenths = parts.map((part) => Math.max(1, Math.floor((part / sum) * 1000)));
  const largest = tenths.indexOf(Math.max(...tenths));
  tenths[largest] = (tenths[largest] ?? 0) + 1000 - tenths.reduce((known, one) => known + one, 0);
  return tenths.map((one) => one / 10);
}

const sources = ['history', 'symptom', 'sign', 'laboratory', 'imaging', 'test'];
const bands = ['Normal', 'Slightly raised', 'Raised', 'Above five times'];

/**
 * @param {string} base
 * @param {{ candidates: number, findings: number, pending: number, contributors: number }} size
 * @returns {Promise<{ id: string, number: string, people: { id: string, client: Client }[], chair: Client }>}
 */
export async function makeBigCase(base, size) {
  const random = numbersFrom(7);
  const [chair, referrer] = [await signedIn(base, 'chair-1'), await signedIn(base, 'ref-1')];
  const { people, liaisonId } = await contributors(base, size.contributors);
  const { id, number } = await referrer.send('POST', '/api/cases', {
    question: 'Which of many illnesses explains a long list of findings?',
    age: 52,
    sex: 'male',
    urgency: 'withinMonth',
    consent: { given: true, how: 'signed', givenOn: '2026-01-15' },
    historyHtml: '<p>A case of many rows and columns.</p>',
  });
  const at = `/api/cases/${id}`;
  await referrer.send('POST', `${at}/submit`, {});
  const team = people.map((person) => ({ personId: person.id, part: 'contributor' }));
  await chair.send('POST', `${at}/accept`, {
    team: [...team, { personId: liaisonId, part: 'liaison' }],
    conferenceAt: null,
    quorum: 2,
  });
  for (let index = 0; index < size.candidates; index += 1)
    await chair.send('POST', `${at}/candidates`, {
      name: `Candidate illness number ${String(index + 1)}`,
      mustNotMiss: index % 9 === 4,
    });
  const findings = [];
  for (let index = 0; index < size.findings; index += 1) {
    const pending = index >= size.findings - size.pending;
    const banded = index % 5 === 3;
    findings.push(
      await chair.send('POST', `${at}/findings`, {
        title: `Finding ${String(index + 1)}${banded ? ', in bands' : ''}`,
        kind: sources[index % sources.length],
        ...(banded ? { levelLabels: bands } : {}),
        observed: pending ? null : banded ? 2 : index % 7 === 0 ? 0 : 1,
        ...(pending ? { cost: 50 + index * 7, waitDays: index % 14, burden: index % 4 } : {}),
      }),
    );
  }
  const round = await chair.send('POST', `${at}/rounds`, { kind: 'sealed' });
  const { candidateSet } = await chair.get(`${at}/differential`);
  const columns = Array.from({ length: size.candidates + 1 }, (_, index) => index);
  for (const { client } of people) {
    const outOf100 = sharesOf(columns.map((index) => (random() + 0.2) / (1 + index / 2)));
    await client.send('PUT', `${at}/judgement/prior`, { candidateSet, outOf100 });
    for (const finding of findings) {
      const banded = finding.levelLabels.length > 2;
      const cell = () =>
        banded ? sharesOf(bands.map(() => random() + 0.1)) : Math.round(50 + random() * 900) / 10;
      const row = { candidateSet, exposure: 'often', outOf100: columns.map(cell) };
      await client.send('PUT', `${at}/judgement/findings/${finding.id}`, row);
    }
    await client.send('POST', `/api/rounds/${round.id}/hand-in`, {});
  }
  await chair.send('POST', `/api/rounds/${round.id}/unseal`, {});
  await chair.send('POST', `${at}/rounds`, { kind: 'live' });
  return { id, number, people, chair };
}
