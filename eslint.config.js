import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import vue from 'eslint-plugin-vue';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** The house's arrows: src -> shared <- server, never across, never back. */
const forbid = (...patterns) => ({
  'no-restricted-imports': [
    'error',
    { patterns: patterns.map((group) => ({ group: [group.glob], message: group.why })) },
  ],
});
const rooms = {
  src: { glob: '**/src/**', why: 'src is the browser side; move what both need to shared/.' },
  server: { glob: '**/server/**', why: 'server is the other side; move what both need to shared/.' },
  node: { glob: 'node:*', why: 'shared/ and src/ do no I/O of their own; hand the function in.' },
  framework: { glob: 'vue*', why: 'shared/ knows no framework.' },
  pinia: { glob: 'pinia', why: 'shared/ knows no framework.' },
  express: { glob: 'express*', why: 'only routes, middleware and app.ts know Express.' },
  typeorm: { glob: 'typeorm', why: 'shared/ knows no database.' },
  routes: { glob: '**/routes/*', why: 'services and ledger do not know the doors they are called through.' },
  views: { glob: '**/views/**', why: 'arrows run from views to components, not back.' },
  components: { glob: '**/components/**', why: 'stores and composables do not know who draws them.' },
  stores: { glob: '**/stores/**', why: 'offline and api are below the stores.' },
};

export default tseslint.config(
  { ignores: ['dist/**', 'node_modules/**', '.data/**', 'uploads/**', 'test-results/**', 'coverage/**'] },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  ...vue.configs['flat/recommended'],
  prettier,
  {
    files: ['**/*.vue'],
    languageOptions: { parserOptions: { parser: tseslint.parser } },
    rules: { 'vue/multi-word-component-names': 'off', 'no-undef': 'off' },
  },
  {
    languageOptions: { globals: { ...globals.node, ...globals.browser } },
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/no-explicit-any': 'error',
      'no-console': 'error',
      eqeqeq: ['error', 'smart'],
    },
  },
  {
    files: ['shared/**/*.ts'],
    rules: {
      ...forbid(rooms.src, rooms.server, rooms.node, rooms.framework, rooms.pinia, rooms.express, rooms.typeorm),
      'no-restricted-globals': [
        'error',
        'window',
        'document',
        'process',
        'fetch',
        'setTimeout',
        'performance',
        'crypto',
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'shared/ has no clock; take now as an argument.' },
        { object: 'Math', property: 'random', message: 'shared/ has no randomness.' },
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: "NewExpression[callee.name='Date'][arguments.length=0]",
          message: 'shared/ has no clock; take now as an argument.',
        },
      ],
    },
  },
  { files: ['src/**/*.{ts,vue}'], rules: forbid(rooms.server, rooms.node) },
  { files: ['src/components/**/*.{ts,vue}'], rules: forbid(rooms.server, rooms.node, rooms.views) },
  {
    files: ['src/composables/**/*.ts', 'src/stores/**/*.ts'],
    rules: forbid(rooms.server, rooms.node, rooms.views, rooms.components),
  },
  {
    files: ['src/offline/**/*.ts', 'src/api/**/*.ts'],
    rules: forbid(rooms.server, rooms.node, rooms.views, rooms.components, rooms.stores),
  },
  { files: ['server/**/*.ts'], rules: forbid(rooms.src) },
  {
    files: ['server/services/**/*.ts', 'server/ledger/**/*.ts', 'server/entities/**/*.ts'],
    rules: forbid(rooms.src, rooms.routes, rooms.express),
  },
  { files: ['scripts/**', 'tests/**', '*.config.{js,ts}'], rules: { 'no-console': 'off' } },
);
