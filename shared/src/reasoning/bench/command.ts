import { measurePanels } from './panels.js';

const rows = [...measurePanels()];
if (process.argv.includes('--json')) process.stdout.write(`${JSON.stringify(rows, null, 2)}\n`);
else console.table(rows);
