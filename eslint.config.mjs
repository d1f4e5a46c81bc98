import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const testFiles = ['**/*.test.{ts,tsx}', '**/*.spec.ts', '**/*.e2e-spec.ts', '**/e2e/**', '**/testing/**'];

const namedExportsOnly = {
  selector: 'ExportDefaultDeclaration',
  message: 'Named exports only: a thing has one name everywhere.',
};
const onlyUnitsWrite = {
  selector:
    'CallExpression[callee.object.property.name=/[rR]epository$/][callee.property.name=/^(save|insert|update|upsert|delete|remove|softRemove|increment|decrement|clear)$/]',
  message: 'Write through UnitOfWork: a repository shares its one connection with strangers.',
};

export default tseslint.config(
  {
    ignores: [
      '**/dist/',
      '**/node_modules/',
      'data/',
      '.cache/',
      'shots/',
      'test-results/',
      'playwright-report/',
      'coverage/',
    ],
  },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    files: ['packages/**/*.{ts,tsx}'],
    languageOptions: {
      parserOptions: {
        project: [
          'packages/shared/tsconfig.test.json',
          'packages/api/tsconfig.test.json',
          'packages/web/tsconfig.json',
        ],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'max-lines': ['error', { max: 300, skipBlankLines: false, skipComments: false }],
      'max-lines-per-function': ['error', { max: 50, skipBlankLines: true, skipComments: true }],
      'max-params': ['error', 4],
      complexity: ['error', 10],
      eqeqeq: 'error',
      'no-console': 'error',
      'no-restricted-syntax': ['error', namedExportsOnly],
    },
  },
  {
    files: ['packages/api/src/**/*.ts'],
    rules: { 'no-restricted-syntax': ['error', namedExportsOnly, onlyUnitsWrite] },
  },
  {
    files: ['packages/api/src/features/**/*.ts', 'packages/api/src/seed/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          paths: [
            {
              name: '@nestjs/typeorm',
              importNames: ['InjectRepository', 'InjectDataSource', 'InjectEntityManager'],
              message: 'Read through PreparedReader or Reader, write through UnitOfWork.',
            },
            { name: 'better-sqlite3', message: 'The connection belongs to common/database.' },
          ],
        },
      ],
    },
  },
  {
    // A Nest constructor lists its collaborators; eight of them are two services, which review sees to.
    files: [
      'packages/api/src/**/*.{service,controller,gateway,module,job,worker,realtime}.ts',
      'packages/api/src/seed/demo-loader.ts',
    ],
    rules: { 'max-params': ['error', 7] },
  },
  {
    // A wire schema or a table of the trade is one list; cutting it in two hides it.
    files: ['packages/shared/src/trade/**', 'packages/api/src/database/migrations/**'],
    rules: { 'max-lines': 'off' },
  },
  {
    files: ['packages/web/**/*.tsx'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      'react-hooks/rules-of-hooks': 'error',
      'react-hooks/exhaustive-deps': 'error',
      // Markup is long without being hard: a component may fill a page and a half.
      'max-lines-per-function': ['error', { max: 100, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    files: ['packages/web/src/**/*.{ts,tsx}'],
    ignores: ['packages/web/src/lib/**', ...testFiles],
    rules: {
      'no-restricted-globals': [
        'error',
        { name: 'fetch', message: 'Only lib/ touches the wire.' },
        { name: 'XMLHttpRequest', message: 'Only lib/ touches the wire.' },
        { name: 'WebSocket', message: 'Only lib/ touches the wire.' },
        { name: 'indexedDB', message: 'Only lib/ touches what is kept on the device.' },
      ],
    },
  },
  {
    files: testFiles,
    rules: { 'max-lines-per-function': 'off', 'max-lines': ['error', { max: 500 }], 'no-console': 'off' },
  },
  {
    files: ['**/*.{mjs,cjs,js}'],
    languageOptions: {
      globals: {
        process: 'readonly',
        console: 'readonly',
        URL: 'readonly',
        setTimeout: 'readonly',
        clearTimeout: 'readonly',
        fetch: 'readonly',
        Buffer: 'readonly',
        module: 'writable',
        document: 'readonly',
        window: 'readonly',
        localStorage: 'readonly',
        performance: 'readonly',
        setInterval: 'readonly',
        clearInterval: 'readonly',
      },
    },
  },
  { files: ['packages/api/bench/**', 'packages/api/src/bench/**'], rules: { 'no-console': 'off' } },
  { files: ['**/*.config.{ts,mts,mjs,js}'], rules: { 'no-restricted-syntax': 'off' } },
  prettier,
);
