import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { pdfFiles } from './build/pdf-files.ts';

const server = process.env.API_URL ?? `http://127.0.0.1:${process.env.PORT ?? '4180'}`;
const shared = fileURLToPath(new URL('../shared/src/', import.meta.url));

export default defineConfig({
  root: fileURLToPath(new URL('.', import.meta.url)),
  plugins: [react(), pdfFiles()],
  // The sources themselves, so that the client builds without the compiled shared package and sees changes at once.
  resolve: { alias: [{ find: /^@weighhouse\/shared\/(.*)$/, replacement: `${shared}$1.ts` }] },
  build: {
    outDir: 'dist/app',
    emptyOutDir: true,
    target: 'es2023',
    // A data: worker or font would need a looser content policy.
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 700,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            {
              name: 'react',
              test: /node_modules[\\/](react|react-dom|react-router|react-router-dom|scheduler)[\\/]/,
            },
            { name: 'editor', test: /node_modules[\\/](@tiptap|prosemirror-[a-z-]+)[\\/]/ },
            { name: 'live', test: /node_modules[\\/](socket\.io-[a-z]+|engine\.io-[a-z]+|@socket\.io)[\\/]/ },
          ],
        },
      },
    },
  },
  server: {
    host: '127.0.0.1',
    port: Number(process.env.CLIENT_PORT ?? 4181),
    strictPort: true,
    proxy: {
      '/api': { target: server },
      '/live': { target: server, ws: true },
    },
  },
});
