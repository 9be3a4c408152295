import { fromRoot, root } from '../house/paths.mjs';

/**
 * Who may import whom. Everything local is forbidden unless a policy below allows it; of several that match, the last
 * one decides, so the allowances stand first and the prohibitions after them.
 */

/** @param {string} type @param {string} pattern @param {string[]} [capture] */
const room = (type, pattern, capture) => ({
  type,
  pattern,
  partialMatch: false,
  ...(capture === undefined ? {} : { capture }),
});

/** The rooms of the house by folder, the most particular first. */
const rooms = [
  room('engine', 'packages/engine/src'),
  room('api-client', 'packages/api-client/src'),
  room('workshop', 'packages/workshop'),
  room('api-common', 'api/src/{common,config}'),
  room('api-seed', 'api/src/database/seed'),
  room('api-database', 'api/src/database'),
  room('api-feature', 'api/src/*', ['feature']),
  room('api-root', 'api/src'),
  room('api-test', 'api/test'),
  room('web-shared', 'web/src/shared'),
  room('web-theme', 'web/src/theme'),
  room('web-feature', 'web/src/features/*', ['feature']),
  room('web-app', 'web/src/app'),
  room('web-root', 'web/src'),
  room('web-e2e', 'web/e2e'),
];

/** The kinds of files, told by their names; `file` holds for every one, so that no file is without a kind. */
const kinds = [
  { category: 'file', pattern: '{packages,api,web}/**/*' },
  { category: 'test', pattern: '**/*.test.{ts,tsx}' },
  { category: 'test', pattern: '{api/test,web/e2e,packages/engine/src/testing}/**/*' },
  { category: 'controller', pattern: '**/*.controller.ts' },
  { category: 'service', pattern: '**/*.service.ts' },
  { category: 'repository', pattern: '**/*.repository.ts' },
  { category: 'repository', pattern: '**/*.read-model.ts' },
  { category: 'nest-module', pattern: '**/*.module.ts' },
  { category: 'pure', pattern: '**/*.{policy,errors,mapper}.ts' },
  { category: 'dto', pattern: '**/dto/**/*.ts' },
];

const product = { categories: { noneOf: ['test'] } };
const api = ['api-common', 'api-seed', 'api-database', 'api-feature', 'api-root'];
const web = ['web-shared', 'web-theme', 'web-feature', 'web-app', 'web-root'];
const local = (/** @type {string | string[]} */ type) => ({ element: { type } });
const packages = { element: { type: ['engine', 'api-client'], fileInternalPath: 'index.ts' } };
const engine = { element: { type: 'engine', fileInternalPath: 'index.ts' } };
const otherFeature = { captured: { feature: '!{{ from.element.captured.feature }}' } };

const allowances = [
  { allow: { to: { module: { origin: ['external', 'core'] } } } },
  { allow: { dependency: { relationship: { to: 'internal' } } } },
  { from: { element: { isUnknown: true } }, allow: { to: local('workshop') } },

  { from: local('workshop'), allow: { to: packages } },

  { from: local(api), allow: { to: engine } },
  { from: local('api-database'), allow: { to: local('api-common') } },
  // The one way to write appends its journal row itself; apart from that the database knows no feature.
  {
    from: { element: { type: 'api-database', fileInternalPath: '{write,append-to-journal}.ts' } },
    allow: { to: { element: { type: 'api-feature', captured: { feature: 'journal' } } } },
  },
  { from: local('api-feature'), allow: { to: local(['api-common', 'api-database', 'api-feature']) } },
  { from: local('api-seed'), allow: { to: local(['api-common', 'api-database', 'api-feature']) } },
  {
    from: local('api-root'),
    allow: { to: local(['api-common', 'api-database', 'api-feature', 'api-seed']) },
  },
  { from: local('api-test'), allow: { to: [engine, local([...api, 'api-test', 'workshop'])] } },
  {
    from: { element: { type: api }, file: { categories: 'test' } },
    allow: { to: [engine, local([...api, 'api-test'])] },
  },

  { from: local([...web, 'web-e2e']), allow: { to: packages } },
  { from: local('web-shared'), allow: { to: local('web-theme') } },
  { from: local('web-feature'), allow: { to: [local(['web-shared', 'web-theme'])] } },
  { from: local('web-app'), allow: { to: local(['web-shared', 'web-theme', 'web-feature']) } },
  { from: local('web-root'), allow: { to: local(['web-app', 'web-shared', 'web-theme']) } },
  { from: local('web-e2e'), allow: { to: local([...web, 'workshop']) } },
];

