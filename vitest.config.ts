import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url))

export default defineConfig({
  resolve: {
    alias: { '@shared': folder('shared'), '@server': folder('server'), '@': folder('src') },
  },
  test: {
    include: ['tests/**/*.test.{ts,tsx}'],
    exclude: ['tests/e2e/**', 'node_modules/**'],
    environment: 'node',
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
})
