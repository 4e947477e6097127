import react from '@vitejs/plugin-react'
import { defineConfig } from 'vite'

export default defineConfig({
  root: import.meta.dirname,
  plugins: [react()],
  base: './',
  build: { assetsInlineLimit: 0, modulePreload: { polyfill: false } },
})
