import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: { include: ['**/*.spec.ts'], exclude: ['dist/**', 'node_modules/**'], testTimeout: 30_000 },
});
