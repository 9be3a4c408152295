import { join } from 'node:path';
import { ESLint } from 'eslint';
import tseslint from 'typescript-eslint';
import { describe, expect, it } from 'vitest';
import { root } from '../house/paths.mjs';

// The repository's own configuration with this one rule, on snippets at places where a file could stand.
const eslint = new ESLint({
  cwd: root,
  overrideConfig: [tseslint.configs.disableTypeChecked],
  ruleFilter: ({ ruleId }) => ruleId === 'boundaries/dependencies',
});

const complaints = async (file: string, text: string): Promise<string[]> => {
  const results = await eslint.lintText(text, { filePath: join(root, file) });
  return results.flatMap(({ messages }) => messages.map(({ message }) => message));
};

/** [importing file, what it imports] */
type Import = readonly [file: string, specifier: string];

const feature = 'api/src/correlations';

const forbidden: Record<string, Import[]> = {
  'the server and the screens never meet': [
    [`${feature}/correlations.service.ts`, '../../../web/src/shared/format/number.js'],
    [`${feature}/correlations.service.ts`, '@merestone/web'],
    [`${feature}/correlations.service.ts`, '@merestone/api-client'],
    [`${feature}/correlations.service.test.ts`, '../../../web/src/shared/format/number.js'],
    ['web/src/features/register/register-page.tsx', '../../../../api/src/common/roles'],
    ['web/src/features/register/register-page.tsx', '@merestone/api'],
    ['web/src/features/register/register-page.test.tsx', '../../../../api/src/common/roles'],
    ['web/e2e/register.test.ts', '../../api/src/main.js'],
    ['web/src/shared/api/client.ts', '@nestjs/common'],
    ['web/src/shared/api/client.ts', 'node:fs'],
    [`${feature}/correlations.service.ts`, 'react'],
  ],
  'the engine uses nothing of ours and nothing of Node': [
    ['packages/engine/src/index.ts', '@merestone/api-client'],
    ['packages/engine/src/index.ts', '../../../api/src/common/roles.js'],
    ['packages/engine/src/sheet/definition.ts', '../../../../web/src/theme/palette.js'],
    ['packages/engine/src/sheet/definition.ts', '../../../workshop/browser.mjs'],
    ['packages/engine/src/sheet/definition.ts', 'node:fs'],
    ['packages/engine/src/sheet/definition.ts', 'class-validator'],
    ['packages/engine/src/sheet/definition.ts', 'mathjs'],
    ['packages/engine/src/sheet/definition.ts', 'expr-eval'],
    ['packages/api-client/src/index.ts', '@merestone/engine'],
    ['packages/api-client/src/index.ts', '../../../api/src/common/roles.js'],
  ],
  'the engine is entered by its index alone': [
    [`${feature}/correlations.service.ts`, '@merestone/engine/src/sheet/definition.js'],
    [`${feature}/correlations.service.ts`, '../../../packages/engine/src/sheet/definition.js'],
    ['web/src/features/evaluation/preview.ts', '../../../../packages/engine/src/bounds/strip'],
  ],
  'expressions are parsed in one place': [
    [`${feature}/correlations.service.ts`, 'expr-eval'],
    ['web/src/features/evaluation/preview.ts', 'expr-eval'],
  ],
  'common and database know no feature': [
    ['api/src/common/problem.ts', '../correlations/correlations.service.js'],
    ['api/src/common/problem.ts', '../database/connection.js'],
    ['api/src/common/access/permission.ts', '../../journal/entry.js'],
    ['api/src/config/config.ts', '../people/person.js'],
    ['api/src/database/connection.ts', '../correlations/correlations.repository.js'],
    ['api/src/database/connection.ts', '../journal/append.js'],
    ['api/src/database/write.ts', '../people/person.js'],
    ['api/src/database/schema/people.ts', '../../people/person.js'],
    ['api/src/database/connection.ts', './seed/seed-office.js'],
    [`${feature}/correlations.service.ts`, '../database/seed/seed-office.js'],
    [`${feature}/correlations.service.ts`, '../main.js'],
  ],
  'controller, then service, then repository': [
    [`${feature}/correlations.controller.ts`, './correlations.repository.js'],
    [`${feature}/correlations.controller.ts`, './correlations.read-model.js'],
    [`${feature}/correlations.controller.ts`, '../database/connection.js'],
    [`${feature}/correlations.controller.ts`, 'drizzle-orm'],
    [`${feature}/correlations.service.ts`, './correlations.controller.js'],
    [`${feature}/correlations.service.ts`, './correlations.module.js'],
    [`${feature}/correlations.repository.ts`, './correlations.service.js'],
    [`${feature}/correlations.read-model.ts`, './correlations.service.js'],
    [`${feature}/correlations.read-model.ts`, './correlations.controller.js'],
    [`${feature}/dto/sheet.dto.ts`, '../correlations.repository.js'],
    [`${feature}/dto/sheet.dto.ts`, '../../database/schema/people.js'],
  ],
  'Drizzle and SQLite stay in database, repositories and read models': [
    [`${feature}/correlations.service.ts`, 'drizzle-orm'],
    [`${feature}/correlations.service.ts`, 'drizzle-orm/better-sqlite3'],
    [`${feature}/correlations.service.ts`, 'better-sqlite3'],
    [`${feature}/content.ts`, 'drizzle-orm'],
    ['api/src/common/problem.ts', 'drizzle-orm'],
    ['api/src/app.module.ts', 'better-sqlite3'],
    ['web/src/shared/api/client.ts', 'drizzle-orm'],
  ],
  'policies, errors and mappers are pure': [
    [`${feature}/correlations.policy.ts`, '@nestjs/common'],
    [`${feature}/correlations.errors.ts`, '@nestjs/common'],
    [`${feature}/correlations.mapper.ts`, '@nestjs/swagger'],
    [`${feature}/correlations.policy.ts`, 'drizzle-orm'],
    [`${feature}/correlations.mapper.ts`, 'drizzle-orm'],
    [`${feature}/correlations.policy.ts`, './correlations.service.js'],
    [`${feature}/correlations.policy.ts`, './correlations.repository.js'],
    [`${feature}/correlations.policy.ts`, '../database/connection.js'],
  ],
  'another feature only through what its module exports': [
    [`${feature}/correlations.service.ts`, '../reviews/reviews.repository.js'],
    [`${feature}/correlations.service.ts`, '../reviews/reviews.read-model.js'],
    [`${feature}/correlations.module.ts`, '../reviews/reviews.controller.js'],
    ['api/src/journal/journal.service.ts', '../people/people.service.js'],
    ['api/src/people/people.service.ts', '../session/session.service.js'],
  ],
  'shared, then features, then app': [
    ['web/src/shared/ui/equation.tsx', '../../features/register/register-page'],
    ['web/src/shared/ui/equation.tsx', '../../app/paths'],
    ['web/src/theme/palette.ts', '../shared/format/number'],
    ['web/src/features/register/register-page.tsx', '../../app/paths'],
    ['web/src/features/register/register-page.tsx', '../evaluation/evaluation-panel'],
    ['web/src/features/register/components/row.tsx', '../../evaluation/evaluation-panel'],
    ['web/src/features/register/register-page.test.tsx', '../evaluation/evaluation-panel'],
  ],
  'nothing but a test imports from a test': [
    [`${feature}/correlations.service.ts`, './correlations.service.test.js'],
    [`${feature}/correlations.service.ts`, '../../test/support/create-test-app.js'],
    ['packages/engine/src/expression/parse.ts', '../testing/random-tree.js'],
    ['web/src/features/register/register-page.tsx', './register-page.test'],
  ],
};

