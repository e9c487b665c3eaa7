const web = require('jest-expo/web/jest-preset');

// Packages that ship only ES modules and so must pass through Babel.
const esModules =
  'file-type|strtok3|token-types|uint8array-extras|@tokenizer/.*|@borewit/.*|pure-rand|d3-[a-z-]+|internmap|uuid|lib-r-math.js|@mangos/.*';

const node = {
  rootDir: __dirname,
  testEnvironment: 'node',
  resolver: '<rootDir>/tests/support/jest-resolver.js',
  moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
  transform: {
    '^.+\\.[cm]?[jt]sx?$': [
      'babel-jest',
      {
        configFile: false,
        babelrc: false,
        presets: [['@babel/preset-env', { targets: { node: '20' } }], '@babel/preset-typescript'],
      },
    ],
  },
  transformIgnorePatterns: [`/node_modules/(?!(${esModules})/)`],
  setupFilesAfterEnv: ['<rootDir>/tests/support/patience.ts'],
};

module.exports = {
  projects: [
    { ...node, displayName: 'domain', testMatch: ['<rootDir>/tests/shared/**/*.test.ts'] },
    { ...node, displayName: 'architecture', testMatch: ['<rootDir>/tests/architecture/**/*.test.ts'] },
    {
      ...node,
      displayName: 'server',
      testMatch: ['<rootDir>/tests/server/**/*.test.ts'],
    },
    { ...node, displayName: 'browser', testMatch: ['<rootDir>/tests/browser/**/*.test.ts'] },
    {
      displayName: 'components',
      rootDir: __dirname,
      preset: 'jest-expo/web',
      testMatch: ['<rootDir>/tests/components/**/*.test.tsx'],
      setupFilesAfterEnv: [
        '<rootDir>/tests/support/patience.ts',
        '<rootDir>/tests/support/components-setup.ts',
      ],
      moduleNameMapper: {
        ...web.moduleNameMapper,
        '^@/(.*)$': '<rootDir>/$1',
        '\\.css$': '<rootDir>/tests/support/empty-style.js',
      },
      transformIgnorePatterns: [
        web.transformIgnorePatterns[0].replace('(?!(', '(?!(d3-|internmap|uuid|@tanstack/|'),
        ...web.transformIgnorePatterns.slice(1),
      ],
    },
  ],
};
