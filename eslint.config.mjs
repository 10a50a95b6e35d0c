import js from '@eslint/js';
import angular from 'angular-eslint';
import tseslint from 'typescript-eslint';

/** The house's walls: who may import whom. Each message names the room that was entered. */
const wall = (message, ...group) => ({ group, message });
const walls = (patterns) => ({
  'no-restricted-imports': ['error', { patterns }],
});
const outsideEngine = {
  regex: '^(?!\\.{1,2}/|mathjs(/number)?$)',
  message: 'The engine is pure: it imports mathjs and itself, nothing else.',
};

export default tseslint.config(
  { ignores: ['dist/', 'coverage/', '.headtree/', 'openapi/generated/', 'node_modules/'] },
  js.configs.recommended,
  {
    files: ['**/*.ts'],
    extends: [tseslint.configs.strictTypeChecked, tseslint.configs.stylisticTypeChecked],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-definitions': ['error', 'interface'],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      'max-lines': ['error', { max: 350, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    files: ['server/engine/**/*.ts'],
    ignores: ['**/*.spec.ts', 'server/engine/testing/**'],
    rules: walls([
      outsideEngine,
      wall('The engine knows no feature.', '**/features/**'),
      wall('The engine knows no middleware.', '**/middleware/**'),
      wall('The engine knows no database.', '**/db/**'),
    ]),
  },
  {
    files: ['server/features/**/*.ts'],
    ignores: ['**/*.spec.ts'],
    rules: walls([
      wall("Another feature's service may be used, never its routes.", '../*/*.routes'),
      wall('The server knows nothing of the applications.', '**/projects/**'),
    ]),
  },
  {
    files: ['server/middleware/**/*.ts', 'db/**/*.ts'],
    rules: walls([wall('The server knows nothing of the applications.', '**/projects/**')]),
  },
  {
    files: ['projects/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
      '@angular-eslint/prefer-signals': 'error',
      '@angular-eslint/component-class-suffix': 'off',
      '@angular-eslint/directive-class-suffix': 'off',
      '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
    },
  },
  {
    files: ['projects/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
  },
  {
    files: ['projects/**/*.ts'],
    rules: walls([
      wall('Both sides meet only in the generated contract types.', '**/server/**', '**/db/**'),
    ]),
  },
  {
    // A formula becomes a plain function once, at start-up, from text of this repository only.
    files: ['server/engine/formula/compile.ts'],
    rules: { '@typescript-eslint/no-implied-eval': 'off' },
  },
  {
    // Indices run over arrays of known length in the solver's inner loops.
    files: ['server/engine/analysis/**/*.ts'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  {
    files: ['**/*.mjs'],
    languageOptions: {
      globals: {
        process: 'readonly',
        console: 'readonly',
        setTimeout: 'readonly',
        fetch: 'readonly',
        clearTimeout: 'readonly',
        URL: 'readonly',
        Buffer: 'readonly',
      },
    },
  },
  {
    files: ['examples/**/*.js'],
    languageOptions: { globals: { document: 'readonly' } },
  },
);
