/** Rules that a formatter cannot keep: Next's own, and the house's. No comment may switch one off. */
import next from 'eslint-config-next/core-web-vitals';
import typescript from 'eslint-config-next/typescript';

const DEFAULT_EXPORT = {
  selector: 'ExportDefaultDeclaration',
  message: 'Named exports, except where a tool asks for a default.',
};

/** @type {import('eslint').Linter.Config[]} */
const config = [
  { ignores: ['.next/', '.scratch/', 'openapi/types.gen.ts', 'next-env.d.ts', 'test-results/', 'coverage/', 'out/'] },
  ...next,
  ...typescript,
  {
    linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'off' },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': [
        'error',
        { 'ts-expect-error': true, 'ts-ignore': true, 'ts-nocheck': true },
      ],
      '@typescript-eslint/consistent-type-imports': 'error',
      // A name with an underscore says that something is left out on purpose.
      '@typescript-eslint/no-unused-vars': ['warn', { varsIgnorePattern: '^_', argsIgnorePattern: '^_' }],
      eqeqeq: 'error',
      'no-restricted-syntax': ['error', DEFAULT_EXPORT],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx'] }],
      'max-lines': ['error', { max: 300 }],
      'prefer-const': 'error',
    },
  },
  { files: ['app/**/*.tsx', '*.config.{ts,mjs}'], rules: { 'no-restricted-syntax': 'off' } },
  { files: ['app/**', 'components/**', 'engine/**', 'openapi/**'], rules: { 'no-console': 'error' } },
];

export default config;
