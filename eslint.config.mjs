import next from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

const config = [
  { ignores: ['.next*/**', 'node_modules/**', 'test-results/**', 'playwright-report/**', '.data/**', 'next-env.d.ts', 'db/migrations/**'] },
  ...next,
  ...typescript,
  {
    rules: {
      'max-lines': ['error', { max: 350, skipBlankLines: true, skipComments: true }],
      'max-params': ['error', 4],
      'max-depth': ['error', 3],
      'no-console': 'error',
      'no-restricted-imports': ['error', { paths: [{ name: 'zod', message: 'Import { z } from lib/zod: it is set up for the content security policy.' }] }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
    },
  },
  { files: ['components/**/*.tsx', 'app/**/*.tsx'], rules: { 'max-lines-per-function': ['error', { max: 120, skipBlankLines: true, skipComments: true }] } },
  {
    files: ['lib/**/*.ts', 'db/**/*.ts', 'components/**/*.ts', 'app/**/*.ts'],
    rules: { 'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }] },
  },
  { files: ['lib/zod.ts'], rules: { 'no-restricted-imports': 'off' } },
  { files: ['scripts/**', 'seed/**', 'tests/**'], rules: { 'no-console': 'off', 'max-lines-per-function': 'off' } },
  // Tables of data are as long as their data.
  { files: ['seed/**', 'tests/**'], rules: { 'max-lines': 'off' } },
]
export default config