const allowed: Import[] = [
  ['packages/engine/src/index.ts', './sheet/definition.js'],
  ['packages/engine/src/sheet/definition.ts', '../quantity/dictionary.js'],
  ['packages/engine/src/sheet/definition.ts', '@sinclair/typebox'],
  ['packages/engine/src/expression/tokens-of.ts', 'expr-eval'],
  ['packages/engine/src/expression/parse.test.ts', 'mathjs'],
  ['packages/engine/src/expression/parse.test.ts', 'node:fs'],
  ['packages/engine/src/expression/parse.test.ts', '../testing/random-tree.js'],
  ['packages/engine/src/testing/random-tree.ts', 'fast-check'],
  [`${feature}/correlations.controller.ts`, './correlations.service.js'],
  [`${feature}/correlations.controller.ts`, './dto/sheet.dto.js'],
  [`${feature}/correlations.controller.ts`, '../common/access/permission.decorator.js'],
  [`${feature}/correlations.service.ts`, './correlations.repository.js'],
  [`${feature}/correlations.service.ts`, './correlations.policy.js'],
  [`${feature}/correlations.service.ts`, '../database/write.js'],
  [`${feature}/correlations.service.ts`, '../reviews/reviews.service.js'],
  [`${feature}/correlations.service.ts`, '../config/config.js'],
  [`${feature}/correlations.service.ts`, '@merestone/engine'],
  [`${feature}/correlations.module.ts`, '../reviews/reviews.module.js'],
  [`${feature}/correlations.repository.ts`, 'drizzle-orm'],
  [`${feature}/correlations.read-model.ts`, 'drizzle-orm/sqlite-core'],
  [`${feature}/correlations.repository.ts`, '../database/schema/people.js'],
  [`${feature}/correlations.policy.ts`, '../common/authorized.js'],
  [`${feature}/correlations.policy.ts`, '@merestone/engine'],
  [`${feature}/correlations.service.test.ts`, './correlations.repository.js'],
  [`${feature}/correlations.service.test.ts`, '../../test/support/create-test-app.js'],
  ['api/src/database/connection.ts', 'drizzle-orm/better-sqlite3'],
  ['api/src/database/write.ts', '../journal/append.js'],
  ['api/src/database/write.ts', '../common/clock.js'],
  ['api/src/database/seed/seed-office.ts', '../../reviews/reviews.service.js'],
  ['api/src/main.ts', './database/seed/seed-office.js'],
  ['api/src/app.module.ts', './correlations/correlations.module.js'],
  ['api/test/frozen-rows.test.ts', 'better-sqlite3'],
  ['api/test/frozen-rows.test.ts', './support/create-test-app.js'],
  ['api/test/frozen-rows.test.ts', '../src/database/connection.js'],
  ['web/src/main.tsx', './app/router'],
  ['web/src/app/router.tsx', '../features/register/register-page'],
  ['web/src/app/router.tsx', '../shared/session/use-session'],
  ['web/src/features/register/register-page.tsx', './components/row'],
  ['web/src/features/register/register-page.tsx', '../../shared/ui/equation'],
  ['web/src/features/register/register-page.tsx', '@merestone/engine'],
  ['web/src/shared/api/client.ts', '@merestone/api-client'],
  ['web/src/shared/ui/equation.tsx', '../../theme/palette'],
  ['web/e2e/register.test.ts', '@merestone/workshop/browser'],
  ['web/e2e/register.test.ts', '../../packages/workshop/serve-for-tests.mjs'],
  ['web/e2e/register.test.ts', './support/sign-in.js'],
  ['packages/workshop/bench/engine.bench.mjs', '@merestone/engine'],
];

