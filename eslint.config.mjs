import boundaries from 'eslint-plugin-boundaries';
import reactHooks from 'eslint-plugin-react-hooks';
import { defineConfig } from 'eslint/config';
import globals from 'globals';
import tseslint from 'typescript-eslint';
import { dependencyRule } from './packages/workshop/lint/dependency-rule.mjs';
import { noForeignEvaluation } from './packages/workshop/lint/no-foreign-evaluation.mjs';

const toolConfigs = ['*.config.{ts,mjs}', 'web/vite.config.ts'];
const scripts = ['packages/workshop/**/*.mjs'];
const tests = ['**/*.test.{ts,tsx}', '**/src/testing/**', 'api/test/**', 'web/e2e/**'];

const strings = 'A string is never run as code.';
/** @type {import('eslint').Linter.RulesRecord} */
const noCodeFromStrings = {
  'no-eval': 'error',
  'no-new-func': 'error',
  'no-restricted-properties': [
    'error',
    ...['globalThis', 'window', 'self', 'global'].flatMap((object) =>
      ['eval', 'Function'].map((property) => ({ object, property, message: strings })),
    ),
  ],
  'no-restricted-imports': [
    'error',
    { paths: ['vm', 'node:vm'].map((name) => ({ name, message: strings })) },
  ],
};

const namedExportsOnly = ['ExportDefaultDeclaration', 'ExportSpecifier[exported.name="default"]'].map(
  (selector) => ({
    selector,
    message: 'Exports are named: a name that is searched for is found.',
  }),
);

export default defineConfig(
  {
    ignores: [
      '**/dist/',
      '**/node_modules/',
      '.data/',
      '.cache/',
      'packages/api-client/src/schema.generated.ts',
    ],
  },
  {
    // A rule that can be switched off beside the line it annoys is no rule.
    linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' },
  },
  {
    files: ['**/*.{ts,tsx,mjs}'],
    extends: [tseslint.configs.strictTypeChecked],
    plugins: { boundaries, merestone: { rules: { 'no-foreign-evaluation': noForeignEvaluation } } },
    languageOptions: {
      parserOptions: { project: ['./tsconfig.test.json'], tsconfigRootDir: import.meta.dirname },
    },
    settings: dependencyRule.settings,
    rules: {
      ...dependencyRule.rules,
      ...noCodeFromStrings,
      'merestone/no-foreign-evaluation': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-console': 'error',
      'max-lines': ['error', { max: 330 }],
      'no-restricted-syntax': ['error', ...namedExportsOnly],
      '@typescript-eslint/ban-ts-comment': [
        'error',
        { 'ts-ignore': true, 'ts-expect-error': true, 'ts-nocheck': true, 'ts-check': false },
      ],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'separate-type-imports' }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      // Express's types are widened the one way they offer.
      '@typescript-eslint/no-namespace': ['error', { allowDeclarations: true }],
      // A DTO class describes a shape for OpenAPI; answers are plain objects of that shape, and are spread as such.
      '@typescript-eslint/no-misused-spread': 'off',
      '@typescript-eslint/no-unsafe-class-instance-assignment': 'off',
      // Nest's modules are classes that only carry a decorator.
      '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
      '@typescript-eslint/no-import-type-side-effects': 'error',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', caughtErrors: 'none', ignoreRestSiblings: true },
      ],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
    },
  },
  {
    files: ['web/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat.recommended],
    languageOptions: { globals: globals.browser },
    rules: { 'react-hooks/exhaustive-deps': 'error' },
  },
  {
    files: ['web/**/*.tsx'],
    rules: { 'max-lines': ['error', { max: 230 }] },
  },
  {
    // A test may take for granted what it is about to find out, and stand in for something asynchronous.
    files: tests,
    rules: {
      'max-lines': ['error', { max: 500 }],
      '@typescript-eslint/no-non-null-assertion': 'off',
      // The bodies of answers under test; what is in them is for the assertions to say.
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/require-await': 'off',
    },
  },
  {
    files: [...scripts, ...toolConfigs],
    languageOptions: { globals: globals.node },
  },
  {
    // Scripts speak to a person at a terminal, and JavaScript has no cast for what JSON.parse gives back.
    files: scripts,
    rules: {
      'no-console': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  {
    // Tools ask for a default export, and packages without types of their own may have one.
    files: [...toolConfigs, '**/*.d.ts'],
    rules: { 'no-restricted-syntax': 'off' },
  },
  {
    // The benchmarks set the engine beside expr-eval's own evaluation, on formulas of their own.
    files: ['packages/workshop/bench/*.bench.mjs'],
    rules: { 'merestone/no-foreign-evaluation': 'off' },
  },
);
