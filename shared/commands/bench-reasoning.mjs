/** `npm run bench:reasoning`: how long assessments take, as a table or with --json as JSON. */
import { importBuilt } from './built.mjs';

await importBuilt('reasoning/testing/bench/command.js');
