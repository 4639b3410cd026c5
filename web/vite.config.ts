import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig, loadEnv } from 'vite';

/** `API_URL` names the server that `/api` is passed on to while developing. */
export default defineConfig(({ mode }) => ({
  root: import.meta.dirname,
  plugins: [react(), tailwindcss()],
  worker: { format: 'es' },
  build: {
    outDir: '../dist/web',
    emptyOutDir: true,
    target: 'es2022',
    sourcemap: true,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            // With the settings, so that they run before any schema of another chunk is made.
            { name: 'schemas', test: /node_modules[\\/]zod[\\/]|[\\/]web[\\/]schema-settings\.ts$/, priority: 30 },
            {
              name: 'react',
              test: /node_modules[\\/](react|react-dom|scheduler|react-router|react-router-dom)[\\/]/,
              priority: 20,
            },
            {
              name: 'konva',
              test: /node_modules[\\/](konva|react-konva|react-reconciler|its-fine)[\\/]/,
              priority: 20,
            },
          ],
        },
      },
    },
  },
  server: {
    port: 5173,
    strictPort: true,
    proxy: { '/api': loadEnv(mode, '.', 'API_URL').API_URL ?? 'http://127.0.0.1:4680' },
  },
}));
