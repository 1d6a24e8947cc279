import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

/** Where the development server sends `/api`; the built product is served by the API process itself. */
const API = process.env.STAGEYARD_API ?? 'http://127.0.0.1:3000';

export default defineConfig({
  plugins: [react()],
  server: { host: '127.0.0.1', port: 5173, proxy: { '/api': { target: API } } },
  build: {
    outDir: 'dist',
    emptyOutDir: true,
    sourcemap: false,
    target: 'es2022',
    chunkSizeWarningLimit: 900,
  },
});
