import { readdirSync, readFileSync } from 'node:fs'
import { defineConfig, type Plugin } from 'vite'
import react from '@vitejs/plugin-react'
import tailwindcss from '@tailwindcss/vite'

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

// One configuration for both bundles: `vite build --ssr` makes the command line, plain `vite build` the dashboard.
export default defineConfig(({ isSsrBuild }) =>
  isSsrBuild === true
    ? {
        publicDir: false,
        plugins: [shipFonts],
        build: {
          target: 'node20',
          outDir: 'dist/cli',
          emptyOutDir: true,
          minify: false,
          rolldownOptions: {
            input: { foldgauge: 'cli/main.ts' },
            output: { entryFileNames: '[name].js', chunkFileNames: 'chunks/[name]-[hash].js' },
          },
        },
        // Packed alone, the command line must find everything in its own bundle.
        ssr: { noExternal: true },
      }
    : {
        plugins: [react(), tailwindcss()],
        build: { outDir: 'dist/page', emptyOutDir: true },
      },
)