const prohibitions = [
  {
    from: { file: product },
    disallow: { to: { file: { categories: 'test' } } },
    message: 'Nothing but a test imports from a test.',
  },
  {
    from: { element: { type: 'engine' }, file: product },
    disallow: { to: { module: { origin: 'core' } } },
    message: 'The engine runs in the browser too: no module of Node in it.',
  },
  {
    from: { element: { type: 'engine' }, file: product },
    disallow: {
      to: { module: { origin: 'external', source: '!(@sinclair/typebox|expr-eval|js-quantities)' } },
    },
    message: 'The engine stands on its three libraries alone; {{to.module.source}} is not among them.',
  },
  {
    from: { element: { type: 'engine', fileInternalPath: '!(expression/**)' } },
    disallow: { to: { module: { source: 'expr-eval' } } },
    message: 'expr-eval parses in one place, src/expression/, and is known nowhere else.',
  },
  {
    from: { element: { type: [...api, 'api-test', ...web, 'web-e2e', 'api-client'] } },
    disallow: { to: { module: { source: 'expr-eval' } } },
    message: 'Only the engine parses expressions.',
  },
  {
    from: { element: { type: web }, file: product },
    disallow: { to: { module: { origin: 'core' } } },
    message: 'The screens run in a browser: no module of Node.',
  },
  {
    from: local([...web, 'engine', 'api-client']),
    disallow: {
      to: {
        module: {
          source: [
            '@nestjs/*',
            'drizzle-orm',
            'better-sqlite3',
            'express*',
            'passport*',
            '@node-rs/*',
            'nodemailer',
          ],
        },
      },
    },
    message: '{{to.module.source}} belongs to the server.',
  },
  {
    from: { element: { type: [...api, 'engine'] }, file: product },
    disallow: { to: { module: { source: ['react*', 'antd', 'swr', 'katex', '@merestone/api-client'] } } },
    message: '{{to.module.source}} belongs to the screens.',
  },
  {
    from: { element: { type: ['api-common', 'api-root', 'api-seed'] }, file: product },
    disallow: { to: { module: { source: ['drizzle-orm', 'better-sqlite3'] } } },
    message: 'Drizzle and SQLite are known to src/database, repositories and read models only.',
  },
  {
    from: {
      element: { type: 'api-feature' },
      file: { categories: { noneOf: ['repository', 'test'] } },
    },
    disallow: { to: { module: { source: ['drizzle-orm', 'better-sqlite3'] } } },
    message: 'Drizzle and SQLite are known to src/database, repositories and read models only.',
  },
  {
    from: { element: { type: api }, file: { categories: 'controller' } },
    disallow: {
      to: [{ file: { categories: ['repository', 'controller'] } }, local('api-database')],
    },
    message: 'A controller delegates to a service; it knows no repository and no database.',
  },
  {
    from: { element: { type: api }, file: { categories: 'service' } },
    disallow: { to: { file: { categories: ['controller', 'nest-module'] } } },
    message: 'A service knows neither controllers nor modules.',
  },
  {
    from: { element: { type: api }, file: { categories: { anyOf: ['repository'], noneOf: ['test'] } } },
    disallow: { to: { file: { categories: ['controller', 'service', 'nest-module'] } } },
    message: 'A repository is at the bottom: it knows no controller, service or module.',
  },
  {
    from: { element: { type: api }, file: { categories: 'dto' } },
    dependency: { kind: 'value' },
    disallow: {
      to: [
        { file: { categories: ['controller', 'service', 'repository', 'nest-module'] } },
        local('api-database'),
      ],
    },
    message: 'A DTO describes; it knows no controller, service, repository, module or database.',
  },
  {
    from: { element: { type: api }, file: { categories: 'pure' } },
    disallow: { to: { module: { source: ['@nestjs/*', 'drizzle-orm', 'better-sqlite3'] } } },
    message: 'Policies, errors and mappers are free of Nest and Drizzle.',
  },
  {
    from: { element: { type: api }, file: { categories: 'pure' } },
    dependency: { kind: 'value' },
    disallow: {
      to: [
        { file: { categories: ['controller', 'service', 'repository', 'nest-module'] } },
        local('api-database'),
      ],
    },
    message:
      'Policies, errors and mappers may name the types of what reads and writes, but use nothing of it.',
  },
  {
    from: { element: { type: 'api-feature' }, file: product },
    disallow: {
      to: {
        element: { type: 'api-feature', ...otherFeature },
        file: { categories: ['controller', 'repository'] },
      },
    },
    message:
      'Another feature is used through what its module exports, never through its controller or repository.',
  },
  {
    from: { element: { type: 'api-feature', captured: { feature: ['journal', 'people'] } }, file: product },
    disallow: { to: { element: { type: 'api-feature', ...otherFeature } } },
    message: 'journal and people serve all features and use none.',
  },
];

/** Settings and rule for eslint-plugin-boundaries. */
export const dependencyRule = {
  settings: {
    'boundaries/root-path': root,
    'boundaries/elements': rooms,
    'boundaries/elements-single-match': true,
    'boundaries/files': kinds,
    'boundaries/dependency-nodes': ['import', 'export', 'dynamic-import', 'require'],
    'boundaries/legacy-templates': false,
    'import/resolver': { [fromRoot('packages', 'workshop', 'lint', 'resolve-import.mjs')]: {} },
  },
  /** @type {import('eslint').Linter.RulesRecord} */
  rules: {
    'boundaries/dependencies': [
      'error',
      {
        default: 'disallow',
        checkAllOrigins: true,
        checkUnknownLocals: true,
        checkInternals: true,
        message:
          '{{from.file.path}} may not import {{dependency.source}}: the dependency rule between the rooms has no place for it.',
        policies: [...allowances, ...prohibitions],
      },
    ],
  },
};
