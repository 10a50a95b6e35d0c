/** Unit specs beside the code, tests that need a database in test/, and the Angular projects. */
import presets from 'jest-preset-angular/presets/index.js';

const swc = ['@swc/jest', { jsc: { target: 'es2022', parser: { syntax: 'typescript' } } }];
const shared = {
  transform: { '^.+\\.[mc]?[tj]s$': swc },
  modulePathIgnorePatterns: ['<rootDir>/dist/'],
  transformIgnorePatterns: ['/node_modules/(?!(ulid)/)'],
  testEnvironment: 'node',
};

const library = {
  ...presets.createCjsPreset({ tsconfig: '<rootDir>/projects/tsconfig.spec.json' }),
  displayName: 'library',
  modulePathIgnorePatterns: ['<rootDir>/dist/'],
  testMatch: ['<rootDir>/projects/**/*.spec.ts'],
  setupFilesAfterEnv: ['<rootDir>/projects/checks/testing/setup.ts'],
  moduleNameMapper: {
    '^@headtree/checks$': '<rootDir>/projects/checks/src/public-api.ts',
    '^@headtree/(checks/)?contract$': '<rootDir>/openapi/generated/types.ts',
  },
};

export default {
  projects: [
    { ...shared, displayName: 'unit', testMatch: ['<rootDir>/{server,db,openapi}/**/*.spec.ts'] },
    {
      ...shared,
      displayName: 'service',
      testMatch: ['<rootDir>/test/**/*.spec.ts'],
      testPathIgnorePatterns: ['/node_modules/', '<rootDir>/test/browser/'],
    },
    {
      ...shared,
      displayName: 'browser',
      testMatch: ['<rootDir>/test/browser/**/*.spec.ts'],
      setupFilesAfterEnv: ['<rootDir>/test/browser/support/patience.ts'],
    },
    library,
  ],
};
