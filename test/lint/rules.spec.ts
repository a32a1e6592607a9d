import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ESLint, Linter } from 'eslint';
import importX from 'eslint-plugin-import-x';
import typescript from 'typescript-eslint';
import { afterAll, describe, expect, it } from 'vitest';
import { plugin } from './plugin.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const eslint = new ESLint({ cwd: root });

interface Configuration {
  rules: Record<string, [number, ...unknown[]]>;
}

const rulesFor = async (file: string): Promise<Configuration['rules']> =>
  ((await eslint.calculateConfigForFile(path.join(root, file))) as Configuration).rules;

describe('the rule on import directions, inside the linter', () => {
  const complaints = (file: string, text: string): string[] =>
    new Linter({ cwd: root })
      .verify(
        text,
        {
          files: ['**/*.ts'],
          languageOptions: { parser: typescript.parser },
          plugins: { weighhouse: plugin },
          rules: { 'weighhouse/import-direction': 'error' },
        },
        { filename: path.join(root, file) },
      )
      .map(({ message }) => message);

  const file = 'server/src/people/people.service.ts';

  it.each([
    "import { CasesService } from '../cases/cases.service.js';",
    "import type { CasesService } from '../cases/cases.service.js';",
    "export { CasesService } from '../cases/cases.service.js';",
    "export * from '../cases/cases.service.js';",
    "const late = await import('../cases/cases.service.js');",
  ])('refuses %s', (text) => {
    expect(complaints(file, text)).toEqual([expect.stringContaining('people must not import cases')]);
  });

  it('lets a right import pass', () => {
    expect(complaints(file, "import { Clock } from '../platform/clock/clock.js';")).toEqual([]);
  });
});

describe('the rule on circles', () => {
  const folder = mkdtempSync(path.join(tmpdir(), 'circle-'));
  afterAll(() => {
    rmSync(folder, { recursive: true });
  });

  it('finds two files that import each other', async () => {
    writeFileSync(path.join(folder, 'a.mjs'), "import { b } from './b.mjs';\nexport const a = () => b;\n");
    writeFileSync(path.join(folder, 'b.mjs'), "import { a } from './a.mjs';\nexport const b = () => a;\n");
    const { 'import-x/no-cycle': setting } = await rulesFor('server/src/main.ts');
    const linter = new ESLint({
      cwd: folder,
      overrideConfigFile: true,
      overrideConfig: [
        {
          plugins: { 'import-x': importX as unknown as ESLint.Plugin },
          rules: { 'import-x/no-cycle': setting as Linter.RuleEntry },
        },
      ],
    });
    const [result] = await linter.lintFiles(['a.mjs']);
    expect(result?.messages).toMatchObject([{ ruleId: 'import-x/no-cycle', severity: 2 }]);
  });
});

describe('what is switched on', () => {
  const error = 2;

  it.each([
    ['server/src/cases/cases.service.ts', 'weighhouse/import-direction'],
    ['client/src/features/cases/routes/case.tsx', 'weighhouse/import-direction'],
    ['shared/src/contracts/cases.ts', 'weighhouse/import-direction'],
    ['server/src/cases/cases.service.ts', 'import-x/no-cycle'],
    ['client/src/app/router.tsx', 'import-x/no-cycle'],
    ['server/src/cases/cases.service.ts', '@typescript-eslint/no-explicit-any'],
    ['test/browser/job.test.ts', '@typescript-eslint/no-explicit-any'],
    ['server/src/cases/cases.service.ts', '@typescript-eslint/no-floating-promises'],
    ['server/src/cases/cases.service.ts', 'no-console'],
    ['client/src/features/cases/routes/case.tsx', 'react-hooks/rules-of-hooks'],
  ])('in %s: %s', async (file, rule) => {
    expect((await rulesFor(file))[rule]?.[0]).toBe(error);
  });
});
