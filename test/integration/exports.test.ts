import { panelSchema } from '@weighhouse/shared/contracts/differential';
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  handIn,
  judge,
  type JudgedCase,
  openRound,
  seat,
  type SeatedPerson,
  unsealedCase,
} from '../factories/judgements.js';
import { concludedCase, planWords, savePlan } from '../factories/plans.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;
let closed: JudgedCase;

beforeAll(async () => {
  running = await startApp();
  closed = await concludedCase(running);
});
afterAll(() => running.close());

const caution = 'It is not a diagnosis and replaces no clinical judgement';
const ask = (case_: JudgedCase, person: SeatedPerson, format: string) =>
  person.agent.get(`/api/cases/${case_.id}/export`).query({ format }).buffer(true).parse(asBytes);

/** supertest reads bodies that it does not know as nothing. */
function asBytes(response: unknown, done: (error: Error | null, body: Buffer) => void): void {
  const stream = response as NodeJS.ReadableStream;
  const chunks: Buffer[] = [];
  stream.on('data', (chunk: Buffer) => chunks.push(Buffer.from(chunk)));
  stream.on('end', () => {
    done(null, Buffer.concat(chunks));
  });
}

const jsonOf = (body: unknown): unknown => JSON.parse((body as Buffer).toString('utf8'));
const errorId = (body: unknown): string => (jsonOf(body) as { error: { id: string } }).error.id;

/** The words of a PDF, and the names of the faces in it. */
async function readPdf(content: Buffer): Promise<{ text: string; pages: number; fonts: string[] }> {
  const document = await getDocument({ data: new Uint8Array(content), verbosity: 0 }).promise;
  const pages: string[] = [];
  for (let number = 1; number <= document.numPages; number += 1) {
    const { items } = await (await document.getPage(number)).getTextContent();
    pages.push(items.map((item) => ('str' in item ? item.str : '')).join(' '));
  }
  const fonts = [...content.toString('latin1').matchAll(/\/BaseFont \/([\w+-]+)/g)].map(
    (match) => match[1] ?? '',
  );
  return { text: pages.join('\n').replace(/\s+/g, ' '), pages: document.numPages, fonts };
}

describe('the export as PDF', () => {
  it('holds differential and plan with method, weights and the caution, in our own embedded face', async () => {
    const { body, headers } = await ask(closed, closed.contributors[0]!, 'pdf').expect(200);
    expect(headers['content-type']).toBe('application/pdf');
    expect(headers['content-disposition']).toBe(`attachment; filename="${closed.number}-pdf.pdf"`);
    const { text, fonts } = await readPdf(body as Buffer);
    for (const words of [
      `Case ${closed.number}`,
      'Still’s disease',
      'none of these',
      'of 100',
      'Fever every evening: present',
      'weight 1',
      'Method:',
      planWords.workingDiagnosis,
      planWords.safetyNet,
      planWords.forDoctors,
      'by 5 March 2027',
      caution,
    ])
      expect(text).toContain(words);
    expect(fonts.join()).toMatch(/AtkinsonHyperlegible/);
    expect((body as Buffer).toString('latin1')).toMatch(/\/FontFile[23] /);
  });

  it('carries the caution and the page’s number at the foot of every page', async () => {
    const case_ = await unsealedCase(running);
    for (let count = 0; count < 40; count += 1) {
      const finding = { title: `Finding ${String(count)}`, observed: 1 };
      await case_.chair.agent.post(`/api/cases/${case_.id}/findings`).send(finding).expect(201);
    }
    const { body } = await ask(case_, case_.chair, 'pdf').expect(200);
    const { text, pages } = await readPdf(body as Buffer);
    expect(pages).toBeGreaterThan(1);
    expect(text.split(caution).length - 1).toBe(pages);
    expect(text).toContain(`Page ${String(pages)} of ${String(pages)}.`);
  });

  it('is refused while there are only sealed numbers, before and after somebody is in', async () => {
    const case_ = await acceptedCase(running);
    const before = await ask(case_, case_.chair, 'pdf').expect(409);
    expect(errorId(before.body)).toBe('wrong-state');
    const round = await openRound(case_, 'sealed');
    await judge(case_, case_.contributors[0]!, 0);
    await handIn(round, case_.contributors[0]!);
    for (const person of [case_.chair, case_.referrer, ...case_.contributors]) {
      for (const format of ['pdf', 'panel']) {
        const { body } = await ask(case_, person, format).expect(403);
        expect(errorId(body)).toBe('sealed');
      }
      const { body } = await ask(case_, person, 'fhir').expect(200);
      expect(JSON.stringify(jsonOf(body))).not.toMatch(/RiskAssessment|31\.7|23\.6|71\.3/);
    }
  });

  it('names the weights to those who judge, and says nothing of them to the referrer', async () => {
    const case_ = await unsealedCase(running, { weights: [2], ownPeople: true });
    const textFor = async (person: SeatedPerson) => {
      const { body } = await ask(case_, person, 'pdf').expect(200);
      return (await readPdf(body as Buffer)).text;
    };
    expect(await textFor(case_.chair)).toMatch(/weight 2 .*weight 1/);
    const forReferrer = await textFor(case_.referrer);
    expect(forReferrer).toContain(case_.contributors[0]?.name);
    expect(forReferrer).not.toMatch(/weight \d|sees such patients/);
  });

  it('shows letters beyond Latin 1, and other scripts, as they are', async () => {
    const case_ = await unsealedCase(running, {
      candidates: ['Škoda–Łódź syndrome', 'β2-microglobulin ≥ 3, Жуков'],
    });
    const { body } = await ask(case_, case_.chair, 'pdf').expect(200);
    const { text } = await readPdf(body as Buffer);
    // Runs of different faces may be read with a gap between them.
    const closeUp = text.replace(/ /g, '');
    expect(closeUp).toContain('Škoda–Łódźsyndrome');
    expect(closeUp).toContain('β2-microglobulin≥3,Жуков');
  });
});

