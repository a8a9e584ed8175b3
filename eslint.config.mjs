import eslint from '@eslint/js';
import angular from 'angular-eslint';
import { defineConfig, globalIgnores } from 'eslint/config';
import tseslint from 'typescript-eslint';

/** Three rooms, one direction: src → shared ← api. */
const room = (name, message) => ({ regex: `^(\\.\\./)+${name}(/|$)`, message });
const stay = (patterns) => ({ 'no-restricted-imports': ['error', { patterns }] });
const namedOnly = {
  selector: 'ExportDefaultDeclaration',
  message: 'Named exports only: a name means one thing everywhere.',
};
const leanZod = {
  selector: 'ImportDeclaration[importKind!="type"][source.value="zod"] > ImportSpecifier[imported.name="z"]',
  message:
    "Write import * as z from 'zod': by its name the bundler takes the whole library along, 350 kB of it for nothing.",
};

export default defineConfig(
  globalIgnores(['dist/', 'data/', 'coverage/', '.angular/', 'e2e/output/']),
  {
    files: ['**/*.mjs', '**/*.cjs'],
    extends: [eslint.configs.recommended],
    languageOptions: {
      globals: Object.fromEntries(
        ['process', 'console', 'URL', 'Buffer', 'setTimeout', 'clearTimeout', 'fetch', 'module', 'require'].map(
          (name) => [name, 'readonly'],
        ),
      ),
    },
  },
  {
    files: ['**/*.ts'],
    extends: [eslint.configs.recommended, tseslint.configs.strict, tseslint.configs.stylistic],
    languageOptions: {
      parserOptions: {
        project: ['shared/tsconfig.json', 'api/tsconfig.json', 'src/tsconfig.spec.json', 'tests/tsconfig.json'],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      eqeqeq: ['error', 'always'],
      'no-console': 'error',
      'no-restricted-syntax': ['error', namedOnly],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': 'error',
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      // A type alias says "this shape"; an interface says "this thing". Both have their place.
      '@typescript-eslint/consistent-type-definitions': 'off',
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      'no-restricted-syntax': ['error', namedOnly, leanZod],
      ...stay([
        room('src', 'shared is the engine: it knows neither the app nor the server.'),
        room('api', 'shared is the engine: it knows neither the app nor the server.'),
        {
          regex: '^(@angular|rxjs|express|sequelize|@svgdotjs)',
          message: 'shared runs everywhere, without a framework.',
        },
        { regex: '^node:', message: 'shared does no input or output.' },
      ]),
    },
  },
  {
    // Specs of the engine run on Node and may read published cases from files.
    files: ['shared/**/*.spec.ts'],
    rules: stay([room('src', 'Specs of shared test shared.'), room('api', 'Specs of shared test shared.')]),
  },
  {
    files: ['api/**/*.ts'],
    rules: stay([
      room('src', 'The server never imports the app; they meet in shared.'),
      { regex: '^(@shared/|@angular)', message: 'The server reaches shared by relative paths.' },
    ]),
  },
  {
    files: ['src/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      ...stay([
        room('api', 'The app never imports the server; they meet in shared.'),
        { regex: '^(\\.\\./)+shared(/|$)', message: 'Import the engine by its alias, @shared/….' },
        { regex: '^node:', message: 'The app runs in a browser.' },
      ]),
      '@angular-eslint/component-selector': ['error', { type: 'element', prefix: 'lw', style: 'kebab-case' }],
      '@angular-eslint/directive-selector': ['error', { type: 'attribute', prefix: 'lw', style: 'camelCase' }],
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
      '@angular-eslint/prefer-signals': 'error',
      '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
    },
  },
  {
    files: ['src/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
    rules: { '@angular-eslint/template/button-has-type': 'error' },
  },
  {
    // The terminal is where command lines speak.
    files: ['src/main.ts', 'api/server.ts', 'api/cli/**', 'tests/**', 'e2e/**'],
    rules: { 'no-console': 'off' },
  },
  {
    // Under noUncheckedIndexedAccess a loop that bounds its own index still has to say that the entry is there.
    files: ['shared/**/*.ts', 'api/**/*.ts', 'tests/**/*.ts', 'e2e/**/*.ts', '**/*.spec.ts'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off' },
  },
  {
    files: ['**/*.spec.ts'],
    rules: { '@typescript-eslint/no-empty-function': 'off' },
  },
);
