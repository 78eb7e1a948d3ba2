const webPreset = require('jest-expo/web/jest-preset');

/** Four projects: the pure code and the solver, the server on a real database, the client in jsdom,
 *  and the whole product in a real browser. */
const swc = {
  '\\.m?[jt]sx?$': [
    '@swc/jest',
    {
      jsc: { target: 'es2022', parser: { syntax: 'typescript', tsx: true } },
      module: { type: 'commonjs' },
    },
  ],
};
const node = {
  testEnvironment: 'node',
  transform: swc,
  transformIgnorePatterns: ['/node_modules/(?!(d3-[a-z-]+|internmap)/)'],
  moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
  modulePathIgnorePatterns: ['<rootDir>/dist', '<rootDir>/build', '<rootDir>/.data'],
};

module.exports = {
  // How long a test takes tells of the machine; only what hangs should fail by it.
  testTimeout: 60_000,
  projects: [
    {
      ...node,
      displayName: 'solvers',
      testMatch: ['<rootDir>/tests/{solvers,shared}/**/*.test.ts'],
    },
    {
      ...node,
      displayName: 'server',
      testMatch: ['<rootDir>/tests/server/**/*.test.ts'],
      globalSetup: '<rootDir>/tests/helpers/databaseSetup.ts',
      globalTeardown: '<rootDir>/tests/helpers/databaseTeardown.ts',
    },
    {
      displayName: 'components',
      preset: 'jest-expo/web',
      // d3 ships modules only.
      transform: { ...webPreset.transform, '\\.mjs$': webPreset.transform['\\.[jt]sx?$'] },
      transformIgnorePatterns: webPreset.transformIgnorePatterns.map((pattern) =>
        pattern.replace('(.pnpm|', '(.pnpm|d3-|internmap|'),
      ),
      testMatch: ['<rootDir>/tests/components/**/*.test.{ts,tsx}'],
      moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
    },
    {
      ...node,
      displayName: 'e2e',
      testMatch: ['<rootDir>/tests/e2e/**/*.test.ts'],
      globalSetup: '<rootDir>/tests/helpers/productSetup.ts',
      globalTeardown: '<rootDir>/tests/helpers/productTeardown.ts',
    },
  ],
};
