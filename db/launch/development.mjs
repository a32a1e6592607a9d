import { code, vite } from './build.mjs';
import { inProject } from './paths.mjs';
import { freePort } from './ports.mjs';
import { isReady } from './readiness.mjs';
import { waitUntil } from './waiting.mjs';

/**
 * The same product for working on it: the compiler watches, the server restarts on its output, and the pages
 * come from Vite, which passes /api and /live on. Everything writes to the terminal.
 *
 * @param {{ settings: import('./environment.mjs').Settings, processes: import('./processes.mjs').Processes,
 *   env: NodeJS.ProcessEnv }} options
 */
export async function startDevelopment({ settings, processes, env }) {
  const address = { host: '127.0.0.1', port: await freePort() };
  const serverEnv = { ...env, HOST: address.host, PORT: String(address.port) };
  const node = { program: process.execPath, graceMs: 15_000 };
  processes.start({
    ...node,
    name: 'The compiler',
    args: [...code.command, '--watch', '--preserveWatchOutput'],
  });
  const server = processes.start({
    ...node,
    name: 'The server',
    args: ['--watch', '--watch-preserve-output', inProject('server/dist/main.js')],
    env: serverEnv,
  });
  await waitUntil(() => isReady(address), { what: 'The server', child: server });
  const pages = processes.start({
    ...node,
    name: 'Vite',
    args: [vite.program, '--host', settings.host, '--port', String(settings.port), '--strictPort'],
    cwd: vite.cwd,
    env: { ...env, API_URL: `http://${address.host}:${address.port}` },
  });
  await waitUntil(() => isReady(settings), { what: 'Vite', child: pages });
}
