import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

export default defineConfig({
  plugins: [vue()],
  test: {
    include: ['test/**/*.test.ts'],
    exclude: ['test/e2e/**'],
    globalSetup: ['test/support/build.ts'],
    setupFiles: ['test/support/strictConsole.ts'],
    testTimeout: 30_000,
    maxWorkers: 2,
  },
})
