import { defineConfig } from 'vitest/config';

/** Long runs, outside `npm test`. */
export default defineConfig({
  test: { include: ['**/*.soak.ts'], exclude: ['dist/**', 'node_modules/**'], testTimeout: 600_000 },
});
