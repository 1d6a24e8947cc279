import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: { include: ['src/**/*.spec.ts'], setupFiles: ['reflect-metadata'], testTimeout: 60_000 },
});
