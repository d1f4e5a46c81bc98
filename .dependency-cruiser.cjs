/** Which way the arrows go. Each rule's comment is what a refusal means. */
module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'shared-is-pure',
      comment:
        'shared imports nothing of ours, no Node, no Nest, no React: it runs in the page and on the server.',
      severity: 'error',
      from: { path: '^packages/shared/src', pathNot: '(\\.test\\.ts$|/testing/)' },
      to: { path: ['^packages/(api|web)', 'node_modules/(@nestjs|react|typeorm)'] },
    },
    {
      name: 'shared-has-no-node',
      severity: 'error',
      from: { path: '^packages/shared/src', pathNot: '(\\.test\\.ts$|/testing/)' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'api-and-web-meet-in-shared',
      severity: 'error',
      from: { path: '^packages/api' },
      to: { path: '^packages/web' },
    },
    {
      name: 'web-and-api-meet-in-shared',
      severity: 'error',
      from: { path: '^packages/web/src' },
      to: { path: '^packages/api' },
    },
    {
      name: 'api-common-knows-no-feature',
      severity: 'error',
      from: { path: '^packages/api/src/common', pathNot: '\\.(e2e-)?spec\\.ts$' },
      to: { path: '^packages/api/src/(features|seed|testing)' },
    },
    {
      name: 'api-features-meet-at-the-door',
      comment:
        'One feature reaches another through its service, module, events or entity-free rules, and refers to its rows by id.',
      severity: 'error',
      from: { path: '^packages/api/src/features/([^/]+)/', pathNot: '\\.(e2e-)?spec\\.ts$' },
      to: {
        path: '^packages/api/src/features/([^/]+)/',
        pathNot: ['^packages/api/src/features/$1/', '\\.(service|module|events)\\.ts$'],
      },
    },
    {
      name: 'controllers-see-no-entities',
      severity: 'error',
      from: { path: '^packages/api/src/.*\\.(controller|gateway)\\.ts$' },
      to: { path: ['\\.entity\\.ts$', 'node_modules/typeorm'] },
    },
    {
      name: 'entities-know-no-services',
      severity: 'error',
      from: { path: '\\.entity\\.ts$' },
      to: { path: '\\.service\\.ts$' },
    },
    {
      name: 'migrations-import-nothing-of-ours',
      severity: 'error',
      from: { path: '^packages/api/src/database/migrations/[0-9]' },
      to: { path: '^packages/' },
    },
    {
      name: 'web-routes-compose',
      comment: 'app → routes → features → components, lib',
      severity: 'error',
      from: { path: '^packages/web/src/features', pathNot: '\\.test\\.tsx?$' },
      to: { path: '^packages/web/src/(app|routes)' },
    },
    {
      name: 'web-features-do-not-import-each-other',
      severity: 'error',
      from: { path: '^packages/web/src/features/([^/]+)/', pathNot: '\\.test\\.tsx?$' },
      to: { path: '^packages/web/src/features/([^/]+)/', pathNot: '^packages/web/src/features/$1/' },
    },
    {
      name: 'web-components-look-only',
      severity: 'error',
      from: { path: '^packages/web/src/components', pathNot: '\\.test\\.tsx?$' },
      to: { path: '^packages/web/src/(app|routes|features)' },
    },
    {
      name: 'web-lib-knows-no-pages',
      severity: 'error',
      from: { path: '^packages/web/src/lib', pathNot: '\\.test\\.tsx?$' },
      to: { path: '^packages/web/src/(app|routes|features|components)' },
    },
    {
      name: 'only-lib-touches-sockets',
      severity: 'error',
      from: { path: '^packages/web/src', pathNot: ['^packages/web/src/lib', '/testing/', '\\.test\\.tsx?$'] },
      to: { path: 'node_modules/(socket\\.io-client|idb-keyval)' },
    },
    {
      name: 'no-test-code-in-source',
      severity: 'error',
      from: { pathNot: '(\\.test\\.tsx?$|\\.(e2e-)?spec\\.ts$|/testing/|/e2e/|/test/)' },
      to: { path: '(\\.test\\.tsx?$|\\.(e2e-)?spec\\.ts$|^packages/[^/]+/src/testing/)' },
    },
    {
      name: 'declared-packages-only',
      severity: 'error',
      from: { path: '^packages/[^/]+/src', pathNot: '(\\.test\\.tsx?$|\\.(e2e-)?spec\\.ts$|/testing/)' },
      to: { dependencyTypes: ['npm-no-pkg', 'npm-unknown'] },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(/dist/|/node_modules/.*/node_modules/)' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.base.json' },
    enhancedResolveOptions: {
      conditionNames: ['source', 'import', 'require', 'node', 'default'],
      exportsFields: ['exports'],
    },
  },
};
