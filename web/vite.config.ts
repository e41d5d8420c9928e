import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

export default defineConfig({
  root: import.meta.dirname,
  plugins: [react(), tailwindcss()],
  build: { outDir: '../dist/web', emptyOutDir: true, target: 'es2022', assetsInlineLimit: 0, modulePreload: { polyfill: false }, chunkSizeWarningLimit: 300 },
  server: { proxy: { '/api': 'http://127.0.0.1:8787', '/docs': 'http://127.0.0.1:8787', '/openapi.yaml': 'http://127.0.0.1:8787' } },
});
