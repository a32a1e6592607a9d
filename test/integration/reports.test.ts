import { createHash, randomUUID } from 'node:crypto';
import { readdirSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { setTimeout as delay } from 'node:timers/promises';
import { ListObjectsV2Command, S3Client } from '@aws-sdk/client-s3';
import { ReportRegister } from '@weighhouse/server/reports/report-register';
import type { Report } from '@weighhouse/shared/contracts/reports';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { draftCase, type Network, seatNetwork, submittedCase, takenCase } from '../factories/cases.js';
import { addFinding } from '../factories/findings.js';
import { testPassword } from '../factories/people.js';
import { files, uploadReport } from '../factories/reports.js';
import { type RunningApp, serviceOf, startApp } from '../setup/app.js';

describe('reports', () => {
  let running: RunningApp;
  let people: Network;

  beforeAll(async () => {
    running = await startApp();
    people = await seatNetwork(running);
  });
  afterAll(() => running.close());

  const send = (caseId: string, content: Buffer, filename: string, contentType: string) =>
    people.referrer.agent
      .post(`/api/cases/${caseId}/reports`)
      .attach('file', content, { filename, contentType });
  const names = async (caseId: string): Promise<string[]> => {
    const { body } = await people.referrer.agent.get(`/api/cases/${caseId}/reports`).expect(200);
    return (body.items as Report[]).map(({ fileName }) => fileName);
  };

  it('of all four kinds are taken in, listed and digested', async () => {
    const { id } = await draftCase(people);
    const { referrer } = people;
    const pdf = await uploadReport(referrer.agent, id);
    await uploadReport(referrer.agent, id, { content: files.png, name: 'röntgen.png', type: 'image/png' });
    await uploadReport(referrer.agent, id, { content: files.jpeg, name: 'b.jpeg', type: 'image/jpeg' });
    await uploadReport(referrer.agent, id, { content: files.text, name: 'c.txt', type: 'text/plain' });
    expect(pdf).toMatchObject({
      caseId: id,
      fileName: 'ultrasound.pdf',
      mediaType: 'application/pdf',
      sizeBytes: files.pdf.length,
      sha256: createHash('sha256').update(files.pdf).digest('hex'),
      uploadedBy: referrer.name,
      canRemove: true,
    });
    expect(pdf).not.toHaveProperty('storageKey');
    expect(await names(id)).toEqual(['ultrasound.pdf', 'röntgen.png', 'b.jpeg', 'c.txt']);
  });

  it('several at once are all kept', async () => {
    const { id } = await draftCase(people);
    await Promise.all(
      [1, 2, 3, 4].map((k) => uploadReport(people.referrer.agent, id, { name: `${String(k)}.pdf` })),
    );
    expect((await names(id)).sort()).toEqual(['1.pdf', '2.pdf', '3.pdf', '4.pdf']);
  });

  it('that are not what they say are refused by name, with the way out', async () => {
    const { id } = await draftCase(people);
    const refused = async (content: Buffer, name: string, type: string): Promise<string> => {
      const { body } = await send(id, content, name, type).expect(415);
      expect(body.error.id).toBe('wrong-type');
      return body.error.message as string;
    };
    expect(await refused(files.png, 'scan.pdf', 'application/pdf')).toMatch(/“scan\.pdf”.*PNG/);
    expect(await refused(files.pdf, 'scan.pdf', 'text/html')).toMatch(/“scan\.pdf”/);
    expect(await refused(Buffer.from('<svg onload="x()"/>'), 'a.svg', 'image/svg+xml')).toMatch(
      /Save it as PDF/,
    );
    expect(await refused(Buffer.from('MZ\u0000\u0001'), 'a.txt', 'text/plain')).toMatch(/UTF-8/);
    const empty = await send(id, Buffer.alloc(0), 'empty.pdf', 'application/pdf').expect(400);
    expect(empty.body.error.fields[0]).toMatchObject({ path: 'file' });
    expect(empty.body.error.fields[0].message).toContain('“empty.pdf” is empty');
    expect(await names(id)).toEqual([]);
  });

  it('come one in a request, as a file, in a form', async () => {
    const { id } = await draftCase(people);
    const post = () => people.referrer.agent.post(`/api/cases/${id}/reports`);
    const two = await post()
      .attach('file', files.pdf, 'a.pdf')
      .attach('file', files.pdf, 'b.pdf')
      .expect(400);
    expect(two.body.error.fields[0].path).toBe('file');
    await post().attach('other', files.pdf, 'a.pdf').expect(400);
    await post().field('file', 'words').expect(400);
    await post().send({ file: 'words' }).expect(400);
    await post().set('Content-Type', 'multipart/form-data; boundary=x').send('--x\r\nbroken').expect(400);
    await post().set('Content-Type', 'multipart/form-data').send('x').expect(400);
    expect(await names(id)).toEqual([]);
  });

  it('of 25 MB are taken, one byte more is not', async () => {
    const { id } = await draftCase(people);
    const most = Buffer.alloc(25 * 1024 * 1024, 'x');
    await send(id, most, 'long.txt', 'text/plain').expect(201);
    const { body } = await send(
      id,
      Buffer.concat([most, Buffer.from('x')]),
      'longer.txt',
      'text/plain',
    ).expect(413);
    expect(body.error).toMatchObject({ id: 'too-large' });
    expect(body.error.message).toContain('“longer.txt”');
    expect(await names(id)).toEqual(['long.txt']);
  }, 240_000);

  it('get names that can do no harm', async () => {
    const { id } = await draftCase(people);
    const given = [
      '../../../etc/passwd.pdf',
      'a\u202Efdp.pdf',
      `${'ü'.repeat(300)}.pdf`,
      'é"; filename="b.pdf',
    ];
    for (const name of given) await uploadReport(people.referrer.agent, id, { name });
    const kept = await names(id);
    expect(kept).toHaveLength(4);
    expect(kept.slice(0, 2)).toEqual(['passwd.pdf', 'afdp.pdf']);
    expect(Array.from(kept[2] ?? '')).toHaveLength(120);
    for (const name of kept) expect(name).not.toMatch(/["/\\\u202e]/);
  });

  it('are read whole or in part, and run nothing in a browser', async () => {
    const { id } = await draftCase(people);
    const report = await uploadReport(people.referrer.agent, id, {
      content: files.text,
      name: 'Bericht Ü.txt',
      type: 'text/plain',
    });
    const read = (range?: string) => {
      const request = people.referrer.agent.get(`/api/reports/${report.id}/content`).buffer(true);
      return range === undefined ? request : request.set('Range', range);
    };
    const size = files.text.length;
    const whole = await read().expect(200);
    expect(whole.text).toBe(files.text.toString());
    expect(whole.headers).toMatchObject({
      'content-type': 'text/plain; charset=utf-8',
      'content-length': String(size),
      'accept-ranges': 'bytes',
      'x-content-type-options': 'nosniff',
    });
    expect(whole.headers['content-security-policy']).toMatch(/default-src 'none'.*sandbox/);
    expect(whole.headers['cache-control']).toMatch(/^private, no-store$/);
    expect(whole.headers['content-disposition']).toContain("filename*=UTF-8''Bericht%20%C3%9C.txt");
    const part = await read('bytes=0-9').expect(206);
    expect(part.text).toBe('Ultrasound');
    expect(part.headers['content-range']).toBe(`bytes 0-9/${String(size)}`);
    expect((await read('bytes=-9').expect(206)).text).toBe(files.text.subarray(-9).toString());
    expect((await read('bytes=12-').expect(206)).text).toBe(files.text.subarray(12).toString());
    const beyond = await read('bytes=1000-').expect(416);
    expect(beyond.headers['content-range']).toBe(`bytes */${String(size)}`);
    expect((await read('bytes=0-1,3-4').expect(200)).text).toBe(files.text.toString());
    const changed = people.referrer.agent.get(`/api/reports/${report.id}/content`).set('Range', 'bytes=0-9');
    await changed.set('If-Range', '"another"').expect(200);
    await people.referrer.agent.head(`/api/reports/${report.id}/content`).expect(200);
  });

  it('are open to the team and shut to liaisons and strangers', async () => {
    const { id } = await takenCase(people);
    const report = await uploadReport(people.first.agent, id);
    for (const { agent } of [people.referrer, people.chair, people.second]) {
      await agent.get(`/api/reports/${report.id}/content`).expect(200);
    }
    await people.liaison.agent.get(`/api/reports/${report.id}/content`).expect(403);
    await people.liaison.agent.get(`/api/cases/${id}/reports`).expect(403);
    await people.liaison.agent
      .post(`/api/cases/${id}/reports`)
      .attach('file', files.pdf, 'a.pdf')
      .expect(403);
    for (const { agent } of [people.outsider, people.otherChair, people.administrator]) {
      await agent.get(`/api/reports/${report.id}/content`).expect(404);
      await agent.delete(`/api/reports/${report.id}`).expect(404);
      await agent.post(`/api/cases/${id}/reports`).attach('file', files.pdf, 'a.pdf').expect(404);
    }
    await running.agent().get(`/api/reports/${report.id}/content`).expect(401);
    await people.referrer.agent.get(`/api/reports/${randomUUID()}/content`).expect(404);
  });

  it('are removed by the referrer while it is a draft, unless a finding rests on them', async () => {
    const { id } = await draftCase(people);
    const { agent } = people.referrer;
    const [plain, used] = [await uploadReport(agent, id), await uploadReport(agent, id)];
    const finding = await addFinding(agent, id, { source: { reportId: used.id, page: 1 } });
    expect(finding.source).toEqual({ reportId: used.id, fileName: 'ultrasound.pdf', page: 1, text: null });
    const kept = await stored();
    await agent.delete(`/api/reports/${plain.id}`).expect(200);
    expect(await stored()).toBe(kept - 1);
    await agent.delete(`/api/reports/${plain.id}`).expect(404);
    await agent.get(`/api/reports/${plain.id}/content`).expect(404);
    await agent.delete(`/api/reports/${used.id}`).expect(409);
    const submitted = await submittedCase(people);
    const late = await uploadReport(agent, submitted.id);
    expect(late.canRemove).toBe(false);
    await agent.delete(`/api/reports/${late.id}`).expect(409);
    await people.chair.agent.delete(`/api/reports/${late.id}`).expect(403);
  });

  it('that cannot be entered leave nothing in the storage', async () => {
    const { id } = await draftCase(people);
    const before = await stored();
    const broken = vi
      .spyOn(serviceOf(running.app, ReportRegister), 'enter')
      .mockRejectedValueOnce(new Error('the database is gone'));
    await send(id, files.pdf, 'a.pdf', 'application/pdf').expect(500);
    broken.mockRestore();
    expect(await stored()).toBe(before);
    expect(await names(id)).toEqual([]);
  });

  it('that break off leave nothing behind', async () => {
    const { id } = await draftCase(people);
    const before = await stored();
    const address = new URL(running.url);
    const cookie = await cookieOf(people.referrer.email);
    const head = [
      `POST /api/cases/${id}/reports HTTP/1.1`,
      `Host: ${address.host}`,
      `Cookie: ${cookie}`,
      'Content-Type: multipart/form-data; boundary=x',
      'Content-Length: 1000000',
      '',
      '--x',
      'Content-Disposition: form-data; name="file"; filename="a.pdf"',
      'Content-Type: application/pdf',
      '',
      files.pdf.toString('latin1'),
    ].join('\r\n');
    const socket = connect(Number(address.port), address.hostname);
    socket.write(Buffer.from(head, 'latin1'));
    await delay(1000);
    expect(temporary().length).toBeGreaterThan(0);
    socket.destroy();
    for (let waited = 0; temporary().length > 0 && waited < 50; waited += 1) await delay(100);
    expect(temporary()).toEqual([]);
    expect(await stored()).toBe(before);
    expect(await names(id)).toEqual([]);
  });

  it('leave no temporary folder, whether they were kept or refused', async () => {
    const { id } = await draftCase(people);
    await uploadReport(people.referrer.agent, id);
    await send(id, files.png, 'a.pdf', 'application/pdf').expect(415);
    await send(id, Buffer.alloc(0), 'a.pdf', 'application/pdf').expect(400);
    expect(temporary()).toEqual([]);
  });

  const temporary = (): string[] =>
    readdirSync(tmpdir()).filter((name) => name.startsWith('weighhouse-upload-'));

  /** How many objects the storage holds. */
  async function stored(): Promise<number> {
    const client = new S3Client({
      endpoint: process.env.S3_ENDPOINT ?? '',
      region: process.env.S3_REGION ?? '',
      forcePathStyle: true,
      credentials: {
        accessKeyId: process.env.S3_ACCESS_KEY ?? '',
        secretAccessKey: process.env.S3_SECRET_KEY ?? '',
      },
    });
    const answer = await client.send(new ListObjectsV2Command({ Bucket: process.env.S3_BUCKET ?? '' }));
    client.destroy();
    return answer.Contents?.length ?? 0;
  }

  async function cookieOf(email: string): Promise<string> {
    const answer = await running
      .agent()
      .post('/api/session')
      .send({ email, password: testPassword })
      .expect(200);
    return String(answer.headers['set-cookie']).split(';')[0] ?? '';
  }
});
