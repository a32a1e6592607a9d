import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import typescript from 'typescript-eslint';
import { plugin as weighhouse } from './test/lint/plugin.mjs';

const typed = ['**/*.{ts,tsx}'];
const tests = ['**/*.{spec,test}.{ts,tsx}', 'test/**/*.ts', '**/testing/**/*.ts'];

export default typescript.config(
  { ignores: ['**/dist/**', '**/node_modules/**', '.data/**', '.test-data/**', '**/*.d.ts'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  js.configs.recommended,
  {
    plugins: { weighhouse, 'import-x': importX },
    settings: {
      'import-x/resolver-next': [
        createTypeScriptImportResolver({
          project: ['{shared,server,client,db,test}/tsconfig.json'],
          noWarnOnMultipleProjects: true,
          conditionNames: ['source', 'types', 'import', 'node', 'default'],
        }),
      ],
    },
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'weighhouse/import-direction': 'error',
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      'import-x/no-self-import': 'error',
      'import-x/no-duplicates': ['error', { 'prefer-inline': true }],
    },
  },
  { files: ['**/*.{js,mjs}'], languageOptions: { globals: globals.node } },
  // The measuring scripts hand functions to the browser.
  { files: ['test/load/**/*.mjs'], languageOptions: { globals: globals.browser } },
  {
    files: typed,
    extends: [typescript.configs.strictTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      // Classes that only carry decorators are how modules are written.
      '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      // An interface's method may have to be asynchronous although one implementation waits for nothing.
      '@typescript-eslint/require-await': 'off',
      // Nest's options are classes that everybody fills with plain objects.
      '@typescript-eslint/no-unsafe-class-instance-assignment': 'off',
      // Overloads may differ in their documentation alone.
      '@typescript-eslint/unified-signatures': 'off',
    },
  },
  {
    // Nest reads the classes of constructor parameters at run time; an inline type import would erase them.
    files: ['server/**/*.ts', 'db/**/*.ts', 'test/**/*.ts'],
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    files: ['{shared,server,client,db}/src/**/*.{ts,tsx}'],
    ignores: ['shared/src/reasoning/*command.*', ...tests],
    rules: { 'no-console': 'error' },
  },
  {
    files: ['client/src/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat.recommended],
    languageOptions: { globals: globals.browser },
  },
  {
    // Places in these lists of numbers are computed; asking at each whether it is there would cost what the loops save.
    files: ['shared/src/reasoning/**/*.ts'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  {
    files: tests,
    rules: {
      // Matchers take methods by name, and what a response holds is asserted rather than typed.
      '@typescript-eslint/unbound-method': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
    },
  },
  prettier,
);
