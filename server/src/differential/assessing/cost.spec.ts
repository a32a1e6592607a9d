import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { randomPanel } from '@weighhouse/shared/reasoning/testing/random-panel';
import { describe, expect, it } from 'vitest';
import { isHeavy } from './cost.js';

const panel = (candidates: number, findings: number, contributors: number, coexistence: number) =>
  randomPanel({ candidates, findings, pending: 0, contributors, coexistence }, 1) as PanelView;

describe('a panel that is computed beside the event loop', () => {
  it.each([
    ['the demonstration’s, one cause', panel(8, 18, 5, 0), false, false],
    ['a usual one, one cause', panel(12, 40, 12, 0), false, false],
    ['a small one, may coexist', panel(8, 18, 5, 0.05), false, false],
    ['a usual one, may coexist', panel(12, 40, 12, 0.05), true, false],
    ['a large one, may coexist', panel(16, 60, 12, 0.05), true, true],
    ['the largest, one cause', panel(30, 300, 25, 0), true, false],
    ['the largest, may coexist', panel(30, 300, 25, 0.05), true, true],
  ])('%s', (_, about, whole, standing) => {
    expect([isHeavy(about, 'whole'), isHeavy(about, 'standing')]).toEqual([whole, standing]);
  });

  it('is none where nobody has judged yet', () => {
    expect(isHeavy({ ...panel(2, 3, 1, 0), contributors: [] }, 'whole')).toBe(false);
  });
});
