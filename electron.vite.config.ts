import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'electron-vite'
import { createHash } from 'node:crypto'
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

/** A hash of the core's source: results cached by one version are not taken for those of another. */
function coreHash(): string {
  const hash = createHash('sha256')
  const files = readdirSync('src/core', { recursive: true, encoding: 'utf8' }).filter((name) =>
    /\.(ts|wasm)$/.test(name),
  )
  for (const file of files.sort())
    hash.update(file.replaceAll('\\', '/')).update(readFileSync(join('src/core', file)))
  return hash.digest('hex').slice(0, 16)
}

const define = { __CORE_HASH__: JSON.stringify(coreHash()) }

export default defineConfig({
  main: {
    define,
    build: {
      outDir: 'out/main',
      reportCompressedSize: false,
      rollupOptions: {
        // Only the bench of the window uses it, where it is installed.
        external: ['playwright-core'],
        input: {
          index: 'src/main/index.ts',
          cli: 'src/cli/index.ts',
          cliWorker: 'src/cli/cliWorker.ts',
          serve: 'src/serve/index.ts',
          start: 'src/serve/start.ts',
          bench: 'bench/run.ts',
          published: 'test/published/report/run.ts',
        },
        output: { format: 'es', entryFileNames: '[name].js', chunkFileNames: 'chunks/[name]-[hash].js' },
      },
    },
  },
  preload: {
    build: {
      outDir: 'out/preload',
      reportCompressedSize: false,
      rollupOptions: {
        input: { index: 'src/main/preload.ts' },
        // A sandboxed preload is loaded as CommonJS, and the package is of type "module".
        output: { format: 'cjs', entryFileNames: '[name].cjs' },
      },
    },
  },
  renderer: {
    root: 'src/renderer',
    define,
    plugins: [vue()],
    worker: { format: 'es' },
    build: {
      outDir: 'out/renderer',
      reportCompressedSize: false,
      rollupOptions: { input: { index: 'src/renderer/index.html' } },
    },
  },
})
