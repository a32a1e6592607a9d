import { assess } from '../../assess.js';
import { type RandomShape, randomPanel } from '../random-panel.js';
import { type Timing, timed } from './timed.js';

export interface Measured extends Timing {
  panel: string;
  what: string;
  goalMs: number;
}

interface Goal {
  shape: Omit<RandomShape, 'coexistence'>;
  coexists: boolean;
  all: boolean;
  goalMs: number;
}

const small = { candidates: 8, findings: 18, pending: 4, contributors: 5 };
const usual = { candidates: 12, findings: 40, pending: 10, contributors: 12 };
const large = { candidates: 16, findings: 60, pending: 15, contributors: 12 };

const goals: readonly Goal[] = [
  { shape: small, coexists: false, all: true, goalMs: 0.3 },
  { shape: usual, coexists: false, all: true, goalMs: 1.2 },
  { shape: usual, coexists: true, all: false, goalMs: 0.8 },
  { shape: usual, coexists: true, all: true, goalMs: 20 },
  { shape: { ...large, pending: 0 }, coexists: true, all: false, goalMs: 15 },
  { shape: large, coexists: true, all: true, goalMs: 400 },
];

/** Assessments of random panels, validation and pooling included, ten panels of each shape in turn. */
export function measurePanels(): Measured[] {
  return goals.map(({ shape, coexists, all, goalMs }) => {
    const panels = Array.from({ length: 10 }, (_, seed) =>
      randomPanel({ ...shape, coexistence: coexists ? 0.05 : 0 }, seed + 1),
    );
    const timing = timed((index) => {
      const panel = panels[index % panels.length]!;
      return all ? assess(panel) : assess(panel, { only: 'standing' });
    });
    return {
      panel: nameOf(shape),
      what: `${all ? 'all' : 'standing alone'}, c ${coexists ? '> 0' : '= 0'}`,
      ...timing,
      goalMs,
    };
  });
}

function nameOf({ candidates, findings, pending, contributors }: Goal['shape']): string {
  return `K ${candidates}, F ${findings}${pending > 0 ? ` (${pending} pending)` : ''}, J ${contributors}`;
}
