import { isBuiltin } from 'node:module';
import path from 'node:path';

/**
 * What an import's text means, in the form that `importFault` takes.
 *
 * @param {string} from the importing file's path from the root
 * @param {string} specifier as written behind `from`
 * @returns {string}
 */
export function importTarget(from, specifier) {
  if (specifier.startsWith('.')) {
    return path.posix.join(path.posix.dirname(from), specifier).replace(/\.[cm]?[jt]sx?$/, '');
  }
  if (isBuiltin(specifier)) return specifier.startsWith('node:') ? specifier : `node:${specifier}`;
  const [scope = '', name = '', ...rest] = specifier.split('/');
  if (scope === '@weighhouse') return [name, 'src', ...rest].join('/').replace(/\.[cm]?[jt]sx?$/, '');
  return `package:${scope.startsWith('@') ? `${scope}/${name}` : scope}`;
}
