import { describe, expect, it } from 'vitest';
import { ApiError } from '../../../lib/api-error';
import { fileFault, kindsLine, uploadFault } from './file-check';

const pdf = { name: 'report.pdf', type: 'application/pdf', size: 1000 };

describe('fileFault', () => {
  it('lets through what the server takes, by media type or by ending', () => {
    expect(fileFault(pdf)).toBeNull();
    expect(fileFault({ name: 'SCAN.JPG', type: '', size: 5 })).toBeNull();
    expect(fileFault({ name: 'noname', type: 'text/plain', size: 5 })).toBeNull();
  });

  it('takes exactly 25 MB and not a byte more', () => {
    expect(fileFault({ ...pdf, size: 25 * 1024 * 1024 })).toBeNull();
    expect(fileFault({ ...pdf, size: 25 * 1024 * 1024 + 1 })).toContain('25 MB is the most');
  });

  it('names the way out of an empty and of another file', () => {
    expect(fileFault({ ...pdf, size: 0 })).toContain('empty');
    expect(fileFault({ name: 'scan.docx', type: 'application/msword', size: 9 })).toContain(kindsLine);
    expect(fileFault({ name: 'pdf', type: '', size: 9 })).not.toBeNull();
  });
});

describe('uploadFault', () => {
  it('speaks by the id of the refusal', () => {
    const refusal = (id: string) => new ApiError(id, 'raw', { status: 400 });
    // The server says what the content is and what to do.
    expect(uploadFault(refusal('wrong-type'), 5).fault).toBe('raw');
    expect(uploadFault(refusal('too-large'), 30 * 1024 * 1024).fault).toContain('30.0 MB');
    expect(uploadFault(refusal('offline'), 5).fault).toContain('offline');
  });

  it('offers to send again only what may go through then', () => {
    const retry = (id: string) => uploadFault(new ApiError(id, 'raw', { status: 400 }), 5).retry;
    expect([
      retry('offline'),
      retry('failed'),
      retry('wrong-type'),
      retry('too-large'),
      retry('wrong-state'),
    ]).toEqual([true, true, false, false, false]);
  });
});
