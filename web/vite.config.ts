import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const apiPort = process.env.MERESTONE_API_PORT ?? '4171';

export default defineConfig({
  plugins: [react()],
  // Our own packages are bundled from their TypeScript sources, so that no build of theirs has to run first.
  resolve: { conditions: ['source', 'module', 'browser', 'development|production'] },
  // The host stays the page's own: the server refuses changes from a foreign origin.
  server: { proxy: { '/api': { target: `http://127.0.0.1:${apiPort}`, changeOrigin: false } } },
  build: {
    // The content security policy allows no data: URI, so even the smallest font stays a file.
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 900,
  },
});
