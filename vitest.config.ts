import react from '@vitejs/plugin-react'
import { defineConfig } from 'vitest/config'

const shared = {
  plugins: [react()],
  resolve: { alias: { '@/': `${import.meta.dirname}/` } },
}

export default defineConfig({
  test: {
    // In the order in which they are reported; each is also a step of `npm test`.
    projects: [
      {
        ...shared,
        test: {
          name: 'unit',
          include: ['tests/unit/**/*.test.ts'],
          environment: 'node',
          // Proofs by brute force take their time on a busy machine.
          testTimeout: 20_000,
        },
      },
      {
        ...shared,
        test: {
          name: 'unit-dom',
          include: ['tests/unit/**/*.test.tsx'],
          environment: 'jsdom',
          setupFiles: ['tests/unit/setup-dom.ts'],
        },
      },
      {
        ...shared,
        test: {
          name: 'integration',
          include: ['tests/integration/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/integration/setup/global.ts'],
          // One database for all of them: file after file.
          fileParallelism: false,
          testTimeout: 20_000,
          hookTimeout: 30_000,
        },
      },
    ],
  },
})
