import angular from 'jest-preset-angular/presets/index.js';

const node = (displayName, testMatch, extra = {}) => ({
  displayName,
  testEnvironment: 'node',
  testMatch,
  transform: { '^.+\\.ts$': ['ts-jest', { tsconfig: '<rootDir>/tests/tsconfig.json' }] },
  ...extra,
});

export default {
  maxWorkers: 2,
  projects: [
    node('domain', ['<rootDir>/src/domain/**/*.spec.ts', '<rootDir>/src/contracts/**/*.spec.ts']),
    node('server', [
      '<rootDir>/server/**/*.spec.ts',
      '<rootDir>/seeds/**/*.spec.ts',
      '<rootDir>/tests/{api,isolation,outside,golden,architecture}/**/*.spec.ts',
    ]),
    {
      ...angular.createCjsPreset({ tsconfig: '<rootDir>/src/tsconfig.spec.json' }),
      displayName: 'app',
      setupFilesAfterEnv: ['<rootDir>/tests/support/app-setup.ts'],
      testMatch: ['<rootDir>/src/app/**/*.spec.ts'],
    },
    node('e2e', ['<rootDir>/tests/e2e/**/*.spec.ts']),
  ],
  testTimeout: 60000,
};
