import { readdirSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { defineConfig, type Plugin, type Rolldown } from 'vite'
import react from '@vitejs/plugin-react'
import { keepCompiled } from './server/dev/keep-compiled.ts'
import tailwindcss from '@tailwindcss/vite'

type ChunkingContext = Rolldown.ChunkingContext

const fontFolder = 'node_modules/@fontsource/jetbrains-mono/files'
const embedded = /^jetbrains-mono-(latin|latin-ext|greek|cyrillic)-(400|700)-normal\.woff$/

/** Printed pages embed the font, so it ships beside the program. */
const shipFonts: Plugin = {
  name: 'ship-fonts',
  generateBundle() {
    for (const name of readdirSync(fontFolder).filter((file) => embedded.test(file))) {
      this.emitFile({ type: 'asset', fileName: `fonts/${name}`, source: readFileSync(`${fontFolder}/${name}`) })
    }
  },
}

const path = (relative: string): string => fileURLToPath(new URL(relative, import.meta.url))

/** What a chunk is named by: a file together with all that it imports at once. */
const closureOf = (file: string): ((id: string, bundle: ChunkingContext) => boolean) => {
  const closure = new Set<string>()
  return (id, bundle) => {
    const waiting = closure.size === 0 ? [path(file)] : []
    for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
      if (closure.has(next)) continue
      closure.add(next)
      waiting.push(...(bundle.getModuleInfo(next)?.importedIds ?? []))
    }
    return closure.has(id)
  }
}
const closures = { start: closureOf('cli/run.ts'), check: closureOf('cli/commands/check.ts') }

/** All that `check` needs at once goes into one file, for one is read sooner than twenty; the rest waits in its own. */
const startingChunks = (['start', 'check'] as const).map((chunk, index) => ({
  debugName: chunk,
  priority: 2 - index,
  name: (id: string, bundle: ChunkingContext): string | null => (closures[chunk](id, bundle) ? chunk : null),
}))

// One configuration for every bundle: `vite build --ssr` makes the command line, `--mode server` with it the server,
// plain `vite build` the dashboard.
/** The bench is measured as users run it: bundled. */
const inputs = (mode: string): { readonly folder: string; readonly input: Readonly<Record<string, string>> } => {
  if (mode === 'bench') return { folder: 'dist/bench', input: { bench: 'tests/bench/bench.ts' } }
  if (mode === 'server') return { folder: 'dist/server', input: { main: 'server/main.ts' } }
  return { folder: 'dist/cli', input: { foldgauge: 'cli/main.ts' } }
}

export default defineConfig(({ isSsrBuild, mode }) =>
  isSsrBuild === true
    ? {
        publicDir: false,
        plugins: [shipFonts, ...(mode === 'server' || mode === 'bench' ? [] : [keepCompiled('check')])],
        // Modules that can be joined to the bundle's own; for Node the package offers others, wrapped one by one.
        resolve: { alias: { yaml: path('node_modules/yaml/browser/index.js') } },
        build: {
          target: 'node20',
          outDir: inputs(mode).folder,
          emptyOutDir: true,
          // Entities are known by their names.
          minify: mode !== 'server',
          rolldownOptions: {
            input: inputs(mode).input,
            output: {
              ...(mode === 'server' || mode === 'bench' ? {} : { format: 'cjs' as const }),
              entryFileNames: '[name].js',
              chunkFileNames: 'chunks/[name]-[hash].js',
              ...(mode === 'server' ? {} : { codeSplitting: { groups: startingChunks } }),
            },
          },
        },
        // Packed alone, the command line must find everything in its own bundle.
        ssr: mode === 'bench' || mode === 'server' ? {} : { noExternal: true },
      }
    : {
        plugins: [react(), tailwindcss()],
        build: { outDir: 'dist/page', emptyOutDir: true },
      },
)
