import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { recognise } from './recognise.js';

const pdf = Buffer.from('%PDF-1.7\n%\u00e2\u00e3\n1 0 obj\n<<>>\nendobj\n%%EOF\n', 'latin1');
const jpeg = Buffer.from([
  0xff, 0xd8, 0xff, 0xe0, 0, 16, 0x4a, 0x46, 0x49, 0x46, 0, 1, 1, 0, 0, 1, 0, 1, 0, 0,
]);
const png = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
  'base64',
);

describe('recognise', () => {
  let directory: string;
  beforeAll(async () => {
    directory = await mkdtemp(path.join(tmpdir(), 'recognise-'));
  });
  afterAll(() => rm(directory, { recursive: true }));

  const asked = async (content: Buffer | string, name: string, declared: string): Promise<string> => {
    const file = path.join(directory, 'content');
    await writeFile(file, content);
    return recognise(file, name, declared).then(
      (kind) => kind.label,
      (error: unknown) => (error instanceof Error ? error.message : String(error)),
    );
  };

  it.each([
    [pdf, 'a.pdf', 'application/pdf', 'PDF'],
    [jpeg, 'a.jpg', 'image/jpeg', 'JPEG'],
    [jpeg, 'a.JPEG', 'image/jpeg', 'JPEG'],
    [png, 'a.png', 'image/png', 'PNG'],
    [pdf, 'a.pdf', 'application/octet-stream', 'PDF'],
    ['Leukocytes 4.1 ×10⁹/l\r\n\tnormal', 'a.txt', 'text/plain', 'plain text'],
    ['BM biopsy: normal', 'a.txt', 'text/plain', 'plain text'],
    ['\ufeffwith a byte order mark', 'a.txt', 'text/plain', 'plain text'],
    ['<html><script>alert(1)</script>', 'a.txt', 'text/plain', 'plain text'],
  ])('knows what it is by content, ending and declaration: %#', async (content, name, declared, label) => {
    expect(await asked(content, name, declared)).toBe(label);
  });

  it.each([
    [png, 'scan.pdf', 'application/pdf', /“scan\.pdf” is named as PDF, but its content is PNG\..*\.png/],
    [pdf, 'scan.txt', 'text/plain', /named as plain text, but its content is PDF/],
    ['words', 'scan.pdf', 'application/pdf', /named as PDF, but its content is plain text/],
    [pdf, 'scan.pdf', 'image/png', /“scan\.pdf” is PDF, but was sent as another kind/],
    [pdf, 'scan.pdf', 'text/html', /sent as another kind/],
    [pdf, 'scan.docx', 'application/pdf', /“scan\.docx” is not named as a PDF/],
    [pdf, 'scan', 'application/pdf', /“scan” is not named as a PDF/],
    [Buffer.from('a\u0000b'), 'a.txt', 'text/plain', /“a\.txt” is not plain text in UTF-8/],
    [Buffer.from([0x61, 0xff, 0xfe]), 'a.txt', 'text/plain', /is not plain text in UTF-8/],
    [Buffer.from('ÿþa\u0000', 'latin1'), 'a.txt', 'text/plain', /is not plain text in UTF-8/],
    [Buffer.from('cut off \xc3', 'latin1'), 'a.txt', 'text/plain', /is not plain text in UTF-8/],
    ['\u001b]0;title', 'a.txt', 'text/plain', /is not plain text in UTF-8/],
    [Buffer.from('PK\u0003\u0004', 'latin1'), 'a.pdf', 'application/pdf', /“a\.pdf” is no PDF/],
    [pdf.subarray(0, 3), 'a.pdf', 'application/pdf', /its content is plain text/],
  ])('refuses what does not agree, in words: %#', async (content, name, declared, words) => {
    expect(await asked(content, name, declared)).toMatch(words);
  });
});
