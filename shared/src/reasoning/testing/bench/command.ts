import { measureNetwork } from './against-bayesjs.js';
import { type Measured, measurePanels } from './panels.js';

/** Prints how long assessments take beside the goals: a line each, or one JSON array with --json. */
const rows: Measured[] = [...measurePanels(), measureNetwork()];

const line = ({ panel, what, medianMs, p95Ms, goalMs }: Measured) =>
  `${panel}, ${what}: median ${medianMs.toFixed(2)} ms, 95th ${p95Ms.toFixed(2)} ms, goal ${goalMs.toString()} ms`;

const text = process.argv.includes('--json') ? JSON.stringify(rows, null, 2) : rows.map(line).join('\n');
process.stdout.write(`${text}\n`);
