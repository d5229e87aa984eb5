import js from '@eslint/js';
import query from '@tanstack/eslint-plugin-query';
import { defineConfig } from 'eslint/config';
import a11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** Columns must say their type: it is not read from the TypeScript type (no decorator metadata). */
const columnDecorator =
  '/^(Column|PrimaryColumn|CreateDateColumn|UpdateDateColumn|DeleteDateColumn|VersionColumn)$/';
const untypedColumns = [
  {
    selector: `Decorator > CallExpression[callee.name=${columnDecorator}][arguments.length=0]`,
    message: 'Give the column its type: @Column({ type: … }).',
  },
  {
    selector: `Decorator > CallExpression[callee.name=${columnDecorator}] > ObjectExpression:first-child:not(:has(> Property[key.name='type'])):not(:has(> SpreadElement))`,
    message: 'Give the column its type: @Column({ type: … }).',
  },
];

export default defineConfig(
  { ignores: ['dist/', 'data/', '.tmp/', 'test-results/', 'playwright-report/', 'coverage/'] },
  js.configs.recommended,
  ...tseslint.configs.strictTypeChecked,
  {
    languageOptions: {
      parserOptions: {
        // One program for all folders: the compiler reads every file once instead of once per folder.
        project: './tsconfig.lint.json',
        tsconfigRootDir: import.meta.dirname,
      },
    },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      // Numbers print as they are; everything else in a template must be turned into text on purpose.
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-confusing-void-expression': ['error', { ignoreArrowShorthand: true }],
      // An enum-like constant in a loop over a fixed range is clearer than a check that can never be false.
      '@typescript-eslint/no-unnecessary-condition': [
        'error',
        { allowConstantLoopConditions: 'only-allowed-literals' },
      ],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
      eqeqeq: 'error',
      'no-console': 'error',
      // Control characters are what names and notes must not hold; the checks for them must name them.
      'no-control-regex': 'off',
    },
  },
  {
    // Scripts that run on a machine without node_modules: plain JavaScript, typed by comments.
    files: ['docker-free-scripts/**/*.mjs'],
    languageOptions: { globals: globals.node },
  },
  {
    // Settings of tools in the root, which belong to no folder's tsconfig.
    files: ['*.js', '*.ts', '.*.mjs'],
    ...tseslint.configs.disableTypeChecked,
    languageOptions: { ...tseslint.configs.disableTypeChecked.languageOptions, globals: globals.node },
  },
  {
    files: ['server/db/entities/**/*.ts', 'tests/**/*.ts'],
    rules: { 'no-restricted-syntax': ['error', ...untypedColumns] },
  },
  {
    files: ['src/**/*.{ts,tsx}'],
    extends: [
      reactHooks.configs.flat.recommended,
      a11y.flatConfigs.strict,
      ...query.configs['flat/recommended'],
    ],
    languageOptions: { globals: globals.browser },
    rules: {
      // Event handlers of forms and buttons may be async; their errors reach the query client.
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
    },
  },
  {
    files: ['tests/**/*.{ts,tsx}'],
    rules: {
      // `expect(spy.method)` hands a method over without calling it.
      '@typescript-eslint/unbound-method': 'off',
      // Playwright reads from the pattern which fixtures a fixture needs: `({}, use)` needs none.
      'no-empty-pattern': ['error', { allowObjectPatternsAsParameters: true }],
    },
  },
);
