/** Two kinds of spec: unit specs beside the code, and tests that need a database in test/. */
const swc = ['@swc/jest', { jsc: { target: 'es2022', parser: { syntax: 'typescript' } } }];
const shared = {
  transform: { '^.+\\.[mc]?[tj]s$': swc },
  transformIgnorePatterns: ['/node_modules/(?!(ulid)/)'],
  testEnvironment: 'node',
};

export default {
  projects: [
    { ...shared, displayName: 'unit', testMatch: ['<rootDir>/{server,db,openapi}/**/*.spec.ts'] },
    { ...shared, displayName: 'service', testMatch: ['<rootDir>/test/**/*.spec.ts'] },
  ],
};
