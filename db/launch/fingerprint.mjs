import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

/**
 * @param {string} entry a file or folder
 * @returns {string[]} every file below it, in a fixed order
 */
function filesBelow(entry) {
  if (!existsSync(entry)) return [];
  if (!statSync(entry).isDirectory()) return [entry];
  return readdirSync(entry)
    .sort()
    .flatMap((name) => filesBelow(path.join(entry, name)));
}

/**
 * A digest of the names and contents of files. Contents and not times, since a clone, a checkout or a copy
 * gives old text a new time.
 *
 * @param {string} root
 * @param {string[]} entries files and folders inside it; missing ones count as empty
 * @returns {string} 64 hexadecimal digits
 */
export function fingerprint(root, entries) {
  const hash = createHash('sha256');
  for (const file of entries.flatMap((entry) => filesBelow(path.join(root, entry)))) {
    const content = readFileSync(file);
    hash.update(`${path.relative(root, file)}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}
