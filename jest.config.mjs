// Node 20 cannot require() ES modules under Jest, so every file, ours or not, is compiled to CommonJS by swc.
const swc = (jsx) => [
  '@swc/jest',
  {
    jsc: {
      parser: { syntax: 'typescript', tsx: jsx, decorators: true },
      transform: {
        legacyDecorator: true,
        decoratorMetadata: true,
        useDefineForClassFields: false,
        react: { runtime: 'automatic' },
      },
      target: 'es2022',
      experimental: { cacheRoot: '.cache/swc' },
    },
    module: { type: 'commonjs' },
  },
];

const project = (name, { jsx = false, ...rest } = {}) => ({
  displayName: name,
  rootDir: `packages/${name}`,
  transform: { '^.+\\.(t|j|mj)sx?$': swc(jsx), '^.+\\.mjs$': swc(false) },
  transformIgnorePatterns: [],
  moduleNameMapper: {
    '^(\\.{1,2}/.*)\\.js$': ['$1.ts', '$1.tsx', '$1.js'],
    '\\.css$': '<rootDir>/src/testing/style-stub.ts',
  },
  testEnvironment: 'node',
  testEnvironmentOptions: { customExportConditions: ['source', 'node', 'node-addons'] },
  ...rest,
});

export default {
  cacheDirectory: '.cache/jest',
  // A slow machine is no failure: only what never ends is.
  testTimeout: 60_000,
  projects: [
    project('shared', { testMatch: ['<rootDir>/src/**/*.test.ts'] }),
    project('api', {
      testMatch: [
        '<rootDir>/src/**/*.spec.ts',
        '<rootDir>/src/**/*.e2e-spec.ts',
        '<rootDir>/test/**/*.e2e-spec.ts',
      ],
    }),
    project('web', {
      jsx: true,
      testMatch: ['<rootDir>/src/**/*.test.{ts,tsx}'],
      testEnvironment: '<rootDir>/src/testing/environment.ts',
      // Not 'browser': msw answers Node's fetch, and hides that from browsers.
      testEnvironmentOptions: { customExportConditions: ['source'] },
      setupFiles: ['<rootDir>/src/testing/globals.ts'],
      setupFilesAfterEnv: ['<rootDir>/src/testing/setup.ts'],
    }),
  ],
};
