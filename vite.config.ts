import path from 'node:path';
import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';

const server = `http://127.0.0.1:${process.env.PORT ?? 4600}`;

export default defineConfig({
  plugins: [react(), tailwindcss()],
  worker: { format: 'es' },
  build: {
    outDir: path.resolve(import.meta.dirname, 'dist/client'),
    copyPublicDir: false,
    target: 'es2022',
    sourcemap: true,
    // the map library is one part of 1.2 MB, fetched when a plan is first opened
    chunkSizeWarningLimit: 1300,
    // what many pages share comes as one part: each of a hundred small ones would be a request
    rolldownOptions: {
      output: { codeSplitting: { groups: [{ name: 'common', minShareCount: 6 }] } },
    },
  },
  server: { port: 4601, proxy: { '/api': server, '/tiles': server } },
});
