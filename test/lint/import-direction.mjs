/**
 * Which file may import which. Every decision stands here, free of the linter, so that it can be read in one
 * place and tested.
 *
 * An import's target is either a file of the project, as its path from the root without the extension, or a
 * package, as `package:name`, or a part of Node, as `node:name`.
 */

/** The server's domains. Each may call those before it and none behind it, so circles cannot arise. */
export const domains = [
  'people',
  'cases',
  'reports',
  'findings',
  'differential',
  'discussion',
  'conferences',
  'plans',
  'summaries',
  'outcomes',
];

/** These look at all domains, and nobody imports them. */
export const readers = ['live', 'audit', 'today', 'exports'];

/** What shared code may rely on, in a browser and on a server alike. */
const sharedPackages = ['package:zod', 'package:canonicalize'];

/** The command that reads a panel from standard input, and what starts commands. */
const isCommand = /^shared\/(src\/reasoning\/(\w+-)?command\.\w+|commands\/[\w-]+\.mjs)$/;

/** @param {string} file */
const isTest = (file) => /\.(spec|test)\.[a-z]+$/.test(file) || file.includes('/testing/');

/** @param {string} target */
const isOutside = (target) => target.startsWith('package:') || target.startsWith('node:');

/**
 * @param {string} from
 * @param {string} to
 */
function sharedFault(from, to) {
  if (!isOutside(to)) {
    return to.startsWith('shared/')
      ? null
      : 'shared is used by all and imports none of the other workspaces.';
  }
  if (isTest(from) || isCommand.test(from) || sharedPackages.includes(to)) return null;
  return 'shared runs in the browser too: no framework and no input or output.';
}

/**
 * @param {string} from
 * @param {string} to
 */
function serverFault(from, to) {
  if (isOutside(to)) return null;
  if (!/^(server|shared)\//.test(to)) return 'server imports shared and nothing else of the project.';
  const [, , owner = '', ...rest] = from.split('/');
  const [, , target = '', ...inside] = to.split('/');
  // Files that lie directly in src, such as app.module.ts, put everything together.
  if (to.startsWith('shared/') || rest.length === 0 || inside.length === 0 || owner === target) return null;
  if (owner === 'platform') return 'platform is below all domains and imports none of them.';
  if (target === 'platform') return null;
  if (readers.includes(target)) return `${target} looks at the domains, and none of them imports it.`;
  if (/\.entit(y|ies)$/.test(to))
    return `The rows of ${target} belong to ${target}: call one of its services instead.`;
  if (readers.includes(owner)) return null;
  if (!domains.includes(owner))
    return `${owner} has no place in the order of domains yet: give it one in test/lint/.`;
  if (domains.indexOf(owner) > domains.indexOf(target) && domains.includes(target)) return null;
  return `${owner} must not import ${target}. The order is ${domains.join(', ')}: a later one may import an earlier one.`;
}

/**
 * @param {string} from
 * @param {string} to
 */
function clientFault(from, to) {
  if (to.startsWith('node:')) {
    return from.startsWith('client/src/') && !isTest(from) ? 'The browser has no node: modules.' : null;
  }
  if (isOutside(to) || to.startsWith('shared/')) return null;
  if (!to.startsWith('client/')) return 'client imports shared and nothing else of the project.';
  const [, , layer, feature] = from.split('/');
  const [, , targetLayer, targetFeature, targetPart] = to.split('/');
  if (layer === 'features') {
    if (targetLayer === 'app') return 'A feature does not know the application around it.';
    if (targetLayer !== 'features' || feature === targetFeature || targetPart === 'api') return null;
    return `${feature} may use the calls in features/${targetFeature}/api; what both show belongs in components.`;
  }
  if (layer === 'components' || layer === 'lib') {
    if (targetLayer === 'features' || targetLayer === 'app')
      return `${layer} is below the features and imports none.`;
    if (layer === 'lib' && targetLayer === 'components')
      return 'lib draws nothing and imports no components.';
  }
  return null;
}

/**
 * @param {string} to
 * @param {string[]} workspaces
 */
function otherFault(to, workspaces) {
  if (isOutside(to) || workspaces.some((workspace) => to.startsWith(`${workspace}/`))) return null;
  return `Only ${workspaces.join(', ')} may be imported here.`;
}

/**
 * Why a file must not import a target, or null where it may.
 *
 * @param {string} from the importing file's path from the root
 * @param {string} to the target, as described above
 * @returns {string | null}
 */
export function importFault(from, to) {
  const [workspace] = from.split('/');
  if (workspace === 'shared') return sharedFault(from, to);
  if (workspace === 'server') return serverFault(from, to);
  if (workspace === 'client') return clientFault(from, to);
  if (from.startsWith('db/src/')) return otherFault(to, ['db', 'server', 'shared']);
  if (workspace === 'storage-fake') return otherFault(to, ['storage-fake']);
  return null;
}
