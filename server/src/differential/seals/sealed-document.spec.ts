import { createHash } from 'node:crypto';
import { canonicalText, sealDigest } from '@weighhouse/shared/seals/seal';
import { describe, expect, it } from 'vitest';
import { makeVersion, priorValues, rowValues } from '../testing/make-version.js';
import { sealedDocument } from './sealed-document.js';

const two = ['absent', 'present'];
const handedIn = () => ({
  caseId: 'case',
  roundId: 'round',
  personId: 'ann',
  candidateSet: 2,
  candidateIds: ['a', 'b'],
  findings: [
    { id: 'f2', levelLabels: two },
    { id: 'f1', levelLabels: two },
    { id: 'f3', levelLabels: two },
  ],
  judgements: new Map([
    ['prior', makeVersion({ values: priorValues(['a', 'b', null], [300, 200, 500]) })],
    ['f1', makeVersion({ target: 'f1', exposure: 'seldom', values: rowValues(['a', null], [650, 1]) })],
    ['f2', makeVersion({ target: 'f2' })],
    ['in error', makeVersion({ target: 'in error', exposure: 'often', values: rowValues(['a'], [10]) })],
  ]),
});

describe('the document that a seal closes over', () => {
  it('holds the judgement in thousandths: the rows that are judged, the columns in force', () => {
    expect(sealedDocument(handedIn())).toEqual({
      caseId: 'case',
      roundId: 'round',
      personId: 'ann',
      candidateSet: 2,
      findings: ['f2', 'f1', 'f3'],
      judgement: {
        prior: [300, 200, 500],
        rows: [{ finding: 'f1', exposure: 'seldom', given: [650, null, 1] }],
      },
    });
  });

  it('has no prior where it was given over another candidate set', () => {
    expect(sealedDocument({ ...handedIn(), candidateSet: 3 }).judgement.prior).toBeNull();
  });

  // RFC 8785 (keys in order of UTF-16 code units, no white space) written out by hand, SHA-256 of FIPS 180-4.
  it('is sealed with the digest that anybody can work out', async () => {
    const text =
      '{"candidateSet":2,"caseId":"case","findings":["f2","f1","f3"],"judgement":{"prior":[300,200,500],' +
      '"rows":[{"exposure":"seldom","finding":"f1","given":[650,null,1]}]},"personId":"ann","roundId":"round"}';
    const document = sealedDocument(handedIn());
    expect(canonicalText(document)).toBe(text);
    const random = Buffer.alloc(32, 7);
    const digest = createHash('sha256').update(random).update(text, 'utf8').digest('hex');
    expect(await sealDigest(random, document)).toBe(digest);
  });
});
