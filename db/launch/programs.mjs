import { accessSync, constants } from 'node:fs';
import path from 'node:path';

/** Debian puts servers here, and a person without root does not have these folders in PATH. */
const serverFolders = ['/usr/local/sbin', '/usr/sbin', '/sbin'];

/**
 * The full path of a program, or null where it is not installed.
 *
 * @param {string} name
 * @param {string} [searchPath] folders separated by colons
 * @returns {string | null}
 */
export function findProgram(name, searchPath = process.env['PATH'] ?? '') {
  for (const folder of [...searchPath.split(path.delimiter), ...serverFolders]) {
    if (folder === '') continue;
    const candidate = path.join(folder, name);
    try {
      accessSync(candidate, constants.X_OK);
      return candidate;
    } catch {
      continue;
    }
  }
  return null;
}
