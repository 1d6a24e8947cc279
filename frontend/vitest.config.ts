import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const shared = { restoreMocks: true, unstubGlobals: true, testTimeout: 20_000 };

/** Plain logic runs without a page; only what renders (`.tsx`) pays for one. */
export default defineConfig({
  plugins: [react()],
  test: {
    projects: [
      {
        extends: true,
        test: { ...shared, name: 'logic', environment: 'node', include: ['src/**/*.test.ts'] },
      },
      {
        extends: true,
        test: {
          ...shared,
          name: 'screens',
          environment: 'jsdom',
          include: ['src/**/*.test.tsx'],
          setupFiles: ['src/testing/setup.ts'],
        },
      },
    ],
  },
});
