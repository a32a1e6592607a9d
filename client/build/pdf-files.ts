import { cp } from 'node:fs/promises';
import { createReadStream, existsSync, statSync } from 'node:fs';
import { createRequire } from 'node:module';
import { dirname, join, normalize, resolve, sep } from 'node:path';
import type { Plugin } from 'vite';

/** Folders that pdf.js fetches on demand: fonts that a file names but does not carry, character maps, decoders. */
const folders = ['cmaps', 'standard_fonts', 'wasm', 'iccs'];

/** Ships pdf.js's own data under /pdf, so that no report needs anything from elsewhere. */
export function pdfFiles(): Plugin {
  const home = dirname(createRequire(import.meta.url).resolve('pdfjs-dist/package.json'));
  let outDir = '';
  let building = false;
  return {
    name: 'pdf-files',
    configResolved(config) {
      building = config.command === 'build';
      outDir = resolve(config.root, config.build.outDir);
    },
    configureServer(server) {
      server.middlewares.use('/pdf', (request, response, next) => {
        const path = normalize(decodeURIComponent((request.url ?? '').split('?')[0] ?? ''));
        const known = folders.some((folder) => path.startsWith(sep + folder + sep));
        const file = join(home, path);
        if (!known || !existsSync(file) || !statSync(file).isFile()) {
          next();
          return;
        }
        createReadStream(file).pipe(response);
      });
    },
    async closeBundle() {
      if (!building) return;
      for (const folder of folders)
        await cp(join(home, folder), join(outDir, 'pdf', folder), { recursive: true });
    },
  };
}
