import { fileURLToPath } from 'node:url'
import tailwindcss from '@tailwindcss/vite'
import react from '@vitejs/plugin-react'
import { defineConfig } from 'vite'

const folder = (name: string) => fileURLToPath(new URL(`./${name}`, import.meta.url))

export default defineConfig(({ command }) => ({
  plugins: [react(), tailwindcss()],
  resolve: {
    alias: {
      '@shared': folder('shared'),
      '@server': folder('server'),
      '@': folder('src'),
      // The package's exports name its development build only.
      ...(command === 'build' && {
        'react-router': folder('node_modules/react-router/dist/production/index.mjs'),
      }),
    },
  },
  build: {
    outDir: 'dist/client',
    // The content security policy allows no data: scripts or fonts.
    assetsInlineLimit: 0,
    target: 'es2022',
    manifest: true,
    // Every browser that knows es2022 modules preloads them itself.
    modulePreload: { polyfill: false },
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            { name: 'zod', test: /node_modules[\\/]zod[\\/]|src[\\/]config[\\/]configure-zod/ },
            {
              // What every page needs, the sign-in page too. One file of it compresses better than many.
              name: 'base',
              test: /node_modules[\\/](?:react|react-dom|react-router|scheduler|zustand)[\\/]|src[\\/](?:app[\\/]use-page-title|components[\\/](?:banner|button|class-names|field|sign|spinner)|config[\\/]paths|lib[\\/]http-client)\./,
              includeDependenciesRecursively: false,
            },
          ],
        },
      },
    },
  },
  worker: { format: 'es' },
}))
