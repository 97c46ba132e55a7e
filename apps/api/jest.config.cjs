/** @type {import('jest').Config} */
module.exports = {
  testEnvironment: 'node',
  testEnvironmentOptions: {
    customExportConditions: ['source', 'node', 'node-addons'],
  },
  rootDir: '.',
  testMatch: ['<rootDir>/src/**/*.spec.ts', '<rootDir>/test/**/*.e2e-spec.ts'],
  transform: {
    '^.+\\.ts$': ['@swc/jest', require('./swc-jest.cjs')],
    // ES modules, which Node loads with require but Jest does not.
    '/any-ascii/.+\\.js$': '@swc/jest',
  },
  transformIgnorePatterns: ['/node_modules/(?!any-ascii/)'],
  moduleNameMapper: { '^(\\.{1,2}/.*)\\.js$': '$1' },
  testTimeout: 20000,
};
