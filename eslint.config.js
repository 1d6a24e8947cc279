import js from '@eslint/js';
import prettier from 'eslint-config-prettier';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** Forbids imports that would turn an arrow of the house around; the message says which way it goes. */
const forbid = (patterns, message) => ({
  'no-restricted-imports': ['error', { patterns: patterns.map((regex) => ({ regex, message })) }],
});

const NODE_OR_FRAMEWORK = '^(node:|@nestjs/|typeorm|react|@mui/)';
const PURE = 'libs are pure: no input or output, no framework.';
const inside = (...rooms) => `^\\.\\./(?:.*/)?(?:${rooms.join('|')})/`;

export default tseslint.config(
  {
    ignores: [
      '**/dist/**',
      '**/node_modules/**',
      'data/**',
      '**/test-results/**',
      'frontend/src/api/schema.d.ts',
    ],
  },
  js.configs.recommended,
  {
    files: ['**/*.ts', '**/*.tsx'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      'no-restricted-properties': [
        'error',
        { object: 'it', property: 'only', message: 'A test left alone hides the others.' },
        { object: 'it', property: 'skip', message: 'A skipped test is a defect.' },
        { object: 'describe', property: 'only', message: 'A test left alone hides the others.' },
        { object: 'describe', property: 'skip', message: 'A skipped test is a defect.' },
      ],
    },
  },
  {
    // Nest reads parameter types at run time: a type-only import would erase the injection token.
    files: ['backend/**/*.ts', 'seed/**/*.ts'],
    languageOptions: { parserOptions: { emitDecoratorMetadata: true, experimentalDecorators: true } },
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  { files: ['**/*.mjs', '*.js', '**/*.config.ts'], languageOptions: { globals: globals.node } },
  { files: ['frontend/public/**/*.js'], languageOptions: { globals: globals.browser, sourceType: 'script' } },
  {
    files: ['libs/units/**/*.ts'],
    rules: forbid(
      [NODE_OR_FRAMEWORK, inside('gear-geometry', 'gear-rating', 'train-planner', 'bill-of-materials')],
      PURE,
    ),
  },
  {
    files: ['libs/gear-geometry/**/*.ts'],
    rules: forbid([NODE_OR_FRAMEWORK, inside('gear-rating', 'train-planner', 'bill-of-materials')], PURE),
  },
  {
    files: ['libs/gear-rating/**/*.ts'],
    rules: forbid([NODE_OR_FRAMEWORK, inside('train-planner', 'bill-of-materials')], PURE),
  },
  {
    files: ['libs/train-planner/**/*.ts'],
    rules: forbid([NODE_OR_FRAMEWORK, inside('bill-of-materials')], PURE),
  },
  {
    files: ['libs/bill-of-materials/**/*.ts'],
    rules: forbid([NODE_OR_FRAMEWORK, inside('gear-geometry', 'gear-rating', 'train-planner')], PURE),
  },
  {
    files: ['backend/src/**/*.ts'],
    rules: forbid(
      ['@stageyard/(frontend|seed)', '^(react|@mui/)'],
      'The server knows neither screens nor demo data.',
    ),
  },
  {
    files: ['frontend/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    languageOptions: { globals: globals.browser },
    rules: {
      ...reactHooks.configs.recommended.rules,
      ...forbid(
        ['@stageyard/(backend|seed)', '^@nestjs/', '^node:'],
        'Screens know the server only by its OpenAPI document.',
      ),
    },
  },
  {
    files: ['frontend/src/features/**/*.{ts,tsx}'],
    rules: forbid(
      [
        '^(\\.\\./)+features/',
        '^\\.\\./(?!\\.)(sign-in|home|parts|briefs|compare|trains|people)(/|$)',
        '@stageyard/(backend|seed)',
        '^node:',
      ],
      'A feature never imports a feature: share through components, drawings or api.',
    ),
  },
  {
    files: ['frontend/src/{components,drawings,theme,api}/**/*.{ts,tsx}'],
    rules: forbid(['/features/', '@stageyard/(backend|seed)', '^node:'], 'Shared code knows no feature.'),
  },
  prettier,
);
