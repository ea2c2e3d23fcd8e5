import reactHooks from 'eslint-plugin-react-hooks'
import tseslint from 'typescript-eslint'
import { importZones } from './tests/architecture/lint-rules/import-zones'
import { kebabCaseFiles } from './tests/architecture/lint-rules/kebab-case-files'
import { noOuterHandle } from './tests/architecture/lint-rules/no-outer-handle'

const local = {
  rules: {
    'import-zones': importZones,
    'kebab-case-files': kebabCaseFiles,
    'no-outer-handle': noOuterHandle,
  },
}

export default tseslint.config(
  { ignores: ['dist/', 'data/', 'node_modules/', 'test-results/', 'playwright-report/'] },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    plugins: { local },
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      'local/import-zones': 'error',
      'local/kebab-case-files': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-restricted-syntax': [
        'error',
        { selector: 'ExportAllDeclaration', message: 'No barrels: import from the file that has the thing.' },
        { selector: 'TSEnumDeclaration', message: 'Use a union of string literals.' },
      ],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true, requireDefaultForNonUnion: false },
      ],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/restrict-template-expressions': [
        'error',
        { allowNumber: true, allowBoolean: true },
      ],
      // React calls event handlers and ignores what they return.
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      // An async function without await is how a synchronous implementation meets an async interface.
      '@typescript-eslint/require-await': 'off',
      // Branded quantities are numbers; so are unions that name their usual members.
      '@typescript-eslint/no-unsafe-unary-minus': 'off',
      '@typescript-eslint/no-redundant-type-constituents': 'off',
    },
  },
  {
    files: ['src/**/*.{ts,tsx}', 'shared/**/*.ts'],
    rules: { 'no-console': 'error' },
  },
  {
    // Numerical code walks matrices by index arithmetic, where every index is in range by construction.
    files: ['shared/engineering/**/*.ts'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      'react-hooks/rules-of-hooks': 'error',
      'react-hooks/exhaustive-deps': 'error',
      'react-hooks/set-state-in-render': 'error',
      'react-hooks/static-components': 'error',
      'react-hooks/purity': 'error',
    },
  },
  {
    files: ['server/**/*.ts'],
    rules: { 'local/no-outer-handle': 'error' },
  },
  {
    files: ['server/**/*.ts'],
    ignores: ['server/commands/**'],
    rules: { 'no-console': 'error' },
  },
  {
    // Tests read answers of fetch and of JSON.parse field by field; the checks are the assertions.
    files: ['tests/**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
)
