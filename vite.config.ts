import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vite'

const fromRoot = (path: string) => fileURLToPath(new URL(path, import.meta.url))

/**
 * Two builds from one file. Without `--ssr` it builds the client into dist/client; with `--ssr` it
 * bundles the web server, its planning thread and the database command into dist/server (packages
 * stay external).
 */
export default defineConfig(({ isSsrBuild }) => ({
  plugins: isSsrBuild ? [] : [react(), tailwindcss()],
  resolve: { alias: { '@': fromRoot('./src') } },
  publicDir: isSsrBuild ? false : 'public',
  build: isSsrBuild
    ? {
        outDir: 'dist/server',
        emptyOutDir: true,
        target: 'node20',
        sourcemap: true,
        rolldownOptions: {
          input: {
            index: fromRoot('./server/index.ts'),
            cli: fromRoot('./server/db/cli.ts'),
            'plan-worker': fromRoot('./server/planning/plan-worker.ts'),
          },
        },
      }
    : { outDir: 'dist/client', emptyOutDir: true, sourcemap: false },
}))
