import { measureNetwork } from './against-bayesjs.js';
import { measurePanels } from './panels.js';

const rows = [...measurePanels(), measureNetwork()];
if (process.argv.includes('--json')) process.stdout.write(`${JSON.stringify(rows, null, 2)}\n`);
else console.table(rows);
