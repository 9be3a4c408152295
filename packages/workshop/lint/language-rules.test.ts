import { join } from 'node:path';
import { ESLint } from 'eslint';
import { describe, expect, it, vi } from 'vitest';
import { root } from '../house/paths.mjs';

// Snippets stand in for a file that exists; without this, the type information would be read from the disk.
vi.stubEnv('TSESTREE_SINGLE_RUN', 'false');

const eslint = new ESLint({
  cwd: root,
  overrideConfig: {
    files: ['packages/engine/src/index.ts'],
    languageOptions: { parserOptions: { project: ['./packages/engine/tsconfig.json'] } },
  },
  ruleFilter: ({ ruleId }) => ruleId !== 'boundaries/dependencies',
});

const brokenRules = async (
  text: string,
  file = 'packages/engine/src/index.ts',
): Promise<(string | null)[]> => {
  const results = await eslint.lintText(text, { filePath: join(root, file) });
  return results.flatMap(({ messages }) => messages.map(({ ruleId, message }) => ruleId ?? message));
};

const parser = `import { Parser } from 'expr-eval';\nconst parser = new Parser();\n`;

describe('the rules on language', () => {
  it.each([
    ['no-eval', `export const x: unknown = eval('1');`],
    ['no-eval', `export const x: unknown = globalThis.eval('1');`],
    ['no-new-func', `export const x: unknown = new Function('return 1');`],
    ['no-new-func', `export const x: unknown = Function('return 1');`],
    ['no-restricted-properties', `export const x = globalThis.Function;`],
    ['no-restricted-imports', `export { runInNewContext } from 'node:vm';`],
    ['merestone/no-foreign-evaluation', `${parser}export const x: unknown = parser.evaluate('1 + 1');`],
    [
      'merestone/no-foreign-evaluation',
      `${parser}export const x: unknown = parser.parse('a').evaluate({ a: 1 });`,
    ],
    [
      'merestone/no-foreign-evaluation',
      `${parser}export const x: unknown = parser.parse('a')['evaluate']({ a: 1 });`,
    ],
    ['merestone/no-foreign-evaluation', `${parser}const { evaluate } = parser;\nexport { evaluate };`],
    ['merestone/no-foreign-evaluation', `${parser}export const x: unknown = Parser.evaluate('1 + 1');`],
    [
      'merestone/no-foreign-evaluation',
      `${parser}export const x: unknown = parser.parse('a').toJSFunction('a');`,
    ],
    [
      'merestone/no-foreign-evaluation',
      `export const f = (x: { toJSFunction(): number }) => x.toJSFunction();`,
    ],
    ['no-restricted-syntax', `const x = 1;\nexport default x;`],
    ['no-restricted-syntax', `const x = 1;\nexport { x as default };`],
    ['no-console', `console.log('here');`],
    ['eqeqeq', `export const same = (a: string, b: string) => a == b;`],
    ['@typescript-eslint/no-explicit-any', `export type Loose = any;`],
    ['@typescript-eslint/ban-ts-comment', `// @ts-expect-error: because\nexport const x: string = 1;`],
    ['@typescript-eslint/no-floating-promises', `const f = async () => Promise.resolve();\nf();`],
    [
      '@typescript-eslint/no-misused-promises',
      `const f = async () => Promise.resolve(true);\nexport const x = f() ? 1 : 2;`,
    ],
    [
      '@typescript-eslint/switch-exhaustiveness-check',
      `export const f = (x: 'a' | 'b') => {\n  switch (x) {\n    case 'a':\n      return 1;\n  }\n  return 0;\n};`,
    ],
    [
      '@typescript-eslint/consistent-type-imports',
      `import { CorrelationDefinition } from './sheet/definition.js';\nexport type Sheet = CorrelationDefinition;`,
    ],
  ])('%s bites', async (rule, text) => {
    expect(await brokenRules(`${text}\n`)).toContain(rule);
  });

  it('leaves functions of ours alone that are called evaluate', async () => {
    const text = `export const f = (x: { evaluate(): number }) => x.evaluate();\n`;
    expect(await brokenRules(text)).toEqual([]);
  });
});
