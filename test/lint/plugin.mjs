import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { importFault } from './import-direction.mjs';
import { importTarget } from './import-target.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));

/** @type {import('eslint').Rule.RuleModule} */
const importDirection = {
  meta: { type: 'problem', schema: [], messages: { wrong: '{{fault}}' } },
  create(context) {
    const from = path.relative(root, context.filename).split(path.sep).join('/');
    /** @param {{ source?: import('estree').Expression | null }} node */
    const check = ({ source }) => {
      if (source?.type !== 'Literal' || typeof source.value !== 'string') return;
      const fault = importFault(from, importTarget(from, source.value));
      if (fault !== null) context.report({ node: source, messageId: 'wrong', data: { fault } });
    };
    return {
      ImportDeclaration: check,
      ImportExpression: check,
      ExportNamedDeclaration: check,
      ExportAllDeclaration: check,
    };
  },
};

/** The project's own rules. */
export const plugin = { rules: { 'import-direction': importDirection } };
