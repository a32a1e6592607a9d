/** `npm run assess`: a panel as JSON from standard input, its assessment as JSON to standard output. */
import { importBuilt } from './built.mjs';

await importBuilt('reasoning/command.js');