describe('the letter', () => {
  it('goes to the referrer with the question and the signed plan', async () => {
    const { body } = await ask(closed, closed.referrer, 'letter').expect(200);
    const { text } = await readPdf(body as Buffer);
    for (const words of [
      `Dear ${closed.referrer.name}`,
      'Which illness explains the fever?',
      planWords.remainingDoubt,
      'Where the panel stood at signing',
      closed.chair.name,
      caution,
    ])
      expect(text).toContain(words);
  });

  it('is not there before a plan is signed', async () => {
    const case_ = await unsealedCase(running);
    await savePlan(case_);
    const { body } = await ask(case_, case_.chair, 'letter').expect(409);
    expect(errorId(body)).toBe('not-ready');
  });
});

interface Bundle {
  resourceType: string;
  type: string;
  entry: { fullUrl: string; resource: { resourceType: string; [key: string]: unknown } }[];
}

describe('the FHIR bundle', () => {
  it('is a document whose references resolve, with the diagnosis as certain as the plan says', async () => {
    const { body, headers } = await ask(closed, closed.chair, 'fhir').expect(200);
    expect(headers['content-type']).toContain('application/fhir+json');
    const bundle = jsonOf(body) as Bundle;
    expect([bundle.resourceType, bundle.type, bundle.entry[0]?.resource.resourceType]).toEqual([
      'Bundle',
      'document',
      'Composition',
    ]);
    const urls = new Set(bundle.entry.map(({ fullUrl }) => fullUrl));
    expect(urls.size).toBe(bundle.entry.length);
    const references = [...JSON.stringify(bundle).matchAll(/"reference":"([^"]+)"/g)].map(
      (match) => match[1],
    );
    expect(references.length).toBeGreaterThan(5);
    for (const reference of references) expect(urls).toContain(reference);
    const of = (type: string) =>
      bundle.entry.map(({ resource }) => resource).filter(({ resourceType }) => resourceType === type);
    expect(of('Condition')).toMatchObject([
      {
        code: { text: planWords.workingDiagnosis },
        verificationStatus: { coding: [{ code: 'provisional' }] },
      },
    ]);
    expect(of('CarePlan')).toMatchObject([
      { status: 'active', intent: 'plan', activity: [{ detail: { status: 'not-started' } }, { detail: {} }] },
    ]);
    expect(of('ServiceRequest')).toMatchObject([
      { status: 'completed', identifier: [{ value: closed.number }] },
    ]);
    expect(of('Observation').map(({ status }) => status)).toEqual(['final', 'final', 'final', 'registered']);
    expect(of('RiskAssessment')).toHaveLength(1);
    expect(JSON.stringify(of('Composition'))).toContain(caution);
  });

  it('names nobody who is ill', async () => {
    const case_ = await acceptedCase(running, { contributors: 2 });
    await case_.referrer.agent
      .put(`/api/cases/${case_.id}/identity`)
      .send({
        version: 0,
        name: 'Rosalind Quickwater',
        birthDate: '1985-04-12',
        telephone: '555',
        language: 'Irish',
        howToReach: 'By day',
      })
      .expect(200);
    const { body } = await ask(case_, case_.referrer, 'fhir').expect(200);
    const [patient] = (jsonOf(body) as Bundle).entry.filter(
      ({ resource }) => resource.resourceType === 'Patient',
    );
    expect(Object.keys(patient?.resource ?? {}).sort()).toEqual([
      'gender',
      'id',
      'identifier',
      'resourceType',
    ]);
    expect(JSON.stringify(jsonOf(body))).not.toMatch(/Rosalind|1985/);
  });
});

describe('the panel', () => {
  it('is the JSON of its route, with the caution beside it', async () => {
    const { body, headers } = await ask(closed, closed.chair, 'panel').expect(200);
    const route = await closed.chair.agent.get(`/api/cases/${closed.id}/panel`).expect(200);
    expect(panelSchema.parse(jsonOf(body))).toEqual(route.body);
    expect(headers['x-caution']).toContain(caution);
  });
});

describe('who takes a case out', () => {
  it('is on its team; the liaison is refused, a stranger finds nothing, and the trail has a line', async () => {
    const stranger = await seat(running, ['chair', 'specialist']);
    for (const format of ['pdf', 'letter', 'fhir', 'panel']) {
      await ask(closed, closed.liaison, format).expect(403);
      await ask(closed, stranger, format).expect(404);
    }
    expect(errorId((await ask(closed, closed.chair, 'docx').expect(400)).body)).toBe('invalid');
    const lines = await running.source.query<{ sentence: string; actorId: string }[]>(
      "SELECT sentence, actorId FROM audit_entry WHERE caseId = ? AND action = 'case.exported' ORDER BY id LIMIT 1",
      [closed.id],
    );
    expect(lines).toEqual([
      { sentence: 'took differential and plan out as PDF', actorId: closed.contributors[0]!.id },
    ]);
  });
});
