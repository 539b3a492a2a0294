import js from '@eslint/js';
import tseslint from 'typescript-eslint';

const pureGlobals = [
  'process',
  'Buffer',
  'window',
  'document',
  'navigator',
  'setTimeout',
  'setInterval',
  'fetch',
  'console',
];
const nodeGlobals = [
  'process',
  'console',
  'URL',
  'URLSearchParams',
  'fetch',
  'Buffer',
  'performance',
  'setTimeout',
  'clearTimeout',
  'setInterval',
  'clearInterval',
  'require',
  'module',
];
const message = 'This folder is pure: no node, DOM or editor symbol (DEVELOPERS.md, map of folders).';
const noClock = [
  {
    object: 'Math',
    property: 'random',
    message: 'Use core/numeric/generator.ts: every drawn number is seeded.',
  },
  {
    object: 'Date',
    property: 'now',
    message: 'Numbers and records must not depend on a clock; pass the time in.',
  },
];

export default tseslint.config(
  {
    ignores: [
      'dist/**',
      'node_modules/**',
      'coverage/**',
      '.cache/**',
      'test/**/fixtures/**',
      'test/fixtures-badImport/**',
      'test/pictures/**',
    ],
  },
  js.configs.recommended,
  {
    files: ['src/**/*.{ts,tsx}', 'test/**/*.{ts,tsx}'],
    extends: [...tseslint.configs.strictTypeChecked],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      eqeqeq: 'error',
    },
  },
  {
    files: ['src/{core,readers,compare,planning,settings,recheck,report,protocol,worker}/**/*.{ts,tsx}'],
    rules: {
      'no-restricted-globals': ['error', ...pureGlobals.map(name => ({ name, message }))],
      'no-restricted-properties': ['error', ...noClock],
    },
  },
  {
    // Published coefficients stay as printed, to more digits than a double holds, so that they can be compared.
    files: ['src/core/numeric/**/*.ts'],
    rules: { 'no-loss-of-precision': 'off' },
  },
  {
    files: ['test/**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
    },
  },
  {
    files: ['**/*.mjs', '**/*.mts', '**/*.js', '**/*.cjs'],
    languageOptions: {
      globals: Object.fromEntries(nodeGlobals.map(name => [name, 'readonly'])),
    },
    rules: { '@typescript-eslint/no-require-imports': 'off' },
  },
);
