import { createConnection } from 'mysql2/promise';
import { GetObjectCommand, PutObjectCommand, S3Client } from '@aws-sdk/client-s3';
import { createTransport } from 'nodemailer';
import { afterAll, beforeEach, describe, expect, inject, it } from 'vitest';
import { freshDatabase } from '../setup/fresh-database.js';
import { mailbox } from '../setup/mailbox.js';

describe('a fresh database', () => {
  it('is empty, speaks UTC and utf8mb4, and is gone after drop', async () => {
    const database = await freshDatabase();
    const connection = await createConnection(database.url);
    const [tables] = await connection.query('SHOW TABLES');
    const [[row]] = (await connection.query(
      'SELECT DATABASE() AS name, @@time_zone AS zone, @@collation_database AS collation',
    )) as unknown as [Record<string, string>[]];
    await connection.end();
    expect(tables).toEqual([]);
    expect(row).toEqual({ name: database.name, zone: '+00:00', collation: 'utf8mb4_unicode_ci' });
    await database.drop();
    await expect(createConnection(database.url)).rejects.toMatchObject({ code: 'ER_BAD_DB_ERROR' });
  });

  it('belongs to an account that reaches nothing else', async () => {
    const connection = await createConnection(inject('databaseUrl'));
    await expect(connection.query('CREATE DATABASE somewhere_else')).rejects.toMatchObject({
      code: 'ER_DBACCESS_DENIED_ERROR',
    });
    await expect(connection.query('SELECT * FROM mysql.global_priv')).rejects.toMatchObject({
      code: 'ER_TABLEACCESS_DENIED_ERROR',
    });
    await expect(connection.query("SELECT 'x' INTO OUTFILE '/var/tmp/weighhouse'")).rejects.toMatchObject({
      code: 'ER_SPECIFIC_ACCESS_DENIED_ERROR',
    });
    await connection.end();
  });

  it('lets nobody in over the network without the password, root included', async () => {
    for (const user of ['root', 'mysql', 'weighhouse', '']) {
      const url = new URL(inject('databaseUrl'));
      await expect(
        createConnection({ host: url.hostname, port: Number(url.port), user }),
      ).rejects.toMatchObject({ code: expect.stringMatching(/^ER_ACCESS_DENIED/) });
    }
  });
});

describe('the storage fake', () => {
  const { endpoint, bucket, region, accessKey, secretKey } = inject('storage');
  const clients: S3Client[] = [];
  const client = (accessKeyId: string): S3Client => {
    const made = new S3Client({
      endpoint,
      region,
      forcePathStyle: true,
      requestChecksumCalculation: 'WHEN_REQUIRED',
      responseChecksumValidation: 'WHEN_REQUIRED',
      credentials: { accessKeyId, secretAccessKey: secretKey },
    });
    clients.push(made);
    return made;
  };

  afterAll(() => {
    for (const made of clients) made.destroy();
  });

  it('gives back the bytes it was given, whole and in a range', async () => {
    const bytes = Buffer.from(Array.from({ length: 4096 }, (_, index) => index % 256));
    const place = { Bucket: bucket, Key: 'cases/1/report' };
    await client(accessKey).send(new PutObjectCommand({ ...place, Body: bytes }));
    const whole = await client(accessKey).send(new GetObjectCommand(place));
    expect(Buffer.from((await whole.Body?.transformToByteArray()) ?? [])).toEqual(bytes);
    const part = await client(accessKey).send(new GetObjectCommand({ ...place, Range: 'bytes=10-19' }));
    expect(Buffer.from((await part.Body?.transformToByteArray()) ?? [])).toEqual(bytes.subarray(10, 20));
  });

  it('answers nobody without the access key', async () => {
    const place = { Bucket: bucket, Key: 'cases/2/report' };
    await client(accessKey).send(new PutObjectCommand({ ...place, Body: 'private' }));
    const bare = await fetch(`${endpoint}/${bucket}/cases/2/report`);
    expect([bare.status, await bare.text()]).toEqual([403, 'Forbidden']);
    await expect(client('S3RVER').send(new GetObjectCommand(place))).rejects.toMatchObject({
      $metadata: { httpStatusCode: 403 },
    });
  });

  it('listens on loopback only', () => {
    expect(new URL(endpoint).hostname).toBe('127.0.0.1');
  });
});

describe('the mail fake', () => {
  const box = mailbox();
  beforeEach(() => {
    box.clear();
  });

  it('keeps what is sent, with everybody it was sent to', async () => {
    const transport = createTransport(inject('mail').url);
    await transport.sendMail({
      from: 'panel@lantern.example',
      to: 'a@lantern.example',
      bcc: 'b@lantern.example',
      subject: 'Größe',
      text: 'Case 26-0417\n.\nis waiting',
    });
    const message = await box.waitFor(({ subject }) => subject === 'Größe');
    expect(message).toMatchObject({
      from: 'panel@lantern.example',
      to: ['a@lantern.example', 'b@lantern.example'],
    });
    expect(message.text).toContain('Case 26-0417\n.\nis waiting');
    box.clear();
    expect(await box.messages()).toEqual([]);
  });

  it('says what did arrive when the awaited message does not', async () => {
    await createTransport(inject('mail').url).sendMail({
      from: 'panel@lantern.example',
      to: 'a@lantern.example',
      subject: 'Another one',
      text: '-',
    });
    await expect(box.waitFor(() => false, 300)).rejects.toThrow('a@lantern.example: Another one');
  });
});
