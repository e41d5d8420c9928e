import js from '@eslint/js';
import globals from 'globals';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Folders a file must not import from: this is what keeps the arrows of DEVELOPERS.md pointing one way. */
const forbid = (...rules) => ({
  'no-restricted-imports': ['error', { patterns: rules.map(([what, message]) => (typeof what === 'string' ? { regex: what, message } : { group: what, message })) }],
});

const noServer = [['#server/*', '**/server/**'], 'This layer must not know the server.'];
const noWeb = [['**/web/**'], 'This layer must not know the console.'];
const noTests = [['#tests/*', '**/tests/**'], 'Source must not import tests.'];
const noExpress = [['express', 'express-*', 'helmet', 'pino-http', 'swagger-ui-express', '#server/http/**', '**/http/**'], 'Domain and data access speak plain values, not HTTP.'];
const noSequelize = [['sequelize', 'sqlite3', 'umzug', '#server/db/models/**', '#server/db/migrations/**'], 'Only server/db touches the database packages.'];
const noClient = [['**/lib/api-client.ts'], 'Pages and components ask through the query options and mutations of a feature’s api folder.'];

export default tseslint.config(
  { ignores: ['dist/', 'data/', 'node_modules/', '**/*.gen.ts'] },
  js.configs.recommended,
  ...tseslint.configs.strict,
  {
    rules: {
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      eqeqeq: ['error', 'smart'],
    },
  },
  { files: ['**/*.{js,mjs}'], languageOptions: { globals: globals.node } },
  { files: ['web/public/**/*.js'], languageOptions: { globals: globals.browser, sourceType: 'script' } },
  {
    files: ['shared/attitude/**/*.ts'],
    rules: forbid(['^(?!\\.\\.?/)', 'shared/attitude imports only itself.'], noServer, noWeb, noTests, [['**/api/**'], 'shared/attitude imports only itself.']),
  },
  { files: ['shared/api/**/*.ts'], rules: forbid(noServer, noWeb, noTests) },
  { files: ['server/domain/**/*.ts'], rules: forbid(noExpress, noSequelize, noWeb, noTests) },
  { files: ['server/db/**/*.ts'], rules: forbid(noExpress, noWeb, noTests, [['#server/domain/**', '**/domain/**'], 'The database layer must not know the use cases.']) },
  { files: ['server/http/**/*.ts'], rules: forbid(noSequelize, noWeb, noTests) },
  {
    files: ['web/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    languageOptions: { globals: globals.browser },
    rules: { ...reactHooks.configs.recommended.rules, ...forbid(noServer, noTests) },
  },
  {
    files: ['web/src/components/**/*.{ts,tsx}', 'web/src/lib/**/*.{ts,tsx}'],
    rules: forbid(noServer, noTests, [['**/features/**', '**/app/**'], 'Components and lib know no feature and no page.']),
  },
  { files: ['web/src/features/**/*.{ts,tsx}'], rules: forbid(noServer, noTests, [['**/app/**'], 'Features know no page.']) },
  { files: ['web/src/features/*/{components,model}/**/*.{ts,tsx}'], rules: forbid(noServer, noTests, noClient, [['**/app/**'], 'Features know no page.']) },
  { files: ['web/src/app/**/*.{ts,tsx}'], rules: forbid(noServer, noTests, noClient) },
);
