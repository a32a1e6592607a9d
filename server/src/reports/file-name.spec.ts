import { describe, expect, it } from 'vitest';
import { contentDisposition, endingOf, safeFileName } from './file-name.js';

describe('safeFileName', () => {
  it.each([
    ['Befund Schädel.pdf', 'Befund Schädel.pdf'],
    ['../../etc/passwd.txt', 'passwd.txt'],
    ['C:\\scans\\a.png', 'a.png'],
    ['a"b\'c`.pdf', 'abc.pdf'],
    ['invoice\u202Efdp.exe', 'invoicefdp.exe'],
    ['a\u0000b\r\nc.pdf', 'abc.pdf'],
    ['..', 'report'],
    ['.pdf', 'report.pdf'],
    ['   a   b .pdf', 'a b.pdf'],
    ['\ud800x.pdf', 'x.pdf'],
    ['', 'report'],
    ['a\u0308.PDF', 'ä.pdf'],
    ['...pdf', 'report.pdf'],
  ])('of %j is %j', (name, safe) => {
    expect(safeFileName(name)).toBe(safe);
  });

  it('is not held up by a name of thousands of dots', () => {
    const before = performance.now();
    expect(safeFileName(`x${'.'.repeat(100_000)}x.pdf`)).toMatch(/x\.pdf$/);
    expect(performance.now() - before).toBeLessThan(100);
  });

  it('shortens 300 letters and keeps the ending', () => {
    const safe = safeFileName(`${'ü'.repeat(300)}.jpeg`);
    expect(Array.from(safe)).toHaveLength(120);
    expect(safe.endsWith('ü.jpeg')).toBe(true);
  });

  it('does not cut a letter outside the basic plane in two', () => {
    expect(safeFileName(`${'𝒳'.repeat(300)}.txt`)).toMatch(/^𝒳+\.txt$/u);
  });
});

describe('endingOf', () => {
  it.each([
    ['a.PDF', '.pdf'],
    ['a', ''],
    ['a.tar.gz', '.gz'],
    ['a.p\u00f6f', ''],
  ])('of %s is %j', (name, ending) => {
    expect(endingOf(name)).toBe(ending);
  });
});

describe('contentDisposition', () => {
  it('names the file in ASCII and in UTF-8', () => {
    expect(contentDisposition("Schädel (1)'.pdf")).toBe(
      "inline; filename=\"Sch_del (1)'.pdf\"; filename*=UTF-8''Sch%C3%A4del%20%281%29%27.pdf",
    );
  });

  it('cannot be broken out of', () => {
    const header = contentDisposition('a"; filename="b.html');
    expect(header.match(/"/g)).toHaveLength(2);
  });
});
