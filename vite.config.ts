import { readdirSync } from 'node:fs'
import { readdir, readFile, writeFile } from 'node:fs/promises'
import { basename, extname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { promisify } from 'node:util'
import { brotliCompress, constants, gzip } from 'node:zlib'
import { quasar, transformAssetUrls } from '@quasar/vite-plugin'
import vue from '@vitejs/plugin-vue'
import type { Plugin } from 'vite'
import { defineConfig } from 'vitest/config'

const clientFolder = 'dist/client'
const compressedKinds = new Set(['.js', '.css', '.html', '.svg', '.json', '.vtt', '.wasm'])
const smallestCompressedBytes = 1024
/** No test is about speed; a busy machine may take this long over one. */
const patience = 60_000

/** Writes a .br and a .gz file beside every text asset, so that the server compresses nothing. */
function precompress(folder: string): Plugin {
  return {
    name: 'precompress',
    apply: (_config, { command, isSsrBuild }) => command === 'build' && !isSsrBuild,
    async writeBundle() {
      const entries = await readdir(folder, { recursive: true, withFileTypes: true })
      for (const entry of entries) {
        if (!entry.isFile() || !compressedKinds.has(extname(entry.name))) continue
        const path = join(entry.parentPath, entry.name)
        const content = await readFile(path)
        if (content.length < smallestCompressedBytes) continue
        const params = { [constants.BROTLI_PARAM_SIZE_HINT]: content.length }
        await writeFile(`${path}.br`, await promisify(brotliCompress)(content, { params }))
        await writeFile(`${path}.gz`, await promisify(gzip)(content, { level: 9 }))
      }
    },
  }
}

/** The server and, beside it, each of its worker threads, which are started from a file of their own. */
function serverEntries(): Record<string, string> {
  const files = readdirSync('server', { recursive: true, encoding: 'utf8' })
  const workers = files.filter((file) => file.endsWith('.worker.ts'))
  return Object.fromEntries<string>([
    ['index', 'server/index.ts'],
    ...workers.map((file): [string, string] => [basename(file, '.ts'), join('server', file)]),
  ])
}

/**
 * Small files that most pages share, in two chunks: by themselves they were some thirty requests of half a
 * kilobyte, each a journey of its own on a phone. What is large, or wanted by few pages, stays apart.
 */
const sharedChunks = [
  {
    name: 'vendor',
    priority: 3,
    test: /node_modules\/(vue|@vue|vue-router|pinia|@vueuse|zod)\/|vite\/preload-helper/,
  },
  {
    name: 'sheets',
    priority: 1,
    test: /src\/components\/(base\/(BasePictogram|pictograms)|courses\/(HazardList|stageNames|sheetWords))|src\/(stores|api)\/courses\.|shared\/contracts\/(courses|builds|pagination)\./,
  },
  {
    name: 'pieces',
    priority: 2,
    test: /src\/components\/base\/(BaseButton|BaseLoading|BaseProblem|BaseEmptyState|BaseSelect|BaseCaution|BaseVerdict|BaseSegment|BaseIcon|icons)|src\/composables\/use(Load|Action|Theme)\.|src\/stores\/accounts\.|src\/api\/(client|accounts)\.|shared\/contracts\/(accounts|errors|stableKey|unitSystem)\.|shared\/units\/moment\./,
  },
  {
    name: 'drawing',
    priority: 1,
    test: /src\/components\/drawings\/(Drawing|CourseDrawing|drawing|dimensions|figures|notes|marks|materials|lettering|random|stipple|courseSheet|stages|registry)|src\/composables\/useDrawingSize\.|shared\/units\/(format|number|length|unit|slope)\./,
  },
]

const serverBuild = {
  target: 'node20',
  sourcemap: true,
  outDir: 'dist/server',
  rollupOptions: {
    input: serverEntries(),
    output: { entryFileNames: '[name].js', chunkFileNames: '[name]-[hash].js' },
  },
}

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [
    vue({ template: { transformAssetUrls } }),
    quasar({
      sassVariables: fileURLToPath(new URL('src/css/quasar-variables.sass', import.meta.url)),
    }),
    precompress(clientFolder),
  ],
  publicDir: false,
  build: {
    outDir: clientFolder,
    emptyOutDir: true,
    assetsInlineLimit: 0,
    manifest: !isSsrBuild,
    modulePreload: { polyfill: false },
    reportCompressedSize: false,
    ...(isSsrBuild
      ? serverBuild
      : { rolldownOptions: { output: { codeSplitting: { groups: sharedChunks } } } }),
  },
  test: {
    restoreMocks: true,
    unstubGlobals: true,
    projects: [
      {
        test: {
          name: 'shared',
          environment: 'node',
          include: ['tests/shared/**/*.test.ts'],
          testTimeout: patience,
        },
      },
      {
        extends: true,
        test: {
          name: 'client',
          environment: 'happy-dom',
          include: ['tests/src/**/*.test.ts'],
          testTimeout: patience,
          server: { deps: { inline: ['quasar'] } },
        },
      },
      {
        test: {
          name: 'server',
          environment: 'node',
          include: ['tests/server/**/*.test.ts'],
          globalSetup: ['tests/support/globalSetup.ts'],
          setupFiles: ['tests/support/serverSetup.ts'],
          fileParallelism: false,
          testTimeout: patience,
          hookTimeout: 60_000,
        },
      },
    ],
  },
}))
