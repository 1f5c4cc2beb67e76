import next from 'eslint-config-next';
import tseslint from 'typescript-eslint';

/**
 * Who may import whom, held here by name and in tests/architecture by following every import.
 *
 * @param {string[]} files
 * @param {string[]} patterns
 * @param {string} message
 * @param {string[]} ignores
 */
const forbid = (files, patterns, message, ignores = []) => ({
  files,
  ignores,
  rules: {
    '@typescript-eslint/no-restricted-imports': [
      'error',
      { patterns: patterns.map((group) => ({ group: [group], message, allowTypeImports: true })) },
    ],
  },
});

const config = [
  { ignores: ['.next/**', '.next-test/**', '.marlwick/**', 'node_modules/**', 'next-env.d.ts'] },
  ...next,
  ...tseslint.configs.recommendedTypeChecked.map((part) => ({
    ...part,
    files: ['**/*.{ts,tsx}'],
  })),
  {
    files: ['**/*.{ts,tsx}'],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
      eqeqeq: 'error',
      'no-console': 'error',
    },
  },
  {
    files: ['lib/engine/**/*.ts'],
    rules: {
      'no-restricted-globals': ['error', 'Date', 'process', 'window', 'document', 'fetch'],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'The engine knows no chance: pass a seed.' },
      ],
      '@typescript-eslint/no-restricted-imports': [
        'error',
        { patterns: [{ regex: '^[^.]', message: 'The engine imports only itself.' }] },
      ],
    },
  },
  forbid(
    ['components/**/*.{ts,tsx}'],
    ['@/db/*', '@/app/*', 'knex', 'pg', 'stripe', 'nodemailer'],
    'Components know neither database nor routes.',
  ),
  forbid(
    ['app/**/*.{ts,tsx}'],
    ['@/db/*', 'knex', 'pg', 'stripe', 'nodemailer'],
    'Routes call a use case in lib, never the database.',
  ),
  forbid(
    ['lib/**/*.ts'],
    ['@/app/*', '@/components/*', 'knex', 'pg'],
    'Use cases know neither screens nor the database driver.',
    ['lib/engine/**'],
  ),
  forbid(
    ['db/**/*.ts'],
    ['@/app/*', '@/components/*', 'next', 'next/*', 'react'],
    'The database layer knows no screens.',
  ),
];

export default config;
