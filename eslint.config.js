const { readdirSync } = require('node:fs');
const path = require('node:path');
const expo = require('eslint-config-expo/flat');
const globals = require('globals');
const prettier = require('eslint-config-prettier');

const why = 'See the import table in DEVELOPERS.md.';
const tops = ['app', 'components', 'server', 'db', 'seeds', 'tests'];

/** Folders of components that every feature may use; the rest are features, which do not import each other. */
const commonParts = ['ui', 'theme', 'forms', 'tables', 'data', 'shell', 'session'];
const features = readdirSync(path.join(__dirname, 'components'), { withFileTypes: true })
  .filter((entry) => entry.isDirectory() && !commonParts.includes(entry.name))
  .map((entry) => entry.name);

/** Packages that only their own side may import. */
const serverPackages =
  '^(node:|express|helmet|compression|passport|csrf-sync|multer|file-type|mysql2|drizzle-orm|@node-rs/|nodemailer|pino|rate-limiter-flexible|exceljs|csv-|yazl|yauzl|zod-openapi)';
const clientPackages = '^(react|expo|@expo/|@tanstack/|@hookform/|d3-)';

/** One list of what a folder may not import: a narrower block would replace, not extend, a wider one. */
function restricted({ tops: forbidden = [], patterns = [], paths = [] }) {
  return {
    'no-restricted-imports': [
      'error',
      {
        paths,
        patterns: [
          ...forbidden.map((top) => ({
            regex: `^(@/|(\\.\\./)+)${top}(/|$)`,
            message: `Nothing here imports ${top}/. ${why}`,
          })),
          ...patterns,
        ],
      },
    ],
  };
}

const noServerPackages = { regex: serverPackages, message: `This package belongs to the server. ${why}` };
const noClientPackages = { regex: clientPackages, message: `This package belongs to the client. ${why}` };
const rawText = {
  name: 'react-native',
  importNames: ['Text', 'TextInput'],
  message: `Raw text and inputs stay in components/ui: use its Text and fields. ${why}`,
};
const pure = [
  {
    selector: "NewExpression[callee.name='Date'][arguments.length=0]",
    message: 'The domain reads no clock: the day comes in.',
  },
  {
    selector: "CallExpression[callee.object.name='Date'][callee.property.name='now']",
    message: 'The domain reads no clock: the day comes in.',
  },
  {
    selector: "CallExpression[callee.object.name='Math'][callee.property.name='random']",
    message: 'The domain draws no lots: the seed comes in.',
  },
  { selector: "MemberExpression[object.name='process']", message: 'The domain knows no environment.' },
];
const noEnum = {
  selector: 'TSEnumDeclaration',
  message: 'A union of literals or a const array says it without an enum.',
};
const noDefault = {
  selector: 'ExportDefaultDeclaration',
  message: 'Named exports only; routes and tool configurations apart.',
};

module.exports = [
  { ignores: ['dist/**', '.local/**', '.expo/**', 'db/migrations/**', 'node_modules/**', 'expo-env.d.ts'] },
  ...expo,
  prettier,
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      'no-restricted-syntax': ['error', noEnum, noDefault],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      'max-params': ['error', 3],
      'max-lines': ['error', { max: 350 }],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-console': 'error',
      'import/no-unresolved': 'off',
      'import/no-named-as-default-member': 'off',
      'import/no-named-as-default': 'off',
    },
  },
  {
    files: ['**/*.mjs', '*.js', 'tests/support/*.js'],
    languageOptions: { globals: { ...globals.node } },
  },
  {
    // Not React: what begins with "use" there is a verb.
    ignores: ['app/**', 'components/**', 'tests/components/**'],
    rules: {
      'react-hooks/rules-of-hooks': 'off',
      'expo/no-env-var-destructuring': 'off',
      'expo/no-dynamic-env-var': 'off',
    },
  },
  {
    // Advice for the React compiler, which is not used here.
    files: ['app/**/*.tsx', 'components/**/*.{ts,tsx}'],
    rules: { 'react-hooks/set-state-in-effect': 'off', 'react-hooks/incompatible-library': 'off' },
  },
  { files: ['app/**/*.tsx', '*.config.{js,ts}'], rules: { 'no-restricted-syntax': ['error', noEnum] } },
  {
    files: ['**/launch/**', 'db/local/**', 'db/run-migrations.ts', 'server/index.ts', 'seeds/**', 'tests/**'],
    rules: { 'no-console': 'off' },
  },
  {
    files: ['app/**/*.{ts,tsx}'],
    rules: restricted({
      tops: ['server', 'db', 'seeds', 'tests'],
      paths: [rawText],
      patterns: [
        noServerPackages,
        {
          regex: '^(?!(@/|\\.|expo-router|react$|react-native$))',
          message: `Routes import expo-router, react and our own parts only. ${why}`,
        },
      ],
    }),
  },
  {
    files: ['components/**/*.{ts,tsx}'],
    rules: restricted({
      tops: ['app', 'server', 'db', 'seeds', 'tests'],
      paths: [rawText],
      patterns: [noServerPackages],
    }),
  },
  {
    files: ['components/ui/**/*.{ts,tsx}'],
    rules: restricted({ tops: ['app', 'server', 'db', 'seeds', 'tests'], patterns: [noServerPackages] }),
  },
  ...features.map((feature) => ({
    files: [`components/${feature}/**/*.{ts,tsx}`],
    rules: restricted({
      tops: ['app', 'server', 'db', 'seeds', 'tests'],
      paths: [rawText],
      patterns: [
        noServerPackages,
        {
          regex: `^(@/components/|(\\.\\./)+)(${features.filter((other) => other !== feature).join('|') || 'none'})(/|$)`,
          message: `A feature does not import another feature. ${why}`,
        },
      ],
    }),
  })),
  {
    files: ['shared/**/*.ts'],
    rules: restricted({
      tops,
      patterns: [
        noServerPackages,
        noClientPackages,
        {
          regex: '^(?!(@/shared|\\.|zod|decimal\\.js))',
          message: `shared/ takes zod and decimal.js only. ${why}`,
        },
      ],
    }),
  },
  ...[
    ['shared/domain/*.ts', '^\\.\\./'],
    ['shared/domain/*/**/*.ts', '^\\.\\./\\.\\./'],
  ].map(([files, leaves]) => ({
    files: [files],
    rules: {
      'no-restricted-syntax': ['error', noEnum, noDefault, ...pure],
      ...restricted({
        tops,
        patterns: [
          { regex: leaves, message: `The domain imports only the domain. ${why}` },
          {
            regex: '^(?!(\\.|zod$|decimal\\.js$))',
            message: `The domain takes zod and decimal.js only. ${why}`,
          },
        ],
      }),
    },
  })),
  {
    files: ['server/**/*.ts'],
    rules: restricted({
      tops: ['app', 'components', 'seeds', 'tests'],
      patterns: [
        noClientPackages,
        {
          regex: '^\\.\\./[a-z-]+/router$',
          message: `A module is reached by its service or read model, not by its router. ${why}`,
        },
      ],
    }),
  },
  {
    files: ['db/**/*.ts'],
    rules: restricted({
      tops: ['app', 'components', 'server', 'seeds', 'tests'],
      patterns: [
        noClientPackages,
        {
          regex: '^(express|helmet|passport|exceljs|nodemailer)',
          message: `db/ takes drizzle-orm and mysql2 only. ${why}`,
        },
      ],
    }),
  },
];
