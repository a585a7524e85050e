import eslint from '@eslint/js';
import angular from 'angular-eslint';
import prettier from 'eslint-config-prettier';
import { defineConfig } from 'eslint/config';
import tseslint from 'typescript-eslint';

/** What runs in a browser: the app, and the pages the benches open. */
const browserFiles = ['src/**/*.ts', 'tests/bench/*-page.ts'];

/** A flag at the call says nothing: `draw(true)`. Name an option or write two functions. */
const noBooleanParameters = {
  selector:
    ':matches(FunctionDeclaration, MethodDefinition > FunctionExpression) > ' +
    'Identifier.params > TSTypeAnnotation > TSBooleanKeyword',
  message: 'No boolean parameters: write two functions, or a named option.',
};

export default defineConfig(
  {
    ignores: [
      'dist/',
      'out/',
      'coverage/',
      '.angular/',
      '.postgres/',
      '.run/',
      'tests/layers/*ok/',
    ],
  },
  { linterOptions: { noInlineConfig: true, reportUnusedDisableDirectives: 'error' } },
  eslint.configs.recommended,
  {
    rules: {
      eqeqeq: 'error',
      // Control characters are refused by patterns that must name them.
      'no-control-regex': 'off',
      'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': ['error', { max: 40, skipBlankLines: true, skipComments: true }],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx', 'hack'] }],
      'no-param-reassign': 'error',
      'no-restricted-syntax': ['error', noBooleanParameters],
      'object-shorthand': 'error',
    },
  },
  {
    files: ['**/*.mjs', '**/*.cjs'],
    languageOptions: {
      globals: {
        process: 'readonly',
        console: 'readonly',
        URL: 'readonly',
        fetch: 'readonly',
        setInterval: 'readonly',
        performance: 'readonly',
      },
    },
  },
  { files: ['**/*.cjs'], languageOptions: { globals: { module: 'writable' } } },
  {
    files: ['**/*.ts'],
    extends: [tseslint.configs.strictTypeChecked],
    languageOptions: {
      parserOptions: { project: 'tsconfig.json', tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
      // Express 5 takes handlers that return promises; their rejections reach the error handler.
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { arguments: false } },
      ],
      '@typescript-eslint/no-misused-spread': ['error', { allow: ['string'] }],
      // Angular's option types are classes that plain objects are meant for.
      '@typescript-eslint/no-unsafe-class-instance-assignment': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { ignoreRestSiblings: true }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      '@typescript-eslint/unbound-method': ['error', { ignoreStatic: true }],
    },
  },
  {
    files: browserFiles,
    languageOptions: { parserOptions: { project: 'tsconfig.spec.json' } },
  },
  {
    files: ['tests/layers/pure-globals.d.ts'],
    extends: [tseslint.configs.disableTypeChecked],
    languageOptions: { parserOptions: { project: null } },
  },
  {
    files: ['src/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/directive-selector': [
        'error',
        { type: 'attribute', prefix: 'sl', style: 'camelCase' },
      ],
      '@angular-eslint/component-selector': [
        'error',
        { type: 'element', prefix: 'sl', style: 'kebab-case' },
      ],
      '@angular-eslint/prefer-signals': 'error',
      // Angular's and Material's options are classes that are always given as object literals.
      '@typescript-eslint/no-unsafe-class-instance-assignment': 'off',
    },
  },
  {
    files: ['src/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
    rules: { '@angular-eslint/template/no-inline-styles': 'off' },
  },
  {
    files: ['**/*.spec.ts', 'tests/**/*.ts'],
    rules: {
      'max-lines-per-function': 'off',
      '@typescript-eslint/no-non-null-assertion': 'off',
    },
  },
  prettier,
);
