import next from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

const typeAware = {
  files: ['**/*.ts', '**/*.tsx'],
  languageOptions: { parserOptions: { projectService: true } },
  rules: {
    '@typescript-eslint/no-explicit-any': 'error',
    '@typescript-eslint/no-non-null-assertion': 'error',
    '@typescript-eslint/no-floating-promises': 'error',
    '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
    '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
    '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    'max-lines': ['error', { max: 400, skipBlankLines: false, skipComments: false }],
    'max-lines-per-function': ['error', { max: 80, skipBlankLines: true, skipComments: true }],
  },
}

const deterministicCore = {
  files: ['lib/core/**/*.ts'],
  rules: {
    'no-restricted-globals': ['error', 'Date', 'process', 'Buffer', 'fetch', 'setTimeout', 'setInterval'],
    'no-restricted-properties': ['error', { object: 'Math', property: 'random' }],
  },
}

/** A test describes a whole story in one function; a table of cases is one long literal. */
const tests = {
  files: ['tests/**/*.ts', 'tests/**/*.tsx'],
  rules: { 'max-lines-per-function': 'off' },
}

const config = [
  { ignores: ['.next*/**', '.workers/**', '.data/**', 'node_modules/**', 'next-env.d.ts', 'coverage/**'] },
  ...next,
  ...typescript,
  typeAware,
  deterministicCore,
  tests,
]

export default config
