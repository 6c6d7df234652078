import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vite'

const fromRoot = (path: string) => fileURLToPath(new URL(path, import.meta.url))

/**
 * Two builds from one file. Without `--ssr` it builds the client into dist/client; with
 * `--ssr server/index.ts` it bundles the server into dist/server (packages stay external).
 */
export default defineConfig(({ isSsrBuild }) => ({
  plugins: isSsrBuild ? [] : [react(), tailwindcss()],
  resolve: { alias: { '@': fromRoot('./src') } },
  publicDir: isSsrBuild ? false : 'public',
  build: isSsrBuild
    ? { outDir: 'dist/server', emptyOutDir: true, target: 'node20', sourcemap: true }
    : { outDir: 'dist/client', emptyOutDir: true, sourcemap: false },
}))
