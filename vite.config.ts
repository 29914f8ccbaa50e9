import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

// Unit tests sit beside their files; api, structure and journeys run against a real PostgreSQL made once for the run.
export default defineConfig({
  plugins: [react(), tailwindcss()],
  build: { outDir: 'dist/client', emptyOutDir: true, sourcemap: false },
  test: {
    globalSetup: ['tests/support/global-setup.ts'],
    testTimeout: 30_000,
    hookTimeout: 90_000,
    projects: [
      { extends: true, test: { name: 'unit', include: ['{shared,server,src}/**/*.test.{ts,tsx}'] } },
      { extends: true, test: { name: 'reference', include: ['tests/{reference,structure}/**/*.test.ts'] } },
      { extends: true, test: { name: 'api', include: ['tests/api/**/*.test.ts'] } },
      {
        extends: true,
        test: {
          name: 'journeys',
          include: ['tests/journeys/**/*.test.ts'],
          fileParallelism: false,
          testTimeout: 240_000,
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
