import { defineConfig } from 'vite'
import react from '@vitejs/plugin-react'
import tailwindcss from '@tailwindcss/vite'

// One configuration for both bundles: `vite build --ssr` makes the command line, plain `vite build` the dashboard.
export default defineConfig(({ isSsrBuild }) =>
  isSsrBuild === true
    ? {
        publicDir: false,
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
        ssr: { noExternal: ['commander', 'zod', 'yaml', 'clipper2-ts', 'tinyglobby', 'pdf-lib', 'pako', 'tslib', /^@pdf-lib\//, '@tarikjabiri/dxf'] },
      }
    : {
        plugins: [react(), tailwindcss()],
        build: { outDir: 'dist/page', emptyOutDir: true },
      },
)
