import { fileURLToPath } from 'node:url'
import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { defineConfig } from 'vite'

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url))

export default defineConfig({
  plugins: [react(), tailwindcss()],
  resolve: { alias: { '@': folder('src'), '@shared': folder('shared') } },
  build: { outDir: 'dist/client', emptyOutDir: true, sourcemap: false },
  server: {
    proxy: { '/api': { target: process.env['TAUTBOOK_API'] ?? 'http://127.0.0.1:4600', changeOrigin: false } },
  },
})
