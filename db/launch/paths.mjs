import path from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder that holds package.json: every command of the launcher runs from here. */
export const projectRoot = fileURLToPath(new URL('../..', import.meta.url));

/** @param {...string} parts */
export function inProject(...parts) {
  return path.join(projectRoot, ...parts);
}

/**
 * Where each part of the embedded default keeps its things.
 *
 * @param {string} dataDirectory absolute
 */
export function dataPaths(dataDirectory) {
  return {
    root: dataDirectory,
    secrets: path.join(dataDirectory, 'secrets'),
    database: path.join(dataDirectory, 'mariadb'),
    storage: path.join(dataDirectory, 'storage'),
    mail: path.join(dataDirectory, 'mail'),
    logs: path.join(dataDirectory, 'logs'),
    record: path.join(dataDirectory, 'launch.json'),
  };
}
