import { fileURLToPath } from 'node:url'
import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { defineConfig } from 'vite'

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url))

export default defineConfig({
  plugins: [react(), tailwindcss()],
  resolve: {
    alias: { '@shared': folder('shared'), '@server': folder('server'), '@': folder('src') },
  },
  build: {
    outDir: 'dist/client',
    // The content security policy allows no data: scripts or fonts.
    assetsInlineLimit: 0,
    target: 'es2022',
  },
  worker: { format: 'es' },
})
