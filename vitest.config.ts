import { defineConfig } from 'vitest/config';

const project = (name: string, root: string, include: string[], testTimeout = 20_000) => ({
  extends: true as const,
  test: { name, root, include, testTimeout, hookTimeout: 120_000 },
});

export default defineConfig({
  test: {
    environment: 'node',
    projects: [
      project('engine', 'packages/engine', ['src/**/*.spec.ts']),
      project('wording', 'packages/wording', ['src/**/*.spec.ts']),
      project('contract', 'packages/contract', ['src/**/*.spec.ts']),
      project('api', 'apps/api', ['src/**/*.spec.ts']),
      project('launch', 'tests/launch', ['**/*.spec.mjs']),
      project('reference', 'tests/reference', ['**/*.spec.ts'], 60_000),
      project('property', 'tests/property', ['**/*.spec.ts'], 180_000),
      project('browser', 'tests/browser', ['**/*.spec.ts'], 120_000),
    ],
  },
});
