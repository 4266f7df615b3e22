import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

const apiAddress = `http://127.0.0.1:${process.env.PORT ?? 4400}`

export default defineConfig({
  plugins: [vue()],
  build: {
    outDir: 'dist',
    target: 'es2022',
    sourcemap: false,
    chunkSizeWarningLimit: 1200,
    rolldownOptions: {
      output: {
        // zod tries once whether code may be made from text. The content security policy refuses that and the browser reports it, so zod is told before it starts.
        intro: (chunk) => (chunk.moduleIds.some((id) => id.includes('/zod/')) ? 'globalThis.__zod_globalConfig={jitless:true};' : ''),
      },
    },
  },
  server: { port: 5173, proxy: { '/api': apiAddress } },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          environment: 'node',
          include: ['tests/{engine,api,checks,seed}/**/*.test.ts'],
          testTimeout: 20_000,
          sequence: { groupOrder: 0 },
        },
      },
      {
        extends: true,
        test: {
          name: 'components',
          environment: 'jsdom',
          include: ['tests/components/**/*.test.ts'],
          setupFiles: ['tests/support/componentsSetup.ts'],
          testTimeout: 20_000,
          sequence: { groupOrder: 0 },
        },
      },
      {
        extends: true,
        test: {
          name: 'browser',
          environment: 'node',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/support/browserGlobalSetup.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          fileParallelism: false,
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
})
