import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';

const pure = 'lib/domain is pure: take it as an argument.';
const environment = 'Read the environment in lib/platform/env.ts and import the value.';

/** What lib/domain may not touch: it runs in the browser, on the server and in tests, and always answers the same. */
const impureGlobals = [
  'process',
  'fetch',
  'performance',
  'crypto',
  'window',
  'document',
  'navigator',
  'localStorage',
  'sessionStorage',
  'setTimeout',
  'setInterval',
  'setImmediate',
  'console',
  'Buffer',
  'require',
].map((name) => ({ name, message: pure }));

export default [
  {
    ignores: [
      '.next/**',
      'dist/**',
      '.data/**',
      'public/**',
      'test-results/**',
      'playwright-report/**',
      'coverage/**',
      'next-env.d.ts',
    ],
  },
  ...nextVitals,
  ...nextTypescript,
  {
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-var': 'error',
      'prefer-const': 'error',
      'no-console': 'error',
      'no-restricted-properties': ['error', { object: 'process', property: 'env', message: environment }],
      'no-restricted-imports': [
        'error',
        {
          paths: [{ name: 'process', message: environment }],
          patterns: [
            {
              group: ['next/font/google'],
              message: 'Fonts are shipped with the product: use next/font/local.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-unused-expressions': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      '@typescript-eslint/only-throw-error': 'error',
    },
  },
  {
    files: ['lib/domain/**/*.ts'],
    rules: {
      'no-restricted-globals': ['error', ...impureGlobals],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: pure },
        { object: 'Math', property: 'random', message: pure },
        { object: 'globalThis', message: pure },
      ],
      'no-restricted-syntax': [
        'error',
        { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: pure },
        { selector: "CallExpression[callee.name='Date']", message: pure },
        { selector: 'ImportExpression', message: 'lib/domain loads everything up front.' },
      ],
      'no-restricted-imports': [
        'error',
        { patterns: [{ group: ['node:*', 'fs', 'path', 'crypto', 'os', 'process'], message: pure }] },
      ],
    },
  },
  {
    // Commands talk to a person at a terminal and are handed their settings by the environment.
    files: ['scripts/**', 'tests/**', '*.config.{ts,mjs}', '.dependency-cruiser.cjs', 'lib/platform/env.ts'],
    rules: { 'no-restricted-properties': 'off', 'no-console': 'off' },
  },
  { files: ['*.config.mjs'], rules: { 'import/no-anonymous-default-export': 'off' } },
];
