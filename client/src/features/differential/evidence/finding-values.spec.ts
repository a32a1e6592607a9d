import { describe, expect, it } from 'vitest';
import { makeFinding } from '../testing/make-differential';
import {
  bodyOf,
  changeBody,
  emptyFinding,
  faultsOf,
  type FindingValues,
  newBody,
  valuesOf,
} from './finding-values';

const good: FindingValues = {
  ...emptyFinding,
  title: 'Fever',
  kind: 'symptom',
  observed: '1',
  reliability: 'firm',
};
const paths = (values: FindingValues) => faultsOf(values).map((fault) => fault.path);

describe('the form of a finding', () => {
  it('presets nothing that matters, and names everything that is missing', () => {
    expect(paths(emptyFinding)).toEqual(['kind', 'observed', 'reliability', 'title']);
  });

  it('sends what was chosen', () => {
    expect(faultsOf(good)).toEqual([]);
    expect(newBody(good)).toMatchObject({
      title: 'Fever',
      observed: 1,
      levelLabels: ['absent', 'present'],
      source: null,
      cost: null,
    });
  });

  it('sends null for what is not known yet, with what it would take', () => {
    const pending = { ...good, observed: 'pending', cost: '1400', waitDays: '6', burden: '2' };
    expect(newBody(pending)).toMatchObject({ observed: null, cost: 1400, waitDays: 6, burden: 2 });
    expect(bodyOf({ ...pending, observed: '1' })).toMatchObject({ cost: null, waitDays: null, burden: null });
  });

  it('names a number that is none', () => {
    expect(paths({ ...good, observed: 'pending', cost: 'much', burden: '4', waitDays: '-1' })).toEqual([
      'cost',
      'waitDays',
      'burden',
    ]);
  });

  it('takes a report with its page, or words, and no page without a report', () => {
    const reportId = '7d3c9b1e-52c1-4f0a-9a53-0d7f9b0a2c11';
    expect(newBody({ ...good, reportId, page: '2' }).source).toEqual({ reportId, page: 2, text: null });
    expect(newBody({ ...good, sourceText: ' Seen by Dr A ', page: '2' }).source).toEqual({
      reportId: null,
      page: null,
      text: 'Seen by Dr A',
    });
    expect(paths({ ...good, reportId, page: '1.5' })).toEqual(['source.page']);
  });

  it('wants two to six levels of one’s own, and the observed one among them', () => {
    const levels = { ...good, ownLevels: true, levelLabels: ['none', 'few', 'many'], observed: '2' };
    expect(faultsOf(levels)).toEqual([]);
    expect(paths({ ...levels, levelLabels: ['none', 'few', ' '] })).toEqual(['observed']);
    expect(paths({ ...levels, levelLabels: ['none'], observed: '0' })).toEqual(['levelLabels']);
  });

  it('keeps the chosen level where a field before it is left blank', () => {
    const levels = { ...good, ownLevels: true, levelLabels: ['', 'few', ' ', 'many'], observed: '3' };
    expect(newBody(levels)).toMatchObject({ levelLabels: ['few', 'many'], observed: 1 });
    expect(paths({ ...levels, observed: '2' })).toEqual(['observed']);
    expect(newBody({ ...levels, observed: 'pending' })).toMatchObject({ observed: null });
  });

  it('opens a finding as it is and sends it back the same', () => {
    const finding = makeFinding({
      levelLabels: ['none', 'few', 'many'],
      observed: 2,
      reliability: 0.7,
      version: 4,
    });
    expect(changeBody(valuesOf(finding), finding.version)).toMatchObject({
      version: 4,
      levelLabels: ['none', 'few', 'many'],
      observed: 2,
      reliability: 'fair',
    });
  });
});
