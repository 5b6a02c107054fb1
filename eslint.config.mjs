import eslint from '@eslint/js';
import angular from 'angular-eslint';
import prettier from 'eslint-config-prettier';
import { defineConfig, globalIgnores } from 'eslint/config';
import globals from 'globals';
import tseslint from 'typescript-eslint';
import importRules from './tests/architecture/eslint-import-rules.mjs';

const zodImport = {
  selector:
    "ImportDeclaration[source.value='zod'] > :matches(ImportSpecifier[imported.name='z'], ImportDefaultSpecifier)",
  message: "Write import * as z from 'zod': the z object defeats tree-shaking (+360 kB).",
};
// better-sqlite3 commits when the callback returns: what an async one does later is outside the transaction
const asyncTransaction = {
  selector:
    "CallExpression[callee.property.name='transaction'] > :matches(ArrowFunctionExpression, FunctionExpression)[async=true]",
  message: 'A transaction’s callback must be synchronous.',
};
const parseFloatOnMoney = {
  selector:
    "CallExpression[callee.name='parseFloat'], MemberExpression[object.object.name='z'][object.property.name='coerce']",
  message: 'Amounts are decimal strings: parse them with src/domain/money or a pattern.',
};

export default defineConfig([
  globalIgnores(['dist/', '.angular/', 'coverage/', '.scratch/', '.thenworth/', 'server/db/migrations/']),
  {
    files: ['**/*.ts'],
    extends: [eslint.configs.recommended, tseslint.configs.recommendedTypeChecked, prettier],
    plugins: { house: { rules: { imports: importRules } } },
    languageOptions: {
      parserOptions: {
        project: ['./src/tsconfig.spec.json', './server/tsconfig.json', './tests/tsconfig.json'],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      'house/imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/unbound-method': ['error', { ignoreStatic: true }], // Angular's Validators.required
      'no-console': 'error',
      'no-restricted-syntax': ['error', zodImport, asyncTransaction, parseFloatOnMoney],
    },
  },
  {
    files: ['src/app/**/*.ts', 'src/main.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/component-selector': ['error', { type: 'element', prefix: 'tw', style: 'kebab-case' }],
      '@angular-eslint/directive-selector': ['error', { type: 'attribute', prefix: 'tw', style: 'camelCase' }],
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
      '@angular-eslint/component-class-suffix': 'off', // files and classes are named after what they show
      '@angular-eslint/directive-class-suffix': 'off',
    },
  },
  {
    files: ['**/*.spec.ts', 'tests/**/*.ts'],
    rules: {
      // supertest's bodies and the browser's page values are any by their own types
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  {
    files: ['src/app/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
  },
  {
    files: ['**/*.mjs', '**/*.cjs', '**/*.js'],
    extends: [eslint.configs.recommended, prettier],
    languageOptions: { globals: globals.node },
  },
]);