describe('the dependency rule', () => {
  for (const [sentence, imports] of Object.entries(forbidden)) {
    it.each(imports)(`${sentence}: %s may not import %s`, async (file, specifier) => {
      expect(await complaints(file, `import { x } from '${specifier}';\nvoid x;\n`)).toHaveLength(1);
    });
  }

  it.each(allowed)('%s may import %s', async (file, specifier) => {
    expect(await complaints(file, `import { x } from '${specifier}';\nvoid x;\n`)).toEqual([]);
  });

  it.each([
    `import type { X } from '../../features/register/row';\n`,
    `export { x } from '../../features/register/row';\n`,
    `export type { X } from '../../features/register/row';\n`,
    `export * from '../../features/register/row';\n`,
    `void import('../../features/register/row');\n`,
    `const x = require('../../features/register/row');\n`,
  ])('sees every way of importing: %s', async (text) => {
    expect(await complaints('web/src/shared/ui/equation.tsx', text)).toHaveLength(1);
  });

  it('lets a mapper name the type of a row, and nothing else of the database', async () => {
    const file = `${feature}/correlations.mapper.ts`;
    expect(await complaints(file, `import type { Row } from '../database/schema/people.js';\n`)).toEqual([]);
    expect(await complaints(file, `import type { Row } from './correlations.read-model.js';\n`)).toEqual([]);
    expect(await complaints(file, `import type { SQL } from 'drizzle-orm';\n`)).toHaveLength(1);
    expect(await complaints(file, `import { people } from '../database/schema/people.js';\n`)).toHaveLength(
      1,
    );
  });

  it('lets a DTO name the type of what it shows', async () => {
    const text = `import type { Shown } from '../correlations.read-model.js';\n`;
    expect(await complaints(`${feature}/dto/sheet.dto.ts`, text)).toEqual([]);
  });

  it('cannot be switched off beside a line', async () => {
    const text = `// eslint-disable-next-line boundaries/dependencies\nimport { x } from '../../app/paths';\n`;
    const messages = await complaints('web/src/shared/ui/equation.tsx', text);
    expect(messages.some((message) => message.includes('dependency rule'))).toBe(true);
  });
});
